import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Role } from '../../shared/contract/session';
import { keepStudy, type KeptStudy } from '../harness/kept-study';
import { startTestServer, type TestClient, type TestServer } from '../harness/test-server';

/**
 * Who may call what, written by hand and not derived from the routes: a new route fails here until somebody has
 * said who it is for. 'anyone': without a session too. A list: those roles in the account, nobody else.
 */
const READERS: readonly Role[] = ['engineer', 'admin'];
const WRITERS: readonly Role[] = ['engineer'];
const ADMINS: readonly Role[] = ['admin'];
type Expectation = 'anyone' | 'signed in' | readonly Role[];

const EXPECTED: Record<string, Expectation> = {
  'get /api/health': 'anyone',
  'get /api/openapi.json': 'anyone',
  'get /api/demo': 'anyone',
  'get /api/demo/mailbox': 'anyone',
  'post /api/session': 'anyone',
  'get /api/session': 'signed in',
  'delete /api/session': 'signed in',
  'patch /api/session/preferences': 'signed in',
  'post /api/password-resets': 'anyone',
  'post /api/password-resets/redemptions': 'anyone',
  'post /api/evaluations': ['engineer'],
  'get /api/accounts/:account_id/team': ADMINS,
  'get /api/accounts/:account_id/audit-entries': ADMINS,
  ...Object.fromEntries(
    ['materials', 'laminates', 'packs', 'foods', 'routes', 'studies'].flatMap((collection) => {
      const path = `/api/accounts/:account_id/${collection}`;
      return [
        [`get ${path}`, READERS],
        [`post ${path}`, WRITERS],
        [`get ${path}/:id`, READERS],
        [`put ${path}/:id`, WRITERS],
        [`put ${path}/:id/archived`, WRITERS],
        [`get ${path}/:id/revisions`, READERS],
        ...(collection === 'studies' ? [] : [[`get ${path}/:id/uses`, READERS]]),
      ];
    }),
  ),
  'get /api/accounts/:account_id/studies/:id/results': READERS,
  'post /api/accounts/:account_id/studies/:id/results': WRITERS,
  'get /api/accounts/:account_id/studies/:id/results/:result_id': READERS,
};

const ROLE_SETS: readonly (readonly Role[])[] = [
  ['engineer'],
  ['admin'],
  ['engineer', 'admin'],
  ['supplier'],
  ['client'],
];
const NOBODYS_ID = '01900000-0000-7000-8000-000000000000';

let server: TestServer;
let owner: TestClient;
let study: KeptStudy;
const members = new Map<string, TestClient>();
const outsiders = new Map<string, TestClient>();

beforeAll(async () => {
  server = await startTestServer();
  owner = await server.signInAs(['engineer']);
  study = await keepStudy(owner);
  for (const roles of ROLE_SETS) {
    members.set(roles.join('+'), await server.signInAs(roles, { accountId: owner.accountId }));
    outsiders.set(roles.join('+'), await server.signInAs(roles));
  }
});
afterAll(() => server.close());

function pathFor(path: string, { isMissing = false, accountId = owner.accountId } = {}): string {
  const collection = /:account_id\/([a-z]+)/.exec(path)?.[1] as keyof KeptStudy;
  return path
    .replace(':account_id', accountId)
    .replace(':result_id', isMissing ? NOBODYS_ID : study.result)
    .replace(':id', isMissing ? NOBODYS_ID : (study[collection] ?? NOBODYS_ID));
}

/** The same call for everybody: an empty body, so that whoever may call is told what is wrong with it. */
function call(client: TestClient, method: string, path: string) {
  const isWrite = method !== 'get' && method !== 'delete';
  return client.send(method.toUpperCase(), path, isWrite ? { body: {}, ifMatch: NOBODYS_ID } : {});
}

function bodyWithoutRequestId(text: string): string {
  return text.replace(/"request_id":"[^"]*"/, '');
}

