import postgres from 'postgres';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { startTestServer, TEST_PASSWORD, type TestClient, type TestServer } from '../harness/test-server';

let server: TestServer;
let person: TestClient;

beforeAll(async () => {
  server = await startTestServer();
  person = await server.signInAs(['engineer']);
});
afterAll(() => server.close());

function trySignIn(email: string, password: string) {
  return server.stranger().send('POST', '/api/session', { body: { email, password } });
}

/** What was sent to the person, once the job has run. */
async function waitForMail(email: string) {
  for (let i = 0; i < 100; i += 1) {
    const mail = server.mailSink.list().find((one) => one.to === email);
    if (mail) return mail;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Error('No mail came.');
}

it('signs in whatever the case of the address, and says who that is', async () => {
  const answer = await trySignIn(person.email.toUpperCase(), TEST_PASSWORD);
  expect(answer.status).toBe(200);
  expect(answer.json.user.email).toBe(person.email);
  expect(answer.json.memberships).toHaveLength(1);
  expect(answer.headers.get('set-cookie')).toMatch(/HttpOnly.*SameSite=Lax/i);
});

it('answers alike for a wrong password and an address nobody has', async () => {
  const wrong = await trySignIn(person.email, 'not the password');
  const nobody = await trySignIn('nobody@test.example', 'not the password');
  expect([wrong.status, nobody.status]).toEqual([401, 401]);
  expect(wrong.json.error.message).toBe(nobody.json.error.message);
});

it('limits tries per address, also when they come all at once, and lets others in', async () => {
  const victim = await server.signInAs(['engineer']);
  const tries = await Promise.all(
    Array.from({ length: 14 }, () => trySignIn(victim.email, 'a guess of many')),
  );
  const statuses = tries.map((one) => one.status);
  expect(statuses.filter((status) => status === 401).length).toBeLessThanOrEqual(8);
  expect(statuses).toContain(429);
  const right = await trySignIn(victim.email, TEST_PASSWORD);
  expect(right.status).toBe(429);
  expect(right.json.error.retry_after_s).toBeGreaterThan(0);
  expect(right.headers.get('retry-after')).toBe(String(right.json.error.retry_after_s));
  expect((await trySignIn(person.email, TEST_PASSWORD)).status).toBe(200);
});

it('answers a hostile address at once: a pattern that backtracks took seconds over this one', async () => {
  const hostile = await trySignIn(`a@${'.'.repeat(9_000)} `, 'x');
  expect(hostile.status).toBe(400);
  expect(hostile.json.error.fields[0].path).toBe('email');
});

it('signs out for good', async () => {
  const leaving = await server.signInAs(['client']);
  expect((await leaving.send('DELETE', '/api/session')).status).toBe(204);
  expect((await leaving.get('/api/session')).status).toBe(401);
});

it('keeps what a person prefers', async () => {
  const body = { unit_system: 'us_customary' };
  expect((await person.send('PATCH', '/api/session/preferences', { body })).json.user.unit_system).toBe(
    'us_customary',
  );
  expect((await person.get('/api/session')).json.user.unit_system).toBe('us_customary');
});

it('mails a link that sets a new password once and ends every session', async () => {
  const forgetful = await server.signInAs(['admin']);
  const asked = await server
    .stranger()
    .send('POST', '/api/password-resets', { body: { email: forgetful.email } });
  const unknown = await server
    .stranger()
    .send('POST', '/api/password-resets', { body: { email: 'no@test.example' } });
  expect([asked.status, unknown.status]).toEqual([202, 202]);
  const mail = await waitForMail(forgetful.email);
  expect(mail.messageId).toMatch(/^<password-reset\..+@127\.0\.0\.1>$/);
  const token = /reset-password\?token=([\w-]+)/.exec(mail.text)?.[1];
  expect(server.mailSink.list().some((one) => one.to === 'no@test.example')).toBe(false);

  const redeem = (password: string) =>
    server.stranger().send('POST', '/api/password-resets/redemptions', { body: { token, password } });
  expect((await redeem('too short')).json.error.fields[0].path).toBe('password');
  expect((await redeem('a quite new password')).status).toBe(204);
  expect((await redeem('a quite new password')).json.error.fields[0].path).toBe('token');
  expect((await forgetful.get('/api/session')).status).toBe(401);
  expect((await trySignIn(forgetful.email, TEST_PASSWORD)).status).toBe(401);
  expect((await trySignIn(forgetful.email, 'a quite new password')).status).toBe(200);
});

it('keeps nothing in the database or the log that opens a session or sets a password', async () => {
  const sleeper = await server.signInAs(['engineer']);
  await server.stranger().send('POST', '/api/password-resets', { body: { email: sleeper.email } });
  const mail = await waitForMail(sleeper.email);
  const token = /token=([\w-]+)/.exec(mail.text)?.[1] ?? '';
  const sessionId = sleeper.cookie.split('=')[1] ?? '';
  expect(token.length).toBeGreaterThan(30);
  expect(sessionId.length).toBeGreaterThan(30);

  const owner = postgres(server.database.ownerUrl, { max: 1 });
  try {
    const tables = await owner`
      SELECT format('%I.%I', table_schema, table_name) AS name FROM information_schema.tables
      WHERE table_schema IN ('public', 'pgboss') AND table_type = 'BASE TABLE'`;
    expect(tables.length).toBeGreaterThan(20);
    let dump = '';
    for (const { name } of tables) {
      const rows = await owner.unsafe(
        `SELECT coalesce(string_agg(t::text, E'\\n'), '') AS text FROM ${name} t`,
      );
      dump += rows[0]?.text;
    }
    expect(dump).toContain(sleeper.email);
    for (const secret of [token, sessionId, TEST_PASSWORD]) {
      expect(dump).not.toContain(secret);
      expect(server.log.join('\n')).not.toContain(secret);
    }
  } finally {
    await owner.end();
  }
  // The stored hash itself is no key.
  const [stored] = await server.db.query.sessions.findMany({
    where: (row, { eq }) => eq(row.userId, sleeper.userId),
  });
  const withHash = await server.stranger().send('GET', '/api/session', {
    headers: { Cookie: `larderline_session=${stored?.id}` },
  });
  expect(withHash.status).toBe(401);
});
