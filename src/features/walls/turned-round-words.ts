import { formatNumber, formatQuantity, type DisplayUnitSystem } from '../../../shared/units/format';

export interface WayRound {
  oxygenPermeanceSi: number;
  /** Outside face to inside face: one more than layers. */
  interfaceHumidity: number[];
}

export interface TurnedRoundComparison {
  asBuilt: WayRound;
  turned: WayRound;
  /** The layer whose oxygen barrier feels humidity and holds most of the resistance; null where none feels it. */
  sensitive: { name: string; index: number } | null;
}

/** Below this the two ways round read the same in three figures. */
const SAME_WITHIN = 0.004;

/** What turning the wall round does to its oxygen barrier, and why, in two sentences. */
export function turnedRoundInWords(comparison: TurnedRoundComparison, unitSystem: DisplayUnitSystem): string {
  const { asBuilt, turned, sensitive } = comparison;
  if (asBuilt.oxygenPermeanceSi === 0 || turned.oxygenPermeanceSi === 0) {
    return 'Nothing passes either way: turning this wall round changes nothing.';
  }
  const ratio = turned.oxygenPermeanceSi / asBuilt.oxygenPermeanceSi;
  if (sensitive === null) {
    return 'Turning it round changes nothing for oxygen: no layer of this wall feels humidity.';
  }
  const now = formatQuantity(asBuilt.oxygenPermeanceSi, 'oxygen_permeance_mol_per_m2_s_Pa', { unitSystem });
  const then = formatQuantity(turned.oxygenPermeanceSi, 'oxygen_permeance_mol_per_m2_s_Pa', { unitSystem });
  const humidityNow = layerHumidity(asBuilt, sensitive.index);
  const humidityThen = layerHumidity(turned, turned.interfaceHumidity.length - 2 - sensitive.index);
  const why = `${sensitive.name} then sits at ${percent(humidityThen)} instead of ${percent(humidityNow)}`;
  if (Math.abs(Math.log(ratio)) < SAME_WITHIN) {
    return `Turning it round hardly changes it under these humidities: ${now.text} either way. ${why}.`;
  }
  const change =
    ratio > 1
      ? `${formatNumber(ratio)} times the oxygen passes`
      : `only ${formatNumber(100 * ratio)} % of the oxygen passes`;
  const effect = ratio > 1 ? 'where it lets more oxygen pass' : 'where it holds oxygen better';
  return `Turned round, ${change}: ${then.figures} instead of ${now.text}. ${why}, ${effect}.`;
}

/** The mean of the humidities at a layer's two faces. */
function layerHumidity(way: WayRound, index: number): number {
  const outer = way.interfaceHumidity[index] ?? NaN;
  const inner = way.interfaceHumidity[index + 1] ?? NaN;
  return (outer + inner) / 2;
}

function percent(fraction: number): string {
  return `${Math.round(fraction * 100)} % humidity`;
}
