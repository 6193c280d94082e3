import type { SessionResponse } from '../../../shared/contract/session';
import type { Queryable } from '../../db/client';
import { AppError } from '../../http/app-error';
import { findSessionOf } from './session.repository';

export async function getSession(db: Queryable, userId: string): Promise<SessionResponse> {
  const session = await findSessionOf(db, userId);
  if (!session) throw new AppError('session_missing', 'Sign in first.');
  return session;
}
