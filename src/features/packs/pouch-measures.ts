import { InputError, pouchArea, type PouchArea } from '../../../shared/engine';
import type { PackSpec, PouchForm } from '../../../shared/contract/packs';

/** Null where the dimensions make no pouch. */
export function pouchMeasures(form: PouchForm): PouchArea | null {
  try {
    return pouchArea(form);
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}

/** m²; NaN where the dimensions make no pouch. */
export function areaOfForm(form: PackSpec['form']): number {
  if (form.type === 'area') return form.area_m2;
  if (form.type === 'tray') return form.tray_area_m2 + form.lid_area_m2;
  return pouchMeasures(form)?.area_m2 ?? NaN;
}
