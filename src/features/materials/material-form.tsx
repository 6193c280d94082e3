import { useFormikContext } from 'formik';
import type { KeptThing } from '../../../shared/contract/kept-things';
import { MATERIAL_CLASSES, type MaterialKind, type MaterialSpec } from '../../../shared/contract/materials';
import { specDifferences } from '../../api/kept-forms/spec-differences';
import { useKeptThingForm } from '../../api/kept-forms/use-kept-thing-form';
import { hasRole, useAccount, useFormDraft, useUnitSystem } from '../../session';
import { Choice, Form, FormCheckbox, FormField, FormNumberField, FormSelect, Sheet } from '../../ui';
import { FieldGrid } from '../../ui/field-grid';
import { FormDraft } from '../../ui/form/form-draft';
import { FormSaving } from '../../ui/form/form-saving';
import { GasFields } from './components/gas-fields';
import {
  materialFieldName,
  materialFormValues,
  materialSpecFrom,
  readMaterial,
  validateMaterialForm,
  type MaterialFormValues,
} from './material-form-values';
import { isSuitableUnit, usualUnit } from './unit-choice';

export interface MaterialFormProps {
  /** Null for a new material. */
  opened: KeptThing<MaterialSpec> | null;
  returnTo: string | undefined;
  onTheirsTaken: () => void;
}

export function MaterialForm({ opened, returnTo, onTheirsTaken }: MaterialFormProps) {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const context = { unitSystem, before: opened?.revision.spec ?? null };
  const draft = useFormDraft(`materials/${opened?.id ?? 'new'}`, {
    values: materialFormValues(context),
    baseRevisionId: opened?.revision.id ?? null,
  });
  const canSave = hasRole(account, ['engineer']);
  const keeping = useKeptThingForm({
    accountId: account.id,
    basePath: account.basePath,
    collection: 'materials',
    opened,
    returnTo,
    draft,
  });
  const toSpec = (values: MaterialFormValues) => materialSpecFrom(values, context);
  const { conflict } = keeping;
  return (
    <Form<MaterialFormValues>
      label="Material"
      initialValues={draft.start}
      validate={validateMaterialForm(context)}
      toFieldName={materialFieldName}
      onSubmit={(values) => keeping.submit(toSpec(values))}
    >
      {canSave ? (
        <FormDraft
          isRestored={draft.isRestored}
          isNew={opened === null}
          fresh={draft.fresh}
          onChange={(values: MaterialFormValues) => draft.keep(values, keeping.baseRevisionId())}
          onDropped={draft.clear}
        />
      ) : null}
      <Sheet title="Material">
        <FormField name="name" label="Name" />
        <FormSelect
          name="material_class"
          label="Class"
          hint="Decides the hatching in drawings."
          options={MATERIAL_CLASSES.map((each) => ({ value: each, label: each }))}
        />
        <KindChoice />
        <FieldGrid>
          <FormField
            name="polymer_family"
            label="Polymer"
            hint="As in PET, PE, PP."
            options={{ isOptional: true }}
          />
          <FormField
            name="typical_gauges_um"
            label="Usual gauges, µm"
            hint="As in 12; 15; 23."
            options={{ isOptional: true }}
          />
        </FieldGrid>
      </Sheet>
      <GasSheets isHumidityOptional={keptWithoutHumidity(context.before)} />
      <DefectFields />
      <Sheet title="Besides">
        <FieldGrid>
          <FormNumberField
            name="density_kg_per_m3"
            label="Density"
            unit="kg/m³"
            options={{ isOptional: true }}
          />
          <FormNumberField
            name="price_per_kg"
            label="Price"
            unit={`${account.currency}/kg`}
            options={{ isOptional: true }}
          />
          <FormNumberField
            name="price_per_m2"
            label="Price, coatings"
            unit={`${account.currency}/m²`}
            options={{ isOptional: true }}
          />
        </FieldGrid>
        <FormField name="notes" label="Notes" options={{ lines: 3, isOptional: true }} />
      </Sheet>
      <FormSaving<MaterialFormValues>
        submitLabel={opened === null ? 'Save material' : 'Save as a new revision'}
        canSave={canSave}
        said={keeping.said}
        fault={keeping.fault}
        conflict={
          conflict === null
            ? null
            : {
                what: 'This material',
                asNewLabel: 'Save mine as a new material',
                isBusy: keeping.isSaving,
                differences: (mine) =>
                  specDifferences(readMaterial(mine, context).spec, conflict.revision.spec),
                onKeepMine: (mine) => keeping.keepMine(toSpec(mine)),
                onSaveAsNew: (mine) => keeping.saveAsNew(toSpec(mine)),
                onTakeTheirs: () => {
                  keeping.takeTheirs();
                  onTheirsTaken();
                },
              }
        }
      />
    </Form>
  );
}

const KINDS: { value: MaterialKind; label: string; hint: string }[] = [
  { value: 'film', label: 'Film', hint: 'Twice the gauge lets half as much through.' },
  {
    value: 'coating',
    label: 'Coating',
    hint: 'Metallised, oxide or lacquer on a film: one value for the whole of it.',
  },
  { value: 'foil', label: 'Foil', hint: 'Nothing passes the metal, only its pinholes.' },
];

/** Another kind wants other units; a unit that still fits stays. */
function KindChoice() {
  const formik = useFormikContext<MaterialFormValues>();
  const unitSystem = useUnitSystem();
  const { values } = formik;
  const onChange = (text: string) => {
    const kind = KINDS.find((each) => each.value === text)?.value ?? 'film';
    const next = { ...values, kind, has_defects: kind === 'foil' ? true : values.has_defects };
    if (kind !== 'foil') {
      for (const gas of ['oxygen', 'water'] as const) {
        const { stated } = values[gas];
        if (isSuitableUnit(gas, kind, stated.unit)) continue;
        next[gas] = { ...values[gas], stated: { ...stated, unit: usualUnit(gas, kind, unitSystem) } };
      }
    }
    void formik.setValues(next);
  };
  return (
    <Choice
      label="Kind"
      value={values.kind}
      options={KINDS}
      hint={KINDS.find((each) => each.value === values.kind)?.hint}
      onChange={onChange}
    />
  );
}

/** What was kept before anybody asked for the humidity stays as it is. */
function keptWithoutHumidity(before: MaterialSpec | null): boolean {
  return before !== null && before.kind !== 'foil' && before.oxygen.stated.relative_humidity === undefined;
}

function GasSheets({ isHumidityOptional }: { isHumidityOptional: boolean }) {
  const { values } = useFormikContext<MaterialFormValues>();
  if (values.kind === 'foil') return null;
  return (
    <>
      <GasFields gas="oxygen" kind={values.kind} isHumidityOptional={isHumidityOptional} />
      <GasFields gas="water" kind={values.kind} isHumidityOptional={isHumidityOptional} />
    </>
  );
}

function DefectFields() {
  const { values } = useFormikContext<MaterialFormValues>();
  if (values.kind === 'film') return null;
  return (
    <Sheet title="Pinholes" subtitle="An estimate by nature: counted on a light table, before folding.">
      <FormCheckbox name="has_defects" label="It has pinholes" />
      {values.has_defects ? (
        <FieldGrid>
          <FormNumberField name="defects.density_per_m2" label="How many" unit="per m²" />
          <FormNumberField name="defects.diameter_um" label="Diameter" unit="µm" />
        </FieldGrid>
      ) : null}
    </Sheet>
  );
}
