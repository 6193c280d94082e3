import type { LayerDescription, WallState } from '../../../shared/engine';
import { formatExact, formatQuantity, type DisplayUnitSystem } from '../../../shared/units/format';

/** How far, in K, an activation energy is trusted beyond the temperatures it was measured at. */
const TRUSTED_BEYOND_K = 15;
const ROUNDING = 1e-9;

/** Where the answer under the chosen conditions leans on more than was measured. */
export function wallWarnings(
  layers: LayerDescription[],
  state: WallState,
  unitSystem: DisplayUnitSystem,
): string[] {
  const warnings = layers.flatMap((layer, index) => {
    if (layer.kind === 'foil') return pinholeWarnings(layer);
    const faces = state.water.interface_relative_humidity.slice(index, index + 2);
    const gases = (['oxygen', 'water'] as const).flatMap((gas) => [
      ...humidityWarnings(`${layer.name}, ${gas}`, layer[gas].humidity_curve?.relative_humidity, faces),
      ...temperatureWarnings(`${layer.name}, ${gas}`, layer[gas], {
        temperature_C: state.temperature_C,
        unitSystem,
      }),
    ]);
    return layer.kind === 'coating' ? [...gases, ...pinholeWarnings(layer)] : gases;
  });
  return [...new Set(warnings)];
}

function humidityWarnings(words: string, points: number[] | undefined, faces: number[]): string[] {
  const first = points?.[0];
  const last = points?.at(-1);
  if (first === undefined || last === undefined) return [];
  const low = Math.min(...faces);
  const high = Math.max(...faces);
  if (low >= first - ROUNDING && high <= last + ROUNDING) return [];
  return [
    `${words}: its humidity curve runs from ${percent(first)} to ${percent(last)}. Here it sits at ` +
      `${percent(low) === percent(high) ? percent(low) : `${percent(low)} to ${percent(high)}`}, where the curve's last value is held.`,
  ];
}

interface MeasuredAt {
  reference_temperature_C?: number;
  activation_energy_J_per_mol?: number;
  measured_temperature_min_C?: number;
  measured_temperature_max_C?: number;
}

function temperatureWarnings(
  words: string,
  gas: MeasuredAt,
  at: { temperature_C: number; unitSystem: DisplayUnitSystem },
): string[] {
  const shown = (value: number) =>
    formatQuantity(value, 'temperature_C', { unitSystem: at.unitSystem, isExact: true }).text;
  const reference = gas.reference_temperature_C ?? 23;
  const min = gas.measured_temperature_min_C;
  const max = gas.measured_temperature_max_C;
  if (min === undefined && max === undefined) {
    if (Math.abs(at.temperature_C - reference) <= TRUSTED_BEYOND_K) return [];
    return [
      `${words}: the value holds at ${shown(reference)} and nobody says how far its temperature correction reaches; ` +
        `${shown(at.temperature_C)} is a long way from it.`,
    ];
  }
  const isBelow = min !== undefined && at.temperature_C < min - TRUSTED_BEYOND_K;
  const isAbove = max !== undefined && at.temperature_C > max + TRUSTED_BEYOND_K;
  if (!isBelow && !isAbove) return [];
  const range = [min, max]
    .filter((value) => value !== undefined)
    .map(shown)
    .join(' to ');
  return [`${words}: measured at ${range}; ${shown(at.temperature_C)} lies more than 15 K outside.`];
}

function pinholeWarnings(layer: LayerDescription): string[] {
  if (layer.kind === 'film' || layer.defects === undefined) return [];
  return [
    `${layer.name}: what passes its ${formatExact(layer.defects.density_per_m2)} pinholes per m² of ` +
      `${formatExact(layer.defects.diameter_um)} µm is an estimate.`,
  ];
}

function percent(fraction: number): string {
  return `${Math.round(fraction * 1000) / 10} %`;
}
