import { describe, expect, it } from 'vitest';
import type { RouteSpec } from '../../../shared/contract/routes';
import { NEW_ROUTE, routeFormValues, routeSpecFrom, validateRouteForm } from './route-form-values';
import { legsAfter } from './route-legs';

const KEPT: RouteSpec = {
  ...NEW_ROUTE,
  name: 'By sea',
  provenance: [{ field: 'temperatureC', kind: 'published', source: 'a table', note: '' }],
};

describe('the route form', () => {
  it('gives back what it was filled from, in either unit system', () => {
    for (const unitSystem of ['metric', 'us_customary'] as const) {
      const { typed: _typed, ...spec } = routeSpecFrom(routeFormValues(KEPT, unitSystem), {
        unitSystem,
        before: KEPT,
      });
      expect(spec).toEqual(KEPT);
    }
  });

  it('no longer claims the source once the conditions are others', () => {
    const values = routeFormValues(KEPT, 'metric');
    values.route.legs[0]!.temperature_C = '30';
    const spec = routeSpecFrom(values, { unitSystem: 'metric', before: KEPT });
    expect(spec.provenance.map((entry) => entry.field)).toEqual(['legs']);
  });

  it('says the bounds in the unit that was typed', () => {
    const values = routeFormValues(KEPT, 'us_customary');
    values.route.legs[0]!.temperature_C = '200';
    const errors = validateRouteForm({ unitSystem: 'us_customary', before: KEPT })(values);
    expect(errors.route?.legs?.[0]).toEqual({
      temperature_C: 'Leg 1, temperature: 200 °F does not fit; use -22 to 140 °F.',
    });
  });
});

describe('legsAfter', () => {
  const one = { legs: routeFormValues(KEPT, 'metric').route.legs, nextKey: 2 };

  it('begins a new leg from the conditions of the last', () => {
    const { legs } = legsAfter(one, { type: 'leg_added' });
    expect(legs[1]).toMatchObject({ key: 'leg-2', temperature_C: '23', relative_humidity: '50', days: '' });
  });

  it('moves and removes by key, and stays put at the ends', () => {
    const two = legsAfter(one, { type: 'leg_added' });
    const moved = legsAfter(two, { type: 'leg_moved', key: 'leg-2', by: -1 });
    expect(moved.legs.map((leg) => leg.key)).toEqual(['leg-2', 'leg-1']);
    expect(legsAfter(moved, { type: 'leg_moved', key: 'leg-2', by: -1 }).legs).toBe(moved.legs);
    expect(legsAfter(moved, { type: 'leg_removed', key: 'leg-2' }).legs.map((leg) => leg.key)).toEqual([
      'leg-1',
    ]);
  });
});
