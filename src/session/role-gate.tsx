import type { ReactNode } from 'react';
import type { Role } from '../../shared/contract/session';
import { hasRole, useAccount } from './account';

export interface RoleGateProps {
  roles: readonly Role[];
  /** What everybody else sees: the same as for a place that does not exist. */
  otherwise?: ReactNode;
  children: ReactNode;
}

/** Spares people what they cannot use; the API is what keeps it from them. */
export function RoleGate({ roles, otherwise = null, children }: RoleGateProps) {
  const account = useAccount();
  return hasRole(account, roles) ? children : otherwise;
}
