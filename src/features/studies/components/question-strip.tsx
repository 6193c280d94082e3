import type { StudyWithResult } from '../../../../shared/contract/studies';
import { useAccount } from '../../../session';
import { Strip, useIsWide } from '../../../ui';
import { daysFigures } from '../answer-words';
import { studyPlaces } from '../study-places';
import { useFigures, type Figures } from '../use-figures';

/** What is asked: food, pack, route, target, each leading to where it is kept. */
export function QuestionStrip({ study }: { study: StudyWithResult }) {
  const places = studyPlaces(useAccount());
  const show = useFigures();
  const isWide = useIsWide();
  const { spec } = study.revision;
  const short = isWide ? null : shortValues(study, show);
  return (
    <Strip
      label="The question"
      cells={[
        { label: 'food', value: short?.food ?? study.food_name, href: places.thing('foods', spec.food_id) },
        { label: 'pack', value: short?.pack ?? study.pack_name, href: places.thing('packs', spec.pack_id) },
        {
          label: 'route',
          value: short?.route ?? study.route_name,
          href: places.thing('routes', spec.route_id),
        },
        { label: 'target', value: `${daysFigures(spec.target_days)} days`, href: places.edit(study.id) },
      ]}
    />
  );
}

/** A phone has no room for four names: how much, how large, how many legs; the title block has the names. */
function shortValues(
  study: StudyWithResult,
  show: Figures,
): { food: string; pack: string; route: string } | null {
  const description = study.latest_result?.candidates[0]?.description;
  if (description === undefined) return null;
  const { food, pack, route } = description;
  const area = pack.walls.reduce((sum, wall) => sum + wall.area_m2, 0);
  return {
    food: show.exact(food.mass_kg, 'mass_kg'),
    pack: show.text(area, 'area_m2'),
    route: route.legs.length === 1 ? '1 leg' : `${route.legs.length} legs`,
  };
}
