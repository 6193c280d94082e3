import { createContext, useContext } from 'react';
import type { ReactNode } from 'react';
import type { Membership, Role } from '../../shared/contract/session';

/** The account of the path one is at, as this person belongs to it. */
export interface Account {
  id: string;
  slug: string;
  name: string;
  currency: string;
  userId: string;
  roles: Role[];
  company: { id: string; name: string } | null;
  /** Begins every address inside the account: '/a/<slug>'. */
  basePath: string;
}

const AccountContext = createContext<Account | null>(null);

export function AccountProvider({ account, children }: { account: Account; children: ReactNode }) {
  return <AccountContext.Provider value={account}>{children}</AccountContext.Provider>;
}

export function useAccount(): Account {
  const account = useContext(AccountContext);
  if (account === null) throw new Error('useAccount is for screens under /a/<account>/.');
  return account;
}

export function toAccount(membership: Membership, userId: string): Account {
  const { account, roles, company } = membership;
  return { ...account, userId, roles, company, basePath: accountBasePath(account.slug) };
}

function accountBasePath(slug: string): string {
  return `/a/${encodeURIComponent(slug)}`;
}

export function hasRole(account: Pick<Account, 'roles'>, wanted: readonly Role[]): boolean {
  return account.roles.some((role) => wanted.includes(role));
}

/** The first thing each role sees, as a place inside the account. */
export function landingPlace(roles: readonly Role[]): 'studies' | 'team' | 'requests' | 'reports' {
  if (roles.includes('engineer')) return 'studies';
  if (roles.includes('admin')) return 'team';
  return roles.includes('supplier') ? 'requests' : 'reports';
}

export function landingHref(membership: Membership): string {
  return `${accountBasePath(membership.account.slug)}/${landingPlace(membership.roles)}`;
}
