import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { pino } from 'pino';
import { createApp, routeTable } from '../../server/create-app';
import { openDatabase, type Database } from '../../server/db/client';
import {
  insertAccount,
  insertCompany,
  insertMembership,
  insertPerson,
} from '../../server/db/seed/people-builders';
import { startMailSink, type MailSink } from '../../server/fakes/mail-sink';
import type { RouteDefinition } from '../../server/http/route-definition';
import { originsOf } from '../../server/http/origin';
import { openSessions } from '../../server/http/sessions';
import { bossJobs } from '../../server/jobs/boss-jobs';
import { engineWorkers } from '../../server/jobs/engine-workers';
import { smtpMail } from '../../server/mail/smtp-mail';
import { sendResetMail } from '../../server/modules/password-resets/send-reset-mail';
import { hashPassword } from '../../server/modules/session/hash-password';
import type { Role } from '../../shared/contract/session';
import { createTestDatabase, type TestDatabase } from './test-database';

/** A real server over a real database of its own, in this process, on a free port of loopback. */
export interface TestServer {
  baseUrl: string;
  db: Database;
  database: TestDatabase;
  routes: RouteDefinition[];
  mailSink: MailSink;
  /** Log lines, as written. */
  log: string[];
  /** A new person with these roles in the account (a new one by default), signed in. */
  signInAs: (roles: readonly Role[], options?: { accountId?: string }) => Promise<TestClient>;
  /** Somebody who is not signed in. */
  stranger: () => TestClient;
  close: () => Promise<void>;
}

export interface TestClient {
  accountId: string;
  userId: string;
  email: string;
  cookie: string;
  get: (path: string) => Promise<TestAnswer>;
  send: (method: string, path: string, options?: SendOptions) => Promise<TestAnswer>;
}

export interface SendOptions {
  body?: unknown;
  /** Sent as it is, instead of a body. */
  raw?: string | Uint8Array<ArrayBuffer>;
  headers?: Record<string, string>;
  /** Made up when absent and the method is POST. */
  idempotencyKey?: string;
  ifMatch?: string;
}

export interface TestAnswer {
  status: number;
  headers: Headers;
  text: string;
  /** Parsed JSON; tests read it freely. */
  // eslint-disable-next-line @typescript-eslint/no-explicit-any
  json: any;
}

export const TEST_PASSWORD = 'a password of tests';
const DEMO_PERSON = { role: 'engineer', name: 'Demo', email: 'demo@test.example', password: TEST_PASSWORD };

let passwordHash: Promise<string> | undefined;
let keys = 0;

export async function startTestServer({ isDemo = true }: { isDemo?: boolean } = {}): Promise<TestServer> {
  const database = await createTestDatabase();
  const { db, sql, close: closeDatabase } = openDatabase(database.url);
  const log: string[] = [];
  const logger = pino({ level: 'info' }, { write: (line: string) => void log.push(line) });
  const mailSink = await startMailSink();
  const mail = smtpMail({ smtpUrl: mailSink.smtpUrl, from: 'Tests <tests@test.example>' });
  const jobs = bossJobs({ sql, logger });
  const engine = engineWorkers({ threads: 1 });

  const server = createServer();
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  const baseUrl = `http://127.0.0.1:${port}`;
  const deps = {
    db,
    sessions: openSessions({ db, isSecure: false }),
    jobs,
    engine,
    demo: isDemo ? { people: [DEMO_PERSON], listMail: () => mailSink.list() } : null,
    logger,
    version: '0.0.0-test',
    isSecure: false,
    allowedOrigins: originsOf(baseUrl),
    webDir: 'no-web-build-in-tests',
    isCheckingAnswers: true,
  };
  server.on('request', createApp(deps));
  await jobs.start({
    'send-password-reset': (data) => sendResetMail({ db, mail, publicUrl: baseUrl }, data),
  });

  const stranger = () => client(baseUrl, { accountId: '', userId: '', email: '', cookie: '' });
  return {
    baseUrl,
    db,
    database,
    routes: routeTable(deps),
    mailSink,
    log,
    stranger,
    async signInAs(roles, { accountId } = {}) {
      passwordHash ??= hashPassword(TEST_PASSWORD);
      const inAccount = accountId ?? (await insertAccount(db));
      const isGuest = roles.includes('supplier') || roles.includes('client');
      const companyId = isGuest ? await insertCompany(db, inAccount) : null;
      const email = `${roles.join('-')}-${(keys += 1)}@test.example`;
      const userId = await insertPerson(db, { passwordHash: await passwordHash, email });
      await insertMembership(db, { accountId: inAccount, userId, roles, companyId });
      const answer = await stranger().send('POST', '/api/session', {
        body: { email, password: TEST_PASSWORD },
      });
      if (answer.status !== 200) throw new Error(`Signing in answered ${answer.status}: ${answer.text}`);
      const cookie = answer.headers.get('set-cookie')?.split(';')[0] ?? '';
      return client(baseUrl, { accountId: inAccount, userId, email, cookie });
    },
    async close() {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await jobs.stop();
      mail.close();
      await Promise.all([engine.stop(), mailSink.close(), closeDatabase()]);
      await database.drop();
    },
  };
}

function client(
  baseUrl: string,
  who: Pick<TestClient, 'accountId' | 'userId' | 'email' | 'cookie'>,
): TestClient {
  async function send(method: string, path: string, options: SendOptions = {}): Promise<TestAnswer> {
    const headers: Record<string, string> = { Origin: baseUrl };
    if (who.cookie !== '') headers.Cookie = who.cookie;
    const body = options.raw ?? (options.body === undefined ? undefined : JSON.stringify(options.body));
    if (body !== undefined) headers['Content-Type'] = 'application/json';
    if (method === 'POST') headers['Idempotency-Key'] = options.idempotencyKey ?? `test-key-${(keys += 1)}`;
    if (options.ifMatch !== undefined) headers['If-Match'] = `"${options.ifMatch}"`;
    const init = { method, headers: without({ ...headers, ...options.headers }), body };
    const response = await fetch(`${baseUrl}${path}`, init);
    const text = await response.text();
    return { status: response.status, headers: response.headers, text, json: parse(text) };
  }
  return { ...who, send, get: (path) => send('GET', path) };
}

/** A header given as '' is left out. */
function without(headers: Record<string, string>): Record<string, string> {
  return Object.fromEntries(Object.entries(headers).filter(([, value]) => value !== ''));
}

function parse(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
