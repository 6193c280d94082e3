import { useFormikContext } from 'formik';
import type { KeptThing } from '../../../shared/contract/kept-things';
import { PROVENANCE_KINDS } from '../../../shared/contract/materials';
import { provenanceInWords } from '../../api/kept-forms/provenance-words';
import { specDifferences } from '../../api/kept-forms/spec-differences';
import { fieldUnit } from '../../api/kept-forms/typed-quantity';
import { specFieldName, useKeptThingForm } from '../../api/kept-forms/use-kept-thing-form';
import type { FoodSpec } from '../../api/kept-things-queries';
import { hasRole, useAccount, useFormDraft, useUnitSystem } from '../../session';
import { Form, FormChoice, FormField, FormNumberField, FormSelect, Notice, Sheet, Small } from '../../ui';
import { FieldGrid } from '../../ui/field-grid';
import { FormDraft } from '../../ui/form/form-draft';
import { FormSaving } from '../../ui/form/form-saving';
import { ReadingOnly } from '../../ui/form/reading-only';
import { IsothermDrawing } from './components/isotherm-drawing';
import {
  foodFormValues,
  foodSpecFrom,
  NEW_FOOD,
  validateFoodForm,
  type FoodFormValues,
} from './food-form-values';

export interface FoodFormProps {
  /** Null for a new food. */
  opened: KeptThing<FoodSpec> | null;
  returnTo: string | undefined;
  onTheirsTaken: () => void;
}

