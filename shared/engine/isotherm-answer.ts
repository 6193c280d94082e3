import { InputError } from './description/input-error';
import { MOISTURE_G_PER_G } from './description/ranges';
import { readHumidity } from './description/read-conditions';
import { readIsotherm } from './description/read-isotherm';
import { readNumber } from './description/read-number';
import type { IsothermDescription } from './description/storage-description';

/**
 * Moisture [g/g] at water activities [0…1]. Equations at isotherm.ts. Errors: InputError, also for a GAB isotherm with
 * K = 1 at an activity of 1, where moisture has no bound.
 */
export function isothermMoisture(isotherm: IsothermDescription, waterActivity: number[]): number[] {
  const read = readIsotherm(isotherm, 'isotherm');
  return waterActivity.map((value, i) => {
    const path = `water_activity[${i}]`;
    const activity = readHumidity(value, path, 'Water activity');
    if (read.isUnboundedAt(activity)) {
      throw new InputError(path, activity, 'With K = 1 moisture has no bound at an activity of 1; use less.');
    }
    return read.moisture(activity);
  });
}

/** Water activity [0…1] at moistures [g/g], held within 0 to 1. Errors: InputError. */
export function isothermActivity(isotherm: IsothermDescription, moisture: number[]): number[] {
  const read = readIsotherm(isotherm, 'isotherm');
  return moisture.map((value, i) =>
    read.activity(
      readNumber(value, `moisture_g_per_g[${i}]`, {
        range: MOISTURE_G_PER_G,
        label: 'Moisture',
        unit: 'g/g',
      }),
    ),
  );
}
