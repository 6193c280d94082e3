import { useFormikContext } from 'formik';
import { View } from 'react-native';
import type { KeptThing } from '../../../shared/contract/kept-things';
import { PROVENANCE_KINDS } from '../../../shared/contract/materials';
import type { RouteSpec } from '../../../shared/contract/routes';
import { provenanceFieldInWords, provenanceInWords } from '../../api/kept-forms/provenance-words';
import { specDifferences } from '../../api/kept-forms/spec-differences';
import { specFieldName, useKeptThingForm } from '../../api/kept-forms/use-kept-thing-form';
import { hasRole, useAccount, useFormDraft, useUnitSystem } from '../../session';
import {
  Button,
  Form,
  FormChoice,
  FormField,
  FormNumberField,
  FormSelect,
  Inline,
  Sheet,
  Small,
  SPACE,
} from '../../ui';
import { FormDraft } from '../../ui/form/form-draft';
import { FormSaving } from '../../ui/form/form-saving';
import { ReadingOnly } from '../../ui/form/reading-only';
import { LegFields } from './components/leg-fields';
import { LegsRuler } from './components/legs-ruler';
import {
  NEW_ROUTE,
  routeFormValues,
  routeSpecFrom,
  validateRouteForm,
  type RouteFormValues,
} from './route-form-values';
import { legsAfter, type LegEvent } from './route-legs';

export interface RouteFormProps {
  /** Null for a new route. */
  opened: KeptThing<RouteSpec> | null;
  returnTo: string | undefined;
  onTheirsTaken: () => void;
}

export function RouteForm({ opened, returnTo, onTheirsTaken }: RouteFormProps) {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const context = { unitSystem, before: opened?.revision.spec ?? NEW_ROUTE };
  const draft = useFormDraft(`routes/${opened?.id ?? 'new'}`, {
    values: routeFormValues(context.before, unitSystem),
    baseRevisionId: opened?.revision.id ?? null,
  });
  const canSave = hasRole(account, ['engineer']);
  const keeping = useKeptThingForm({
    accountId: account.id,
    basePath: account.basePath,
    collection: 'routes',
    opened,
    returnTo,
    draft,
  });
  const toSpec = (values: RouteFormValues) => routeSpecFrom(values, context);
  const { conflict } = keeping;
  return (
    <Form<RouteFormValues>
      label="Route"
      initialValues={draft.start}
      validate={validateRouteForm(context)}
      toFieldName={specFieldName}
      onSubmit={(values) => keeping.submit(toSpec(values))}
    >
      {canSave ? (
        <FormDraft
          isRestored={draft.isRestored}
          isNew={opened === null}
          fresh={draft.fresh}
          onChange={(values: RouteFormValues) => draft.keep(values, keeping.baseRevisionId())}
          onDropped={draft.clear}
        />
      ) : (
        <ReadingOnly what="routes" hasFields />
      )}
      <Sheet title="Route">
        <FormField name="name" label="Name" />
        <RouteRuler toSpec={toSpec} />
      </Sheet>
      <LegsSheet />
      <Sheet title="Ground">
        <FormNumberField
          name="horizon_days"
          label="Look ahead"
          unit="days"
          hint="A limit not reached by then reads “not reached”."
        />
        <FormSelect name="ground.kind" label="The conditions are" options={GROUND_OPTIONS} />
        <FormField name="ground.source" label="Source" options={{ isOptional: true }} />
        <FormField name="notes" label="Notes" options={{ lines: 3, isOptional: true }} />
        {context.before.provenance
          .filter((entry) => entry.field !== 'legs')
          .map((entry) => (
            <Small key={entry.field}>
              {`${provenanceFieldInWords(entry.field)}: ${provenanceInWords(entry.kind)}${entry.source === '' ? '' : `, ${entry.source}`}`}
            </Small>
          ))}
      </Sheet>
      <FormSaving<RouteFormValues>
        submitLabel={opened === null ? 'Save route' : 'Save as a new revision'}
        canSave={canSave}
        said={keeping.said}
        fault={keeping.fault}
        conflict={
          conflict === null
            ? null
            : {
                what: 'This route',
                asNewLabel: 'Save mine as a new route',
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

const GROUND_OPTIONS = PROVENANCE_KINDS.map((kind) => ({ value: kind, label: provenanceInWords(kind) }));

function LegsSheet() {
  const formik = useFormikContext<RouteFormValues>();
  const { legs, after_last } = formik.values.route;
  const onEvent = (event: LegEvent) => {
    const next = legsAfter({ legs, nextKey: formik.values.nextKey }, event);
    void formik.setValues({
      ...formik.values,
      nextKey: next.nextKey,
      route: { legs: next.legs, after_last },
    });
  };
  const listFault = formik.errors.route?.legs;
  return (
    <Sheet
      title="Legs"
      subtitle="In the order of travel: how warm and how moist the air outside the pack is, and how long."
    >
      <View role="list" aria-label="Legs" style={{ gap: SPACE.x3 }}>
        {legs.map((leg, index) => (
          <LegFields key={leg.key} legKey={leg.key} index={index} count={legs.length} onEvent={onEvent} />
        ))}
      </View>
      {typeof listFault === 'string' ? <Small tone="ink">{listFault}</Small> : null}
      <Inline>
        <Button label="Add a leg" icon="add" onPress={() => onEvent({ type: 'leg_added' })} />
      </Inline>
      <FormChoice
        name="route.after_last"
        label="After the last leg"
        options={[
          { value: 'hold', label: 'It stays there' },
          { value: 'repeat', label: 'The route begins again' },
        ]}
      />
    </Sheet>
  );
}

function RouteRuler({ toSpec }: { toSpec: (values: RouteFormValues) => RouteSpec }) {
  const { values } = useFormikContext<RouteFormValues>();
  const legs = toSpec(values).route.legs;
  const isWhole = legs.every(
    (leg) => leg.days > 0 && Number.isFinite(leg.temperature_C + leg.relative_humidity + leg.days),
  );
  if (legs.length === 0 || !isWhole)
    return <Small>The ruler comes as soon as every leg has its numbers.</Small>;
  return (
    <LegsRuler
      legs={legs.map((leg) => ({ ...leg, name: leg.name ?? '' }))}
      afterLast={values.route.after_last}
    />
  );
}
