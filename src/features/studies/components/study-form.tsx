import { useQuery } from '@tanstack/react-query';
import { useFormikContext } from 'formik';
import { useEffect, useRef } from 'react';
import { View } from 'react-native';
import { keptThingsQueries } from '../../../api/kept-things-queries';
import { describeError } from '../../../api/describe-error';
import { MOST_LAMINATES_IN_STUDY } from '../../../../shared/contract/studies';
import { useAccount } from '../../../session';
import {
  Button,
  FailedState,
  Form,
  FormErrors,
  FormField,
  FormNumberField,
  FormSelect,
  FormSubmit,
  IconButton,
  Link,
  SPACE,
  Sheet,
  Stack,
} from '../../../ui';
import type { SelectOption } from '../../../ui';
import { studyFaults, studyFieldName, type StudyFormValues } from '../study-form-values';
import { studyPlaces } from '../study-places';

export interface StudyFormProps {
  initialValues: StudyFormValues;
  /** Where the forms of foods, packs, routes and walls come back to. */
  returnTo: string;
  submitLabel: string;
  onChange: (values: StudyFormValues) => void;
  onSubmit: (values: StudyFormValues) => Promise<void>;
}

/** Food, pack, route, target, walls. */
export function StudyForm({ initialValues, returnTo, submitLabel, onChange, onSubmit }: StudyFormProps) {
  const account = useAccount();
  const places = studyPlaces(account);
  return (
    <Form
      label="Study"
      initialValues={initialValues}
      validate={studyFaults}
      onSubmit={onSubmit}
      toFieldName={studyFieldName}
    >
      <ChangeWatcher onChange={onChange} />
      <Sheet title="The question">
        <FormField
          name="name"
          label="Name"
          hint="For instance: Roasted hazelnuts, 200 g pouch, to Singapore"
        />
        <ThingField
          name="food_id"
          label="Food"
          collection="foods"
          choose="Choose a food"
          makeNew={{ label: 'Make a new food', href: places.createThing('foods', returnTo) }}
        />
        <ThingField
          name="pack_id"
          label="Pack"
          collection="packs"
          choose="Choose a pack"
          makeNew={{ label: 'Make a new pack', href: places.createThing('packs', returnTo) }}
        />
        <ThingField
          name="route_id"
          label="Route"
          collection="routes"
          choose="Choose a route"
          makeNew={{ label: 'Make a new route', href: places.createThing('routes', returnTo) }}
        />
        <FormNumberField name="target_days" label="Target" unit="days" options={{ widthInCharacters: 8 }} />
      </Sheet>
      <Sheet title="Walls" subtitle="One to answer, or several to compare side by side.">
        <WallFields makeNewHref={places.createThing('walls', returnTo)} />
      </Sheet>
      <FormField name="notes" label="Notes" options={{ isOptional: true, lines: 3 }} />
      <FormErrors />
      <FormSubmit label={submitLabel} busyLabel="Computing…" />
    </Form>
  );
}

/** Tells what is typed to whoever keeps the draft, from the first change on. */
function ChangeWatcher({ onChange }: { onChange: (values: StudyFormValues) => void }) {
  const { values, initialValues } = useFormikContext<StudyFormValues>();
  const report = useRef(onChange);
  useEffect(() => {
    report.current = onChange;
  });
  useEffect(() => {
    if (values !== initialValues) report.current(values);
  }, [values, initialValues]);
  return null;
}

interface ThingFieldProps {
  name: string;
  label: string;
  collection: 'foods' | 'packs' | 'routes' | 'laminates';
  choose: string;
  makeNew?: { label: string; href: string };
}

function ThingField({ name, label, collection, choose, makeNew }: ThingFieldProps) {
  const account = useAccount();
  const things = useQuery(keptThingsQueries(account.id, collection).all());
  const options: SelectOption[] = [
    { value: '', label: things.isPending ? 'Fetching…' : choose },
    ...(things.data ?? []).map((thing) => ({ value: thing.id, label: thing.revision.spec.name })),
  ];
  return (
    <Stack gap="x1">
      <FormSelect name={name} label={label} options={options} />
      {things.isError && things.data === undefined ? (
        <FailedState
          {...describeError(things.error, `The ${collection} could not be fetched`)}
          onRetry={() => void things.refetch()}
          isRetrying={things.isFetching}
        />
      ) : null}
      {makeNew === undefined ? null : (
        <Link href={makeNew.href} size="small" isStandalone>
          {makeNew.label}
        </Link>
      )}
    </Stack>
  );
}

function WallFields({ makeNewHref }: { makeNewHref: string }) {
  const formik = useFormikContext<StudyFormValues>();
  const ids = formik.values.laminate_ids;
  const setIds = (next: string[]) => void formik.setFieldValue('laminate_ids', next);
  return (
    <Stack gap="x3">
      {ids.map((_, index) => (
        <View key={index} style={{ flexDirection: 'row', alignItems: 'flex-end', gap: SPACE.x2 }}>
          <View style={{ flexGrow: 1, flexShrink: 1, minWidth: 0 }}>
            <ThingField
              name={`laminate_ids[${index}]`}
              label={ids.length === 1 ? 'Wall' : `Wall ${index + 1}`}
              collection="laminates"
              choose="Choose a wall"
            />
          </View>
          {ids.length === 1 ? null : (
            <IconButton
              icon="remove"
              label={`Take out wall ${index + 1}`}
              onPress={() => setIds(ids.filter((__, at) => at !== index))}
            />
          )}
        </View>
      ))}
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: SPACE.x4 }}>
        {ids.length < MOST_LAMINATES_IN_STUDY ? (
          <Button label="Compare another wall" icon="add" onPress={() => setIds([...ids, ''])} />
        ) : null}
        <Link href={makeNewHref} size="small" isStandalone>
          Make a new wall
        </Link>
      </View>
    </Stack>
  );
}
