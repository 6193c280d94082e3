import { afterAll, beforeAll, expect, it } from 'vitest';
import { demoPeople } from '../../server/db/seed/demo-people';
import { accounts, materials, people, results } from '../../server/db/schema';
import type { EnginePort } from '../../server/jobs/engine-workers';
import { seedDemo } from '../../server/modules/demo/seed-demo';
import { evaluate } from '../../shared/engine';
import { startTestServer, type TestServer } from '../harness/test-server';

let server: TestServer;

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const engine: EnginePort = { evaluate: async (description) => evaluate(description) };

it('leaves nothing behind when it fails halfway', async () => {
  let calls = 0;
  const failing: EnginePort = {
    async evaluate(description) {
      calls += 1;
      if (calls > 3) throw new Error('The thread ended.');
      return evaluate(description);
    },
  };
  await expect(seedDemo({ db: server.db, engine: failing })).rejects.toThrow('The thread ended.');
  for (const table of [accounts, people, materials, results]) expect(await server.db.$count(table)).toBe(0);
});

it('makes the demo account once: people who can sign in, a library, studies with answers', async () => {
  expect(await seedDemo({ db: server.db, engine })).toBe(true);
  expect(await seedDemo({ db: server.db, engine })).toBe(false);
  expect(await server.db.$count(materials)).toBe(49);

  for (const { email, password, memberRoles, company } of demoPeople) {
    const answer = await server.stranger().send('POST', '/api/session', { body: { email, password } });
    expect(answer.status).toBe(200);
    expect(answer.json.memberships[0]).toMatchObject({ account: { slug: 'tannhollow' }, roles: memberRoles });
    expect(answer.json.memberships[0].company?.name ?? null).toBe(company);
  }
  const [account] = await server.db.select().from(accounts);
  const engineer = await server.signInAs(['engineer'], { accountId: account?.id });
  const { items } = (await engineer.get(`/api/accounts/${account?.id}/studies`)).json;
  expect(items).toHaveLength(3);
  const ends = items.map((study: { headline: { first_limit: string | null } }) => study.headline.first_limit);
  expect(new Set(ends)).toEqual(new Set(['moisture_max_g_per_g', 'oxygen_uptake_mg_per_kg', null]));
  for (const { id } of items) {
    const study = (await engineer.get(`/api/accounts/${account?.id}/studies/${id}`)).json;
    expect(study.latest_result.candidates[0].layers.length).toBeGreaterThan(2);
    expect(study.is_outdated).toBe(false);
  }
  const all = (await engineer.get(`/api/accounts/${account?.id}/materials?limit=200`)).json.items;
  expect(all).toHaveLength(49);
});
