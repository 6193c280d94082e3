import { gabIsotherm, linearIsotherm, type Isotherm } from '../isotherm';
import { GAB_C, GAB_K, GAB_MONOLAYER, ISOTHERM_INTERCEPT, ISOTHERM_SLOPE } from './ranges';
import { readChoice, readNumber, readObject } from './read-number';
import type { IsothermDescription } from './storage-description';

/** A sorption isotherm. Errors: InputError for a kind or constants that cannot be computed with. */
export function readIsotherm(value: unknown, path: string): Isotherm {
  const isotherm = readObject<IsothermDescription>(value, path, 'Isotherm');
  const type = readChoice(isotherm.type, `${path}.type`, {
    choices: ['linear', 'GAB'] as const,
    label: 'Isotherm',
  });
  const given = isotherm as unknown as Record<string, unknown>;
  if (type === 'linear') {
    return linearIsotherm(
      readNumber(given.slope_g_per_g, `${path}.slope_g_per_g`, {
        range: ISOTHERM_SLOPE,
        label: 'Slope',
        unit: 'g/g',
      }),
      readNumber(given.intercept_g_per_g, `${path}.intercept_g_per_g`, {
        range: ISOTHERM_INTERCEPT,
        label: 'Intercept',
        unit: 'g/g',
      }),
    );
  }
  return gabIsotherm(
    readNumber(given.Xm_g_per_g, `${path}.Xm_g_per_g`, {
      range: GAB_MONOLAYER,
      label: 'Monolayer moisture',
      unit: 'g/g',
    }),
    readNumber(given.C, `${path}.C`, { range: GAB_C, label: 'C of the isotherm' }),
    readNumber(given.K, `${path}.K`, { range: GAB_K, label: 'K of the isotherm' }),
  );
}
