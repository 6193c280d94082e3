import { uptakeMgPerKg } from './description/read-storage';
import type { LimitName } from './description/storage-description';
import type { StorageRun } from './storage-run';
import type { StorageSystem } from './storage-system';

/**
 * The value of each limited quantity as time goes to infinity with the last leg held; null where it grows without end.
 * Closed form: moisture comes to rest with the air outside, if anything lets water through; then oxygen at that
 * humidity. An absorber is used up in the end wherever oxygen enters.
 */
export function settledValues(system: StorageSystem, run: StorageRun): Record<LimitName, number | null> {
  const { food } = system;
  const conditions = run.conditions[run.conditions.length - 1];
  const { pack, humidity } = conditions;
  const { isotherm } = food;
  const now = run.moisture.moisture;
  let moisture: number | null = now;
  let inside = food.insideHumidity;
  if (isotherm) {
    inside = isotherm.activity(now);
    pack.conduct(humidity, inside);
    if (pack.water > 0 && inside !== humidity) {
      inside = humidity;
      moisture = isotherm.isUnboundedAt(humidity) ? null : isotherm.moisture(humidity);
    }
  }
  pack.conduct(humidity, inside);
  const { oxygen } = run;
  const conductance = pack.oxygen;
  const toPercent = 100 / system.totalPressurePa;
  const uptakeNow = uptakeMgPerKg(oxygen.uptakeMol, food.massKg);
  let uptake: number | null = uptakeNow;
  let headspacePa = 0;
  if (conductance > 0) {
    if (food.oxygenMode !== 'none') uptake = null;
    if (food.oxygenMode === 'none') headspacePa = conditions.outsideOxygenPa;
    if (food.oxygenMode === 'rate') {
      headspacePa = (conductance * conditions.outsideOxygenPa) / (conductance + conditions.reactionSi);
    }
  } else if (food.oxygenMode === 'none') {
    headspacePa = oxygen.headspaceMol * conditions.pressurePerMol;
  } else {
    // Nothing more enters: the food takes what is left in the headspace.
    uptake = uptakeMgPerKg(oxygen.uptakeMol + oxygen.headspaceMol, food.massKg);
  }
  return {
    oxygen_uptake_mg_per_kg: uptake,
    headspace_oxygen_percent: headspacePa * toPercent,
    moisture_max_g_per_g: moisture,
    moisture_min_g_per_g: moisture,
  };
}
