import * as yup from 'yup';
import { closedObject, idField, nullableIdField, timeField } from './fields';
import { pageSchema } from './kept-things';
import { ROLES, type Role } from './session';

/** GET, admin only: who belongs to the account. */
export function teamPath(accountId: string): string {
  return `/api/accounts/${accountId}/team`;
}

/** GET, admin only: what happened, newest first, a page keyed by id. */
export function auditEntriesPath(accountId: string): string {
  return `/api/accounts/${accountId}/audit-entries`;
}

export interface TeamResponse {
  seats_in_use: number;
  people: {
    user_id: string;
    name: string;
    email: string;
    roles: Role[];
    company: { id: string; name: string } | null;
  }[];
}

export interface AuditEntry {
  id: string;
  at: string;
  /** Resolved from the erasable table; null once erased or for the system. */
  actor_name: string | null;
  action: string;
  subject_kind: string;
  subject_id: string | null;
}

export const teamResponseSchema = closedObject({
  seats_in_use: yup.number().strict().integer().min(0).required(),
  people: yup
    .array(
      closedObject({
        user_id: idField('User'),
        name: yup.string().strict().required(),
        email: yup.string().strict().required(),
        roles: yup.array(yup.string().strict().oneOf(ROLES).required()).strict().required(),
        company: closedObject({ id: idField('Company'), name: yup.string().strict().required() })
          .nullable()
          .defined(),
      }),
    )
    .strict()
    .required(),
});

export const auditPageSchema = pageSchema(
  closedObject({
    id: idField('Entry'),
    at: timeField(),
    actor_name: yup.string().strict().nullable().defined(),
    action: yup.string().strict().required(),
    subject_kind: yup.string().strict().required(),
    subject_id: nullableIdField(),
  }),
);
