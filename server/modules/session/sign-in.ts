import type { Database } from '../../db/client';
import { AppError } from '../../http/app-error';
import type { Answer } from '../../http/route-definition';
import type { Sessions } from '../../http/sessions';
import { recordAuditEntry } from '../audit/record-audit-entry';
import { getSession } from './get-session';
import { verifyPassword } from './hash-password';
import { countAttempt, forgetAttempts } from './limit-attempts';
import { findCredentials } from './session.repository';

interface SignIn {
  email: string;
  password: string;
  networkAddress: string;
}

export async function signIn(
  { db, sessions }: { db: Database; sessions: Sessions },
  { email, password, networkAddress }: SignIn,
): Promise<Answer> {
  const attempt = await countAttempt(db, { kind: 'sign_in', email, networkAddress });
  const credentials = await findCredentials(db, email);
  const isRight = await verifyPassword(credentials?.passwordHash, password);
  if (!isRight || !credentials) {
    throw new AppError(
      'sign_in_refused',
      'E-mail and password do not fit together. Check both, or ask for a new password.',
    );
  }
  await forgetAttempts(db, attempt);
  const setCookie = await sessions.open(credentials.userId);
  await recordAuditEntry(db, {
    accountId: null,
    actorUserId: credentials.userId,
    action: 'session.opened',
    subjectKind: 'user',
    subjectId: credentials.userId,
  });
  return { status: 200, body: await getSession(db, credentials.userId), setCookie };
}
