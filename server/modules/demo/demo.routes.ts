import {
  DEMO_MAILBOX_PATH,
  DEMO_PATH,
  demoMailboxResponseSchema,
  demoResponseSchema,
} from '../../../shared/contract/session';
import { notFound } from '../../http/app-error';
import { publicRoute, type RouteDefinition } from '../../http/route-definition';

export interface DemoPerson {
  role: string;
  name: string;
  email: string;
  password: string;
}

export interface DemoMail {
  id: string;
  receivedAt: Date;
  to: string;
  subject: string;
  text: string;
}

/** What only demo mode has; null in live mode, where these paths do not exist. */
export interface Demo {
  people: readonly DemoPerson[];
  listMail: () => readonly DemoMail[];
}

export function demoRoutes({ demo }: { demo: Demo | null }): RouteDefinition[] {
  return [
    publicRoute({
      method: 'get',
      path: DEMO_PATH,
      summary: 'Demo mode only: the people who can sign in, with their passwords',
      responses: { 200: demoResponseSchema },
      async handle() {
        if (demo === null) throw notFound();
        const people = demo.people.map(({ role, name, email, password }) => ({
          role,
          name,
          email,
          password,
        }));
        return { status: 200, body: { people } };
      },
    }),
    publicRoute({
      method: 'get',
      path: DEMO_MAILBOX_PATH,
      summary: 'Demo mode only: what was sent by e-mail, newest first',
      responses: { 200: demoMailboxResponseSchema },
      async handle() {
        if (demo === null) throw notFound();
        const items = demo.listMail().map(({ id, receivedAt, to, subject, text }) => ({
          id,
          received_at: receivedAt.toISOString(),
          to,
          subject,
          text,
        }));
        return { status: 200, body: { items } };
      },
    }),
  ];
}
