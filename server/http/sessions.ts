import { DrizzlePostgreSQLAdapter } from '@lucia-auth/adapter-drizzle';
import { Lucia, TimeSpan, type Adapter } from 'lucia';
import type { Database } from '../db/client';
import { sessions, users } from '../db/schema';
import { sha256Hex } from './sha256';

export interface Sessions {
  /** Opens a session and returns the Set-Cookie line. */
  open: (userId: string) => Promise<string>;
  /** Whose session the cookie header names; `setCookie` when its life was prolonged. */
  find: (cookieHeader: string) => Promise<{ userId: string; sessionId: string; setCookie?: string } | null>;
  /** Ends one session and returns the Set-Cookie line that clears the cookie. */
  close: (sessionId: string) => Promise<string>;
  deleteExpired: () => Promise<void>;
}

const COOKIE_NAME = 'larderline_session';
const SESSION_LIFE = new TimeSpan(14, 'd');

export function openSessions({ db, isSecure }: { db: Database; isSecure: boolean }): Sessions {
  const lucia = new Lucia(hashing(new DrizzlePostgreSQLAdapter(db, sessions, users)), {
    sessionExpiresIn: SESSION_LIFE,
    sessionCookie: { name: COOKIE_NAME, attributes: { secure: isSecure, sameSite: 'lax' } },
  });
  return {
    async open(userId) {
      const session = await lucia.createSession(userId, {});
      return lucia.createSessionCookie(session.id).serialize();
    },
    async find(cookieHeader) {
      const sessionId = lucia.readSessionCookie(cookieHeader);
      if (!sessionId) return null;
      const { session } = await lucia.validateSession(sessionId);
      if (!session) return null;
      const setCookie = session.fresh ? lucia.createSessionCookie(session.id).serialize() : undefined;
      return { userId: session.userId, sessionId, setCookie };
    },
    async close(sessionId) {
      await lucia.invalidateSession(sessionId);
      return lucia.createBlankSessionCookie().serialize();
    },
    deleteExpired: () => lucia.deleteExpiredSessions(),
  };
}

/** Session ids stand in the database as their SHA-256 only: the cookie cannot be made from a dump. */
function hashing(adapter: Adapter): Adapter {
  return {
    async getSessionAndUser(sessionId) {
      const [session, user] = await adapter.getSessionAndUser(sha256Hex(sessionId));
      return session && user ? [{ ...session, id: sessionId }, user] : [null, null];
    },
    getUserSessions: (userId) => adapter.getUserSessions(userId),
    setSession: (session) => adapter.setSession({ ...session, id: sha256Hex(session.id) }),
    updateSessionExpiration: (sessionId, expiresAt) =>
      adapter.updateSessionExpiration(sha256Hex(sessionId), expiresAt),
    deleteSession: (sessionId) => adapter.deleteSession(sha256Hex(sessionId)),
    deleteUserSessions: (userId) => adapter.deleteUserSessions(userId),
    deleteExpiredSessions: () => adapter.deleteExpiredSessions(),
  };
}
