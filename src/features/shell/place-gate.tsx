import type { ReactNode } from 'react';
import type { Role } from '../../../shared/contract/session';
import { RoleGate, landingPlace, useAccount } from '../../session';
import { NotFoundScreen } from './not-found-screen';

/** Stands in the layout of a place. Whose place it is not finds what one finds at an address that does not exist. */
export function PlaceGate({ roles, children }: { roles: readonly Role[]; children: ReactNode }) {
  const account = useAccount();
  const homeHref = `${account.basePath}/${landingPlace(account.roles)}`;
  return (
    <RoleGate roles={roles} otherwise={<NotFoundScreen homeHref={homeHref} />}>
      {children}
    </RoleGate>
  );
}
