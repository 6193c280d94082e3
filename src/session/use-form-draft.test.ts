import { expect, it } from 'vitest';
import { isKeptForm } from './use-form-draft';

const fresh = { name: '', has_leaks: false, legs: [{ days: '1' }] };
const kept = {
  values: { name: 'Pouch', has_leaks: true, legs: [] },
  unitSystem: 'metric',
  baseRevisionId: null,
};

it('takes a form back that has today’s fields', () => {
  expect(isKeptForm(kept, fresh, 'metric')).toBe(true);
});

it.each([
  ['typed in other units', { ...kept, unitSystem: 'us_customary' }],
  ['without a field of today', { ...kept, values: { name: 'Pouch', legs: [] } }],
  ['with another kind of entry', { ...kept, values: { ...kept.values, legs: ['1'] } }],
  ['that is nothing', undefined],
])('drops a form %s', (_name, stored) => {
  expect(isKeptForm(stored, fresh, 'metric')).toBe(false);
});
