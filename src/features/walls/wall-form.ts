import { laminateSpecSchema } from '../../../shared/contract/laminates';
import { RULES } from '../../../shared/contract/rules';
import { parseNumber } from '../../../shared/units/format';
import { faultAsTyped, formikErrors, specFaults } from '../../api/kept-forms/spec-faults';
import type { FormikErrors } from 'formik';
import { specFromDraft, type WallDraft } from './wall-draft';

const GAUGE_PATH = /^(layers\[(\d+)\])\.thickness_um$/;

/** Where the schema's path stands in the form: a gauge is the text in its field. */
export function wallFieldName(path: string): string {
  return path.replace(/^spec\./, '').replace(GAUGE_PATH, '$1.gauge.text');
}

/** Judged by the contract's schema; gauges in the unit they were typed in. */
export function wallFaults(wall: WallDraft, suggestedName: string): FormikErrors<WallDraft> {
  const faults: Record<string, string> = {};
  for (const [path, message] of Object.entries(
    specFaults(laminateSpecSchema, specFromDraft(wall, suggestedName)),
  )) {
    const gauge = wall.layers[Number(GAUGE_PATH.exec(path)?.[2] ?? -1)]?.gauge;
    const isPlain = gauge === undefined || (gauge.unit === 'um' && Number.isFinite(parseNumber(gauge.text)));
    faults[wallFieldName(path)] = isPlain
      ? message
      : faultAsTyped(message, {
          text: gauge.text,
          kind: 'thickness_um',
          unitSystem: gauge.unit === 'um' ? 'metric' : 'us_customary',
          min: RULES.gauge.min,
          max: RULES.gauge.max,
          isMinExcluded: RULES.gauge.isMinExcluded,
        });
  }
  return formikErrors<WallDraft>(faults);
}

/** A stored draft may be of an older shape; then it is dropped. */
export function isWallDraft(value: unknown): value is WallDraft {
  return (
    typeof value === 'object' &&
    value !== null &&
    'name' in value &&
    typeof value.name === 'string' &&
    'isNameTyped' in value &&
    typeof value.isNameTyped === 'boolean' &&
    'nextKey' in value &&
    typeof value.nextKey === 'number' &&
    'layers' in value &&
    Array.isArray(value.layers) &&
    value.layers.every(isDraftLayer)
  );
}

function isDraftLayer(value: unknown): boolean {
  if (typeof value !== 'object' || value === null) return false;
  if (!('key' in value && 'material_id' in value && 'material_revision_id' in value && 'gauge' in value))
    return false;
  const { gauge } = value;
  return (
    typeof gauge === 'object' &&
    gauge !== null &&
    'text' in gauge &&
    typeof gauge.text === 'string' &&
    'unit' in gauge &&
    (gauge.unit === 'um' || gauge.unit === 'mil') &&
    'storedUm' in gauge
  );
}
