import { describe, expect, it } from 'vitest';
import type { FoodSpec } from '../../api/kept-things-queries';
import { foodFormValues, foodSpecFrom, NEW_FOOD, validateFoodForm } from './food-form-values';

const KEPT: FoodSpec = {
  name: 'Nuts',
  food: {
    mass_kg: 0.2,
    oxygen_mode: 'at_once',
    isotherm: { type: 'GAB', Xm_g_per_g: 0.0275, C: 10, K: 0.918 },
    initial_moisture_g_per_g: 0.02,
  },
  limits: { oxygen_uptake_mg_per_kg: 40, moisture_max_g_per_g: 0.0371 },
  absorber_capacity_cm3_STP: 0,
  cautions: ['Keep dark.'],
  notes: '',
  provenance: [
    { field: 'oxygen.limitMgPerKg', kind: 'memory', source: 'market life', note: '' },
    { field: 'moisture.isotherm', kind: 'published', source: 'a paper', note: '' },
  ],
};
const context = { unitSystem: 'metric' as const, before: KEPT };

describe('the food form', () => {
  it('gives back what it was filled from', () => {
    const { typed, ...spec } = foodSpecFrom(foodFormValues(KEPT, 'metric'), context);
    expect(spec).toEqual(KEPT);
    expect(typed).toBeUndefined();
    expect(validateFoodForm(context)(foodFormValues(KEPT, 'metric'))).toEqual({});
  });

  it('keeps a source only with the number that it speaks of', () => {
    const values = foodFormValues(KEPT, 'metric');
    values.limits.oxygen_uptake_mg_per_kg = '20';
    values.ground = { kind: 'own measurement', source: '' };
    const spec = foodSpecFrom(values, context);
    expect(spec.provenance.map((entry) => entry.field)).toEqual(['moisture.isotherm', 'limits']);
  });

  it('asks for a limit, and leaves moisture limits out where moisture is not followed', () => {
    const values = foodFormValues(NEW_FOOD, 'metric');
    values.name = 'Rusks';
    values.limits.moisture_max_g_per_g = '5';
    const errors = validateFoodForm({ unitSystem: 'metric', before: NEW_FOOD })(values);
    expect(errors.limits).toBe('Limits: give at least one, oxygen or moisture.');
  });
});
