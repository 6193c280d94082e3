import { useQuery } from '@tanstack/react-query';
import type { KeptThing } from '../../../shared/contract/kept-things';
import type { PackSpec } from '../../../shared/contract/packs';
import { specDifferences } from '../../api/kept-forms/spec-differences';
import { fieldUnit } from '../../api/kept-forms/typed-quantity';
import { keptThingsQueries } from '../../api/kept-things-queries';
import { specFieldName, useKeptThingForm } from '../../api/kept-forms/use-kept-thing-form';
import { hasRole, useAccount, useFormDraft, useUnitSystem } from '../../session';
import { Form, FormCheckbox, FormChoice, FormField, FormNumberField, FormSelect, Sheet } from '../../ui';
import { FieldGrid } from '../../ui/field-grid';
import { FormDraft } from '../../ui/form/form-draft';
import { FormSaving } from '../../ui/form/form-saving';
import { ReadingOnly } from '../../ui/form/reading-only';
import { PackMeasures } from './components/pack-measures';
import {
  NEW_PACK,
  packFormValues,
  packSpecFrom,
  validatePackForm,
  type PackFormValues,
} from './pack-form-values';

export interface PackFormProps {
  /** Null for a new pack. */
  opened: KeptThing<PackSpec> | null;
  returnTo: string | undefined;
  /** Fills the form anew from the state that won a lost race. */
  onTheirsTaken: () => void;
}

export function PackForm({ opened, returnTo, onTheirsTaken }: PackFormProps) {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const context = { unitSystem, before: opened?.revision.spec ?? NEW_PACK };
  const draft = useFormDraft(`packs/${opened?.id ?? 'new'}`, {
    values: packFormValues(context.before, unitSystem),
    baseRevisionId: opened?.revision.id ?? null,
  });
  const canSave = hasRole(account, ['engineer']);
  const keeping = useKeptThingForm({
    accountId: account.id,
    basePath: account.basePath,
    collection: 'packs',
    opened,
    returnTo,
    draft,
  });
  const toSpec = (values: PackFormValues) => packSpecFrom(values, context);
  const { conflict } = keeping;
  return (
    <Form<PackFormValues>
      label="Pack"
      initialValues={draft.start}
      validate={validatePackForm(context)}
      toFieldName={specFieldName}
      onSubmit={(values) => keeping.submit(toSpec(values))}
    >
      {({ values }) => (
        <>
          {canSave ? (
            <FormDraft
              isRestored={draft.isRestored}
              isNew={opened === null}
              fresh={draft.fresh}
              onChange={(values: PackFormValues) => draft.keep(values, keeping.baseRevisionId())}
              onDropped={draft.clear}
            />
          ) : (
            <ReadingOnly what="packs" hasFields />
          )}
          <Sheet title="Pack">
            <FormField name="name" label="Name" />
            <FormChoice
              name="form.type"
              label="Described by"
              options={[
                { value: 'pouch', label: 'Pouch dimensions' },
                { value: 'area', label: 'An area' },
                { value: 'tray', label: 'Tray and lid' },
              ]}
            />
            {values.form.type === 'pouch' ? <PouchFields /> : null}
            {values.form.type === 'area' ? <AreaField /> : null}
            {values.form.type === 'tray' ? <TrayFields /> : null}
          </Sheet>
          {values.form.type === 'pouch' ? (
            <Sheet title="Outline">
              <PackMeasures before={context.before} />
            </Sheet>
          ) : null}
          <HeadspaceFields />
          <LeakFields hasLeaks={values.has_leaks} isPouch={values.form.type === 'pouch'} />
          <FormSaving<PackFormValues>
            submitLabel={opened === null ? 'Save pack' : 'Save as a new revision'}
            canSave={canSave}
            said={keeping.said}
            fault={keeping.fault}
            conflict={
              conflict === null
                ? null
                : {
                    what: 'This pack',
                    asNewLabel: 'Save mine as a new pack',
                    isBusy: keeping.isSaving,
                    differences: (mine) => specDifferences(toSpec(mine), conflict.revision.spec),
                    onKeepMine: (mine) => keeping.keepMine(toSpec(mine)),
                    onSaveAsNew: (mine) => keeping.saveAsNew(toSpec(mine)),
                    onTakeTheirs: () => {
                      keeping.takeTheirs();
                      onTheirsTaken();
                    },
                  }
            }
          />
        </>
      )}
    </Form>
  );
}

