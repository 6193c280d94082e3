import type { Candidate } from '../../../../shared/contract/studies';
import type { LimitName } from '../../../../shared/engine/description/storage-description';
import { ChartWithTable, TimeCourse } from '../../../charts';
import { Sheet, Small, Stack } from '../../../ui';
import { LIMIT_WORDS, daysFigures } from '../answer-words';
import { thinned } from '../thinned-rows';
import { useFigures, type Figures } from '../use-figures';

/** A route of many legs is listed whole among the inputs. */
const MOST_LEGS_NAMED = 12;

export interface CoursesSheetProps {
  candidate: Candidate;
  targetDays: number;
}

interface CourseSpec {
  title: string;
  gas: 'oxygen' | 'water';
  values: number[] | undefined;
  limits: LimitName[];
}

/** What happens inside the pack over the days: oxygen and moisture against their limits. */
export function CoursesSheet({ candidate, targetDays }: CoursesSheetProps) {
  const show = useFigures();
  const { answer, description } = candidate;
  const { courses } = answer;
  if (courses === undefined || courses.days.length === 0) return null;
  const specs: CourseSpec[] = [
    {
      title: 'Oxygen taken up',
      gas: 'oxygen',
      values: courses.oxygen_uptake_mg_per_kg,
      limits: ['oxygen_uptake_mg_per_kg'],
    },
    {
      title: 'Oxygen in the headspace',
      gas: 'oxygen',
      values: courses.headspace_oxygen_percent,
      limits: ['headspace_oxygen_percent'],
    },
    {
      title: 'Moisture',
      gas: 'water',
      values: courses.moisture_g_per_g,
      limits: ['moisture_max_g_per_g', 'moisture_min_g_per_g'],
    },
  ];
  // A food that takes up everything leaves the headspace at zero, one that takes up nothing its uptake: say no more of it.
  const worthDrawing = specs.filter(
    (spec) =>
      spec.values !== undefined &&
      (spec.values.some((value) => value !== 0) ||
        spec.limits.some((name) => description.limits[name] !== undefined)),
  );
  // The server computes courses over the days worth drawing: the target, the end, a little room.
  const lastDay = Math.max(...courses.days);
  return (
    <Sheet
      title="Over the days"
      subtitle="Legs numbered and shaded by turns; dashed across: the limit; dashed down: the target."
    >
      <Stack gap="x4">
        {worthDrawing.map((spec) => (
          <Course
            key={spec.title}
            spec={spec}
            candidate={candidate}
            window={{ lastDay, targetDays }}
            show={show}
          />
        ))}
        <Small tone="third">
          {description.route.legs
            .map(
              (leg, index) =>
                `${index + 1} ${leg.name ?? `leg ${index + 1}`}: ${show.exact(leg.temperature_C, 'temperature_C')}, ${show.exact(leg.relative_humidity, 'fraction_as_percent')}`,
            )
            .slice(0, MOST_LEGS_NAMED)
            .join(' · ')}
        </Small>
      </Stack>
    </Sheet>
  );
}

interface CourseProps {
  spec: CourseSpec;
  candidate: Candidate;
  window: { lastDay: number; targetDays: number };
  show: Figures;
}

function Course({ spec, candidate, window, show }: CourseProps) {
  const { answer, description } = candidate;
  const days = answer.courses?.days ?? [];
  const kind = LIMIT_WORDS[spec.limits[0] ?? 'oxygen_uptake_mg_per_kg'].kind;
  const values = (spec.values ?? []).map((value) => show.shown(value, kind));
  const limits = spec.limits.flatMap((name) => {
    const limit = description.limits[name];
    return limit === undefined ? [] : [{ name, value: limit }];
  });
  const met = limits.flatMap(({ name, value }) => {
    const one = answer.limits[name];
    return one?.status === 'reached' && one.days <= window.lastDay
      ? [{ day: one.days, value: show.shown(value, kind) }]
      : [];
  })[0];
  const outcome =
    met === undefined
      ? 'No limit is met in the days drawn'
      : `The limit is met on day ${daysFigures(met.day)}`;
  return (
    <ChartWithTable
      label={`Table of ${spec.title.toLowerCase()}`}
      table={{
        caption: `${spec.title} over the days`,
        columns: [
          { key: 'day', title: 'Day', kind: 'figure' },
          { key: 'value', title: spec.title, unit: show.unit(kind), kind: 'figure' },
        ],
        rows: thinned(days.length).map((index) => ({
          id: String(index),
          day: daysFigures(days[index] ?? 0),
          value: show.figures(spec.values?.[index] ?? 0, kind),
        })),
      }}
    >
      <TimeCourse
        name={spec.title}
        sentence={`From ${show.text(spec.values?.[0] ?? 0, kind)} on day 0. ${outcome}.`}
        gas={spec.gas}
        axisTitle={`${spec.title}, ${show.unit(kind)}`}
        days={days}
        values={values}
        limits={limits.map(({ value }) => ({
          value: show.shown(value, kind),
          label: `limit ${show.tick(show.shown(value, kind))}`,
        }))}
        reached={met ?? null}
        targetDays={window.targetDays}
        lastDay={window.lastDay}
        legDays={description.route.legs.map((leg) => leg.days)}
        afterLast={description.route.after_last}
        formatValue={show.tick}
        formatDays={show.tick}
      />
    </ChartWithTable>
  );
}
