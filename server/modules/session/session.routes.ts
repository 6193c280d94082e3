import { eq } from 'drizzle-orm';
import {
  PREFERENCES_PATH,
  preferencesSchema,
  SESSION_PATH,
  sessionResponseSchema,
  signInSchema,
} from '../../../shared/contract/session';
import type { Database } from '../../db/client';
import { users } from '../../db/schema';
import { publicRoute, signedInRoute, type RouteDefinition } from '../../http/route-definition';
import type { Sessions } from '../../http/sessions';
import { getSession } from './get-session';
import { signIn } from './sign-in';

export function sessionRoutes({ db, sessions }: { db: Database; sessions: Sessions }): RouteDefinition[] {
  return [
    publicRoute({
      method: 'post',
      path: SESSION_PATH,
      summary: 'Sign in',
      requestSchema: signInSchema.required(),
      responses: { 200: sessionResponseSchema },
      handle: ({ body, networkAddress }) => signIn({ db, sessions }, { ...body, networkAddress }),
    }),
    signedInRoute({
      method: 'get',
      path: SESSION_PATH,
      summary: 'Who is signed in, and what they are in which account',
      responses: { 200: sessionResponseSchema },
      handle: async ({ user }) => ({ status: 200, body: await getSession(db, user.userId) }),
    }),
    signedInRoute({
      method: 'delete',
      path: SESSION_PATH,
      summary: 'Sign out',
      responses: { 204: null },
      handle: async ({ user }) => ({ status: 204, setCookie: await sessions.close(user.sessionId) }),
    }),
    signedInRoute({
      method: 'patch',
      path: PREFERENCES_PATH,
      summary: 'Change what the person prefers',
      requestSchema: preferencesSchema.required(),
      responses: { 200: sessionResponseSchema },
      async handle({ user, body }) {
        await db.update(users).set({ unitSystem: body.unit_system }).where(eq(users.id, user.userId));
        return { status: 200, body: await getSession(db, user.userId) };
      },
    }),
  ];
}
