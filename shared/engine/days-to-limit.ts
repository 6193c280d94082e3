import { DAY_S } from '../units';
import type { LimitName } from './description/storage-description';
import { RELATIVE_TOLERANCE, runStorage, type StorageRun } from './storage-run';
import type { StorageSystem } from './storage-system';

/** Seconds at which each limit is reached in a run, null where it is not. */
export function secondsToLimit(run: StorageRun, limit: LimitName): number | null {
  switch (limit) {
    case 'oxygen_uptake_mg_per_kg':
      return run.oxygen.uptakeReachedAtS;
    case 'headspace_oxygen_percent':
      return run.oxygen.headspaceReachedAtS;
    case 'moisture_max_g_per_g':
      return run.moisture.maxReachedAtS;
    case 'moisture_min_g_per_g':
      return run.moisture.minReachedAtS;
  }
}

/** The system with one limit and no reports, followed to a horizon: nothing else costs time. */
export function onlyLimit(system: StorageSystem, limit: LimitName, horizonS: number): StorageSystem {
  return {
    ...system,
    limits: { [limit]: system.limits[limit] },
    horizonS,
    reportS: [],
  };
}

/** Days to a limit; Infinity where the horizon comes first. Cost: a run. */
export function daysToLimit(
  system: StorageSystem,
  limit: LimitName,
  relativeTolerance: number = RELATIVE_TOLERANCE,
): number {
  const atS = secondsToLimit(runStorage(system, 0, relativeTolerance), limit);
  return atS === null ? Infinity : atS / DAY_S;
}
