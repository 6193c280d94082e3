import { spawnSync } from 'node:child_process';
import { afterAll, beforeAll, expect, it } from 'vitest';
import postgres from 'postgres';
import { aPack } from '../../server/db/seed/spec-builders';
import { keep, pathOf } from '../harness/kept-study';
import { startTestServer, type TestClient, type TestServer } from '../harness/test-server';

let server: TestServer;
let engineer: TestClient;

beforeAll(async () => {
  server = await startTestServer();
  engineer = await server.signInAs(['engineer']);
});
afterAll(() => server.close());

/** Ends every connection of the application to its database, as a restart of PostgreSQL would. */
async function cutConnections() {
  const owner = postgres(server.database.url, { max: 1, onnotice: () => undefined });
  await owner`
    SELECT pg_terminate_backend(pid) FROM pg_stat_activity
    WHERE datname = current_database() AND usename = current_user AND pid <> pg_backend_pid()`;
  await owner.end();
}

it('comes back by itself after its connections were cut, answering 503 at worst', async () => {
  await keep(engineer, 'packs', aPack());
  const statuses: number[] = [];
  for (let round = 0; round < 3; round += 1) {
    await cutConnections();
    const answers = await Promise.all(
      Array.from({ length: 8 }, () => engineer.get(pathOf(engineer, 'packs'))),
    );
    statuses.push(...answers.map((answer) => answer.status));
  }
  expect(statuses.filter((status) => status !== 200 && status !== 503)).toEqual([]);
  expect((await engineer.get(pathOf(engineer, 'packs'))).status).toBe(200);
  expect((await server.stranger().get('/api/health')).json).toMatchObject({
    status: 'ok',
    database: 'answers',
  });
});

it('waits for a locked row no longer than anybody would, and says so', async () => {
  const pack = await keep(engineer, 'packs', aPack());
  const blocker = postgres(server.database.url, { max: 1 });
  const startedMs = performance.now();
  const held = blocker.begin(async (tx) => {
    await tx`SELECT id FROM packs WHERE id = ${pack.id} FOR UPDATE`;
    const answer = await engineer.send('PUT', `${pathOf(engineer, 'packs')}/${pack.id}`, {
      body: { spec: aPack({ name: 'Locked out' }) },
      ifMatch: pack.revision.id,
    });
    expect([answer.status, answer.json.error.code]).toEqual([503, 'database_silent']);
  });
  await held;
  await blocker.end();
  expect(performance.now() - startedMs).toBeLessThan(15_000);
  expect((await engineer.get(`${pathOf(engineer, 'packs')}/${pack.id}`)).json.revision.number).toBe(1);
});

it('has migrations that the schema fits', () => {
  const check = spawnSync('npx', ['drizzle-kit', 'check'], { encoding: 'utf8' });
  expect(check.status, check.stderr + check.stdout).toBe(0);
});
