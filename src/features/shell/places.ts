import type { Role } from '../../../shared/contract/session';
import type { IconName } from '../../ui';

/** A place inside the account that has an address of its own. */
export interface Place {
  path: string;
  label: string;
  icon: IconName;
  roles: readonly Role[];
}

const KEEPERS: readonly Role[] = ['engineer', 'admin'];

/** In the order in which they stand. Rights are the API's; this only spares people what they cannot use. */
const PLACES: readonly Place[] = [
  { path: 'studies', label: 'Studies', icon: 'studies', roles: KEEPERS },
  { path: 'walls', label: 'Walls', icon: 'walls', roles: KEEPERS },
  { path: 'materials', label: 'Materials', icon: 'materials', roles: KEEPERS },
  { path: 'requests', label: 'Requests', icon: 'requests', roles: ['supplier'] },
  { path: 'reports', label: 'Reports', icon: 'reports', roles: ['client'] },
  { path: 'team', label: 'Team', icon: 'team', roles: ['admin'] },
  { path: 'packs', label: 'Packs', icon: 'packs', roles: KEEPERS },
  { path: 'foods', label: 'Foods', icon: 'foods', roles: KEEPERS },
  { path: 'routes', label: 'Routes', icon: 'routes', roles: KEEPERS },
  { path: 'account', label: 'Account', icon: 'account', roles: ['engineer', 'admin', 'supplier', 'client'] },
];

const MORE: Place = { path: 'more', label: 'More', icon: 'more', roles: KEEPERS };
const MAIN_PLACES_IN_BAR = 4;

export function placesOf(roles: readonly Role[]): Place[] {
  const mine = PLACES.filter((place) => place.roles.some((role) => roles.includes(role)));
  if (roles.includes('engineer') || !roles.includes('admin')) return mine;
  // Who is admin alone comes for the people first.
  return [...mine].sort((a, b) => Number(b.path === 'team') - Number(a.path === 'team'));
}

/** The phone's bottom bar: four places and the way to the rest, or all of them when they are few. */
export function barPlacesOf(roles: readonly Role[]): Place[] {
  const mine = placesOf(roles);
  return mine.length <= MAIN_PLACES_IN_BAR + 1 ? mine : [...mine.slice(0, MAIN_PLACES_IN_BAR), MORE];
}

export function placesBehindMore(roles: readonly Role[]): Place[] {
  const inBar = new Set(barPlacesOf(roles).map((place) => place.path));
  return placesOf(roles).filter((place) => !inBar.has(place.path));
}

/** Which place of the account an address belongs to: 'studies' for /a/x/studies/1. */
export function placeOfPath(pathname: string): string {
  return pathname.split('/')[3] ?? '';
}
