import type { AuditEntry, TeamResponse } from '../../../shared/contract/accounts';
import type { DataRow } from '../../ui';

export function personRow(person: TeamResponse['people'][number]): DataRow {
  return {
    id: person.user_id,
    name: person.name,
    roles: person.roles.join(' and '),
    company: person.company?.name ?? '–',
    email: person.email,
  };
}

export function auditRow(entry: AuditEntry): DataRow {
  return {
    id: entry.id,
    at: `${entry.at.slice(0, 10)} ${entry.at.slice(11, 16)}`,
    who: entry.actor_name ?? 'Larderline or an erased person',
    what: inWords(entry.action),
    subject: inWords(entry.subject_kind),
  };
}

/** Codes of the log as words: 'laminate.revised' → 'laminate revised'. */
export function inWords(code: string): string {
  return code.replace(/[._-]+/g, ' ');
}