export function FoodForm({ opened, returnTo, onTheirsTaken }: FoodFormProps) {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const context = { unitSystem, before: opened?.revision.spec ?? NEW_FOOD };
  const draft = useFormDraft(`foods/${opened?.id ?? 'new'}`, {
    values: foodFormValues(context.before, unitSystem),
    baseRevisionId: opened?.revision.id ?? null,
  });
  const canSave = hasRole(account, ['engineer']);
  const keeping = useKeptThingForm({
    accountId: account.id,
    basePath: account.basePath,
    collection: 'foods',
    opened,
    returnTo,
    draft,
  });
  const toSpec = (values: FoodFormValues) => foodSpecFrom(values, context);
  const { conflict } = keeping;
  return (
    <Form<FoodFormValues>
      label="Food"
      initialValues={draft.start}
      validate={validateFoodForm(context)}
      toFieldName={specFieldName}
      onSubmit={(values) => keeping.submit(toSpec(values))}
    >
      {canSave ? (
        <FormDraft
          isRestored={draft.isRestored}
          isNew={opened === null}
          fresh={draft.fresh}
          onChange={(values: FoodFormValues) => draft.keep(values, keeping.baseRevisionId())}
          onDropped={draft.clear}
        />
      ) : (
        <ReadingOnly what="foods" hasFields />
      )}
      <Sheet title="Food">
        <FormField name="name" label="Name" />
        <FormNumberField name="food.mass_kg" label="Mass as packed" unit={fieldUnit('mass_kg', unitSystem)} />
      </Sheet>
      <OxygenSheet />
      <MoistureSheet toSpec={toSpec} />
      <LimitsSheet />
      <Sheet title="Besides">
        <FormNumberField
          name="absorber_capacity_cm3_STP"
          label="Oxygen absorber in the pack"
          unit="cm³ (STP)"
          hint="What it takes up in all; 0 without one."
        />
        <FormField
          name="cautions"
          label="Cautions"
          hint="One a line; each is said beside every answer about this food."
          options={{ lines: 3, isOptional: true }}
        />
        <FormField name="notes" label="Notes" options={{ lines: 3, isOptional: true }} />
      </Sheet>
      <FormSaving<FoodFormValues>
        submitLabel={opened === null ? 'Save food' : 'Save as a new revision'}
        canSave={canSave}
        said={keeping.said}
        fault={keeping.fault}
        conflict={
          conflict === null
            ? null
            : {
                what: 'This food',
                asNewLabel: 'Save mine as a new food',
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
    </Form>
  );
}

const OXYGEN_MODE_OPTIONS = [
  { value: 'at_once', label: 'Takes up all that enters, at once' },
  { value: 'rate', label: 'Takes it up slowly, in proportion' },
  { value: 'none', label: 'Does not take up oxygen' },
];

const OXYGEN_MODE_HINTS = {
  at_once:
    'The cautious choice for sensitive foods: the wall decides, and what is in the headspace counts at day 0.',
  rate: 'The headspace keeps some oxygen; how fast it goes is the rate constant below.',
  none: 'Oxygen gathers in the headspace.',
} as const;

function OxygenSheet() {
  const { values } = useFormikContext<FoodFormValues>();
  const unitSystem = useUnitSystem();
  const mode = values.food.oxygen_mode;
  return (
    <Sheet title="Oxygen">
      <FormSelect
        name="food.oxygen_mode"
        label="How it takes oxygen"
        options={OXYGEN_MODE_OPTIONS}
        hint={OXYGEN_MODE_HINTS[mode]}
      />
      {mode === 'rate' ? (
        <FieldGrid leastWidthPx={160}>
          <FormNumberField
            name="food.rate_constant_mol_per_kg_s_Pa"
            label="Rate constant"
            unit="mol/(kg·s·Pa)"
            hint="As in 2.95e-14."
          />
          <FormNumberField
            name="food.rate_activation_energy_J_per_mol"
            label="Activation energy"
            unit="kJ/mol"
            options={{ isOptional: true }}
          />
          <FormNumberField
            name="food.rate_reference_temperature_C"
            label="Holds at"
            unit={fieldUnit('temperature_C', unitSystem)}
            options={{ isOptional: true }}
          />
        </FieldGrid>
      ) : null}
    </Sheet>
  );
}

function MoistureSheet({ toSpec }: { toSpec: (values: FoodFormValues) => FoodSpec }) {
  const { values } = useFormikContext<FoodFormValues>();
  const model = values.moisture_model;
  const isotherm = model === 'held' ? undefined : toSpec(values).food.isotherm;
  return (
    <Sheet title="Moisture">
      <FormChoice
        name="moisture_model"
        label="Its moisture"
        options={[
          { value: 'GAB', label: 'GAB isotherm' },
          { value: 'linear', label: 'Straight line' },
          { value: 'held', label: 'Not followed' },
        ]}
      />
      {model === 'GAB' ? (
        <FieldGrid>
          <FormNumberField name="food.isotherm.Xm_g_per_g" label="Monolayer moisture Xm" unit="g/100 g dry" />
          <FormNumberField name="food.isotherm.C" label="C" />
          <FormNumberField name="food.isotherm.K" label="K" />
        </FieldGrid>
      ) : null}
      {model === 'linear' ? (
        <FieldGrid>
          <FormNumberField name="food.isotherm.slope_g_per_g" label="Slope" unit="g/g" />
          <FormNumberField name="food.isotherm.intercept_g_per_g" label="Moisture at activity 0" unit="g/g" />
        </FieldGrid>
      ) : null}
      {isotherm === undefined ? (
        <FormNumberField
          name="food.inside_relative_humidity"
          label="Humidity inside"
          unit="%"
          hint="Held constant; it decides what the inner layers see."
        />
      ) : (
        <>
          <IsothermDrawing isotherm={isotherm} />
          <FormNumberField
            name="food.initial_moisture_g_per_g"
            label="Moisture as packed"
            unit="g/100 g dry"
          />
        </>
      )}
    </Sheet>
  );
}

const OWN_DECISION_KINDS = new Set<string>(['memory', 'common-practice', 'invented', 'derived']);

function LimitsSheet() {
  const { values, errors, submitCount, touched } = useFormikContext<FoodFormValues>();
  const limitsFault: unknown = errors.limits;
  const isShown = submitCount > 0 || touched.limits !== undefined;
  return (
    <Sheet
      title="Limits"
      subtitle="The life ends at the first that is reached. Leave blank what does not end it."
    >
      <FieldGrid leastWidthPx={160}>
        <FormNumberField
          name="limits.oxygen_uptake_mg_per_kg"
          label="Oxygen taken up"
          unit="mg/kg"
          options={{ isOptional: true }}
        />
        <FormNumberField
          name="limits.headspace_oxygen_percent"
          label="Oxygen in the headspace"
          unit="%"
          options={{ isOptional: true }}
        />
        {values.moisture_model === 'held' ? null : (
          <FormNumberField
            name="limits.moisture_max_g_per_g"
            label="Highest moisture"
            unit="g/100 g dry"
            options={{ isOptional: true }}
          />
        )}
        {values.moisture_model === 'held' ? null : (
          <FormNumberField
            name="limits.moisture_min_g_per_g"
            label="Lowest moisture"
            unit="g/100 g dry"
            options={{ isOptional: true }}
          />
        )}
      </FieldGrid>
      {isShown && typeof limitsFault === 'string' ? <Notice kind="error">{limitsFault}</Notice> : null}
      <FormSelect
        name="ground.kind"
        label="The limits are"
        options={PROVENANCE_KINDS.map((kind) => ({ value: kind, label: provenanceInWords(kind) }))}
      />
      <FormField name="ground.source" label="Source" options={{ isOptional: true }} />
      {OWN_DECISION_KINDS.has(values.ground.kind) ? (
        <Notice kind="caution">
          These limits were not measured on your product: remembered, worked back from market life, or usage.
          The limit is your own decision; take them as a place to start.
        </Notice>
      ) : (
        <Small>A storage test of the real product is what proves a limit.</Small>
      )}
    </Sheet>
  );
}
