import type { Membership } from '../../../shared/contract/session';
import { landingHref } from '../../session';

const ROLE_WORDS = { engineer: 'engineer', admin: 'admin', supplier: 'supplier', client: 'client' } as const;

/** 'engineer and admin', 'supplier for Nordfolie' */
export function rolesInWords({ roles, company }: Pick<Membership, 'roles' | 'company'>): string {
  const words = roles.map((role) => ROLE_WORDS[role]).join(' and ');
  return company === null ? words : `${words} for ${company.name}`;
}

export function accountHref(membership: Membership): string {
  return landingHref(membership);
}