const POUCH_FIELDS = [
  { name: 'form.width_mm', label: 'Width' },
  { name: 'form.height_mm', label: 'Height' },
  { name: 'form.seal_left_mm', label: 'Left seal' },
  { name: 'form.seal_right_mm', label: 'Right seal' },
  { name: 'form.seal_top_mm', label: 'Top seal' },
  { name: 'form.seal_bottom_mm', label: 'Bottom seal' },
  { name: 'form.gusset_depth_mm', label: 'Gusset, folded depth' },
];

function PouchFields() {
  const unitSystem = useUnitSystem();
  return (
    <FieldGrid>
      {POUCH_FIELDS.map(({ name, label }) => (
        <FormNumberField key={name} name={name} label={label} unit={fieldUnit('length_mm', unitSystem)} />
      ))}
    </FieldGrid>
  );
}

function AreaField() {
  const unitSystem = useUnitSystem();
  return <FormNumberField name="form.area_m2" label="Area" unit={fieldUnit('area_m2', unitSystem)} />;
}

function TrayFields() {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const walls = useQuery(keptThingsQueries(account.id, 'laminates').all());
  const options = (walls.data ?? []).map(({ id, revision }) => ({ value: id, label: revision.spec.name }));
  return (
    <>
      <FormSelect
        name="form.tray_laminate_id"
        label="Wall of the tray"
        options={[{ value: '', label: 'Choose a wall' }, ...options]}
        hint="The walls of a study are tried as the lid."
      />
      <FieldGrid>
        <FormNumberField name="form.tray_area_m2" label="Tray area" unit={fieldUnit('area_m2', unitSystem)} />
        <FormNumberField name="form.lid_area_m2" label="Lid area" unit={fieldUnit('area_m2', unitSystem)} />
      </FieldGrid>
    </>
  );
}

function HeadspaceFields() {
  const unitSystem = useUnitSystem();
  return (
    <Sheet title="Inside" subtitle="The gas over the food when the pack is closed.">
      <FieldGrid>
        <FormNumberField name="headspace_cm3" label="Headspace" unit={fieldUnit('volume_cm3', unitSystem)} />
        <FormNumberField
          name="starting_headspace_oxygen_percent"
          label="Oxygen in it at the start"
          unit="%"
          hint="20.9 for air, 0.5 to 2 after flushing with nitrogen."
        />
      </FieldGrid>
    </Sheet>
  );
}

function LeakFields({ hasLeaks, isPouch }: { hasLeaks: boolean; isPouch: boolean }) {
  const unitSystem = useUnitSystem();
  return (
    <Sheet title="Seals and leaks" subtitle="What goes round the wall instead of through it.">
      {isPouch ? (
        <FormCheckbox
          name="has_seal_path"
          label="Count what creeps through the seal"
          hint="Edgewise through both sealant layers, over the width of the seal."
        />
      ) : null}
      <FormCheckbox
        name="has_leaks"
        label="Leak channels"
        hint="Folds or grains in the seal that never quite close."
      />
      {hasLeaks ? (
        <FieldGrid>
          <FormNumberField name="leaks.count" label="How many" />
          <FormNumberField name="leaks.length_mm" label="Length" unit={fieldUnit('length_mm', unitSystem)} />
          <FormNumberField name="leaks.diameter_um" label="Diameter" unit="µm" />
        </FieldGrid>
      ) : null}
    </Sheet>
  );
}