describe('the access suite', () => {
  it('knows every route, and no other', () => {
    const served = server.routes.map(({ method, path }) => `${method} ${path}`);
    expect(served.toSorted()).toEqual(Object.keys(EXPECTED).toSorted());
  });

  it.each(Object.entries(EXPECTED))('%s: %j', async (route, expected) => {
    const [method = '', path = ''] = route.split(' ');
    const theOne404 = bodyWithoutRequestId((await server.stranger().get('/api/no-such-path')).text);

    const signedOut = await call(server.stranger(), method, pathFor(path));
    if (expected === 'anyone') expect([401, 403, 404]).not.toContain(signedOut.status);
    else expect(signedOut.json.error.code).toBe('session_missing');

    for (const [name, member] of members) {
      const isAllowed =
        typeof expected === 'string' || name.split('+').some((role) => expected.some((one) => one === role));
      // Signing out would end the session that later routes need.
      const who = route === 'delete /api/session' ? await server.signInAs(['client']) : member;
      const answer = await call(who, method, pathFor(path));
      if (isAllowed) {
        const isRefusedSignIn = route === 'post /api/session';
        expect(isRefusedSignIn ? [400] : [200, 201, 202, 204, 400, 412], `${name} may ${route}`).toContain(
          answer.status,
        );
      } else {
        expect(answer.status, `${name} may not ${route}`).toBe(404);
        expect(bodyWithoutRequestId(answer.text)).toBe(theOne404);
      }
    }
    if (!path.includes(':account_id')) return;
    for (const [name, outsider] of outsiders) {
      const answer = await call(outsider, method, pathFor(path));
      expect(answer.status, `${name} of another account may not ${route}`).toBe(404);
      expect(bodyWithoutRequestId(answer.text)).toBe(theOne404);
      // Its own account in the path does not open another account's thing either.
      if (!path.includes(':id')) continue;
      const smuggled = await call(outsider, method, pathFor(path, { accountId: outsider.accountId }));
      expect([400, 404], `${name} smuggling ${route}`).toContain(smuggled.status);
      if (smuggled.status === 404) expect(bodyWithoutRequestId(smuggled.text)).toBe(theOne404);
    }
    const owners = members.get(
      typeof expected !== 'string' && expected[0] === 'admin' ? 'admin' : 'engineer',
    );
    for (const broken of ['not-an-id', '%00', "' OR 1=1", NOBODYS_ID.toUpperCase()]) {
      const answer = await call(
        owners ?? owner,
        method,
        pathFor(path, { accountId: encodeURIComponent(broken) }),
      );
      expect(bodyWithoutRequestId(answer.text), broken).toBe(theOne404);
    }
    if (path.includes(':id') && method === 'get') {
      const missing = await call(owners ?? owner, method, pathFor(path, { isMissing: true }));
      expect(bodyWithoutRequestId(missing.text)).toBe(theOne404);
    }
  });

  it('answers 404 in JSON for paths it does not know, signed in or not, however written', async () => {
    for (const path of [
      '/api',
      '/api/',
      '/api/nothing',
      '/api/accounts',
      '/api/%E0%A4%A',
      '/api/session/..%2f..',
    ]) {
      for (const client of [server.stranger(), owner]) {
        const answer = await client.get(path);
        expect(answer.status, path).toBe(404);
        expect(answer.json.error.code).toBe('not_found');
      }
    }
  });

  it('has no demo outside demo mode', async () => {
    const live = await startTestServer({ isDemo: false });
    try {
      expect((await live.stranger().get('/api/demo')).status).toBe(404);
      expect((await live.stranger().get('/api/demo/mailbox')).status).toBe(404);
    } finally {
      await live.close();
    }
  });

  it('refuses a write with a cookie from another page, or from none that says so', async () => {
    const path = '/api/session/preferences';
    const body = { unit_system: 'metric' };
    for (const origin of ['', 'null', 'http://elsewhere.example', `${server.baseUrl}.elsewhere.example`]) {
      const answer = await owner.send('PATCH', path, { body, headers: { Origin: origin } });
      expect(answer.status, origin).toBe(403);
      expect(answer.json.error.code).toBe('origin_refused');
    }
    expect((await owner.send('PATCH', path, { body })).status).toBe(200);
    const foreignSignIn = await server.stranger().send('POST', '/api/session', {
      body: {},
      headers: { Origin: 'http://elsewhere.example' },
    });
    expect(foreignSignIn.status).toBe(403);
  });
});
