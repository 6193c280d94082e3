import { describe, expect, it } from 'vitest';
import { landingPlace } from '../../session/account';
import { barPlacesOf, placeOfPath, placesBehindMore, placesOf } from './places';
import type { Role } from '../../../shared/contract/session';

const ROLE_SETS: Role[][] = [['engineer'], ['admin'], ['engineer', 'admin'], ['supplier'], ['client']];
const paths = (places: { path: string }[]) => places.map((place) => place.path);

describe('places', () => {
  it.each(ROLE_SETS)('shows %s at most five in the bar, the landing place among them', (...roles) => {
    const bar = paths(barPlacesOf(roles));
    expect(bar.length).toBeLessThanOrEqual(5);
    expect(bar).toContain(landingPlace(roles));
  });

  it.each(ROLE_SETS)('reaches every place of %s by the bar or behind More', (...roles) => {
    const reached = [...barPlacesOf(roles), ...placesBehindMore(roles)].filter(
      (place) => place.path !== 'more',
    );
    expect(paths(reached).sort()).toEqual(paths(placesOf(roles)).sort());
  });

  it('keeps guests to their own screens', () => {
    expect(paths(placesOf(['supplier']))).toEqual(['requests', 'account']);
    expect(paths(placesOf(['client']))).toEqual(['reports', 'account']);
    expect(paths(placesOf(['engineer']))).not.toContain('team');
    expect(paths(placesOf(['admin']))[0]).toBe('team');
  });

  it('knows the place of an address', () => {
    expect(placeOfPath('/a/haselhof/studies/0193')).toBe('studies');
    expect(placeOfPath('/a/haselhof')).toBe('');
  });
});
