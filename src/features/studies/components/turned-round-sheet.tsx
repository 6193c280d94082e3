import { useMemo } from 'react';
import { View } from 'react-native';
import type { Candidate } from '../../../../shared/contract/studies';
import type { EvaluationAnswer, WallOnLeg } from '../../../../shared/engine/description/evaluation';
import { Body, DataTable, Sheet, Small } from '../../../ui';
import { LIMIT_WORDS, daysFigures } from '../answer-words';
import { compareOnLeg, evaluateTurned, goAgainstEachOther, turnedRoundReason } from '../turned-round';
import { useFigures } from '../use-figures';
import { legTitle } from './wall-sheet';

export interface TurnedRoundSheetProps {
  candidate: Candidate;
  wallIndex: number;
  leg: WallOnLeg;
}

/** What the wall does with its inside face out, and why that differs. */
export function TurnedRoundSheet({ candidate, wallIndex, leg }: TurnedRoundSheetProps) {
  const show = useFigures();
  const turned = useMemo(() => evaluateTurned(candidate.description), [candidate.description]);
  const comparison = compareOnLeg({
    layers: candidate.description.pack.walls[wallIndex]?.layers ?? [],
    asLaid: candidate.answer,
    turned,
    wall: wallIndex,
    leg: leg.leg,
  });
  if (comparison === null) return null;
  return (
    <Sheet
      title="Turned round"
      subtitle={`Inside face out. Permeance as leg ${leg.leg + 1} begins; days over the whole route.`}
    >
      <Body>{`${legTitle(leg)}. ${turnedRoundReason(comparison, show.percent)}`}</Body>
      <DataTable
        caption="Both ways round"
        isCaptionHidden
        columns={[
          { key: 'what', title: 'What' },
          { key: 'asLaid', title: 'As laid', kind: 'figure' },
          { key: 'turned', title: 'Turned', kind: 'figure' },
        ]}
        rows={[
          {
            id: 'permeance',
            what: (
              <View>
                <Small tone="ink">{`Oxygen permeance on leg ${leg.leg + 1}`}</Small>
                <Small tone="third">{show.unit('oxygen_permeance_mol_per_m2_s_Pa')}</Small>
              </View>
            ),
            asLaid: show.figures(comparison.oxygenPermeanceAsLaid, 'oxygen_permeance_mol_per_m2_s_Pa'),
            turned: show.figures(comparison.oxygenPermeanceTurned, 'oxygen_permeance_mol_per_m2_s_Pa'),
          },
          ...limitComparison(candidate.answer, turned),
          {
            id: 'life',
            what: 'Days kept, whole route',
            asLaid: lifeOf(candidate.answer),
            turned: lifeOf(turned),
          },
        ]}
      />
      {goAgainstEachOther(comparison, candidate.answer, turned) ? (
        <Small>
          {`The days count every leg, and the humidities differ from leg to leg: leg ${leg.leg + 1} alone does not tell which way round keeps longer.`}
        </Small>
      ) : null}
      <Small tone="third">{`“Turned” is a preview by engine ${turned.engine_version} in this browser; it is not kept.`}</Small>
    </Sheet>
  );
}

function limitComparison(asLaid: EvaluationAnswer, turned: EvaluationAnswer) {
  return (['oxygen_uptake_mg_per_kg', 'headspace_oxygen_percent'] as const).flatMap((name) => {
    const here = asLaid.limits[name];
    const there = turned.limits[name];
    if (here === undefined || there === undefined) return [];
    return [
      {
        id: name,
        what: `Day of the ${LIMIT_WORDS[name].cause} limit, whole route`,
        asLaid: here.status === 'reached' ? daysFigures(here.days) : 'not reached',
        turned: there.status === 'reached' ? daysFigures(there.days) : 'not reached',
      },
    ];
  });
}

function lifeOf(answer: EvaluationAnswer): string {
  return answer.shelf_life_days === null ? 'no limit' : daysFigures(answer.shelf_life_days);
}
