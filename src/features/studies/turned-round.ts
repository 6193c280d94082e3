import { evaluate } from '../../../shared/engine';
import type { EvaluationAnswer, EvaluationDescription } from '../../../shared/engine/description/evaluation';
import type { LayerDescription } from '../../../shared/engine/description/storage-description';

export interface SensitiveLayer {
  name: string;
  /** Mean of the humidities at its two faces, fraction. */
  humidityAsLaid: number;
  humidityTurned: number;
}

/** The same wall both ways round, as one leg begins. */
export interface TurnedRoundLeg {
  oxygenPermeanceAsLaid: number;
  oxygenPermeanceTurned: number;
  sensitive: SensitiveLayer[];
}

/** The whole description with every wall turned round: inside face out. */
function turnedDescription(description: EvaluationDescription): EvaluationDescription {
  return {
    ...description,
    report_days: undefined,
    pack: {
      ...description.pack,
      walls: description.pack.walls.map((wall) => ({ ...wall, layers: [...wall.layers].reverse() })),
    },
  };
}

/** Computed where it is read: the stored answer knows one way round only. */
export function evaluateTurned(description: EvaluationDescription): EvaluationAnswer {
  return evaluate(turnedDescription(description));
}

export function compareOnLeg(options: {
  layers: LayerDescription[];
  asLaid: EvaluationAnswer;
  turned: EvaluationAnswer;
  wall: number;
  leg: number;
}): TurnedRoundLeg | null {
  const { layers, asLaid, turned, wall, leg } = options;
  const here = asLaid.walls[wall]?.legs.find((candidate) => candidate.leg === leg);
  const there = turned.walls[wall]?.legs.find((candidate) => candidate.leg === leg);
  if (here === undefined || there === undefined) return null;
  return {
    oxygenPermeanceAsLaid: here.oxygen.permeance_mol_per_m2_s_Pa,
    oxygenPermeanceTurned: there.oxygen.permeance_mol_per_m2_s_Pa,
    sensitive: layers.flatMap((layer, index) =>
      feelsHumidity(layer)
        ? [
            {
              name: layer.name,
              humidityAsLaid: meanAt(here.water.interface_relative_humidity, index),
              humidityTurned: meanAt(there.water.interface_relative_humidity, layers.length - 1 - index),
            },
          ]
        : [],
    ),
  };
}

function feelsHumidity(layer: LayerDescription): boolean {
  return layer.kind !== 'foil' && layer.oxygen.humidity_curve !== undefined;
}

function meanAt(interfaces: number[], index: number): number {
  return ((interfaces[index] ?? 0) + (interfaces[index + 1] ?? 0)) / 2;
}

/** Changes below this part are not worth a reason. */
const SAME_WITHIN = 0.005;

/** Whether the leg says one way round passes less oxygen while the route says the other way keeps it out longer. */
export function goAgainstEachOther(
  { oxygenPermeanceAsLaid, oxygenPermeanceTurned }: TurnedRoundLeg,
  asLaid: EvaluationAnswer,
  turned: EvaluationAnswer,
): boolean {
  const isTighterTurned = oxygenPermeanceTurned < oxygenPermeanceAsLaid;
  return (['oxygen_uptake_mg_per_kg', 'headspace_oxygen_percent'] as const).some((name) => {
    const here = oxygenDay(asLaid, name);
    const there = oxygenDay(turned, name);
    return Math.abs(there / here - 1) > SAME_WITHIN && there > here !== isTighterTurned;
  });
}

function oxygenDay(
  answer: EvaluationAnswer,
  name: 'oxygen_uptake_mg_per_kg' | 'headspace_oxygen_percent',
): number {
  const limit = answer.limits[name];
  return limit?.status === 'reached' ? limit.days : Infinity;
}

/** Why the two ways round differ, or why they do not. */
export function turnedRoundReason(comparison: TurnedRoundLeg, percent: (fraction: number) => string): string {
  const { oxygenPermeanceAsLaid: asLaid, oxygenPermeanceTurned: turned, sensitive } = comparison;
  const change = asLaid > 0 ? turned / asLaid - 1 : turned > 0 ? Infinity : 0;
  if (sensitive.length === 0) {
    return Math.abs(change) <= SAME_WITHIN
      ? 'No layer of this wall feels humidity, so it passes the same oxygen both ways round.'
      : 'No layer of this wall feels humidity; what differs is which polymer covers the pinholes from which side.';
  }
  const seen = sensitive
    .map(
      (layer) =>
        `${layer.name} sits at ${percent(layer.humidityAsLaid)} humidity as laid and at ${percent(layer.humidityTurned)} turned round`,
    )
    .join('; ');
  if (Math.abs(change) <= SAME_WITHIN) {
    return `${seen}: too little difference on this leg to change the oxygen that passes.`;
  }
  const direction = change > 0 ? 'more' : 'less';
  return `${seen}, and its oxygen barrier depends on that humidity: turned round the wall lets ${direction} oxygen through.`;
}
