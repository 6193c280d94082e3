import { afterAll, beforeAll, expect, it } from 'vitest';
import { demoStudies } from '../../server/db/seed/demo-account';
import { demoPeople } from '../../server/db/seed/demo-people';
import { accounts, materials, people, results } from '../../server/db/schema';
import type { EnginePort } from '../../server/jobs/engine-workers';
import { seedDemo } from '../../server/modules/demo/seed-demo';
import type { Candidate, StudyWithResult } from '../../shared/contract/studies';
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
  expect(await server.db.$count(materials)).toBe(50);

  for (const { email, password, memberRoles, company } of demoPeople) {
    const answer = await server.stranger().send('POST', '/api/session', { body: { email, password } });
    expect(answer.status).toBe(200);
    expect(answer.json.memberships[0]).toMatchObject({ account: { slug: 'tannhollow' }, roles: memberRoles });
    expect(answer.json.memberships[0].company?.name ?? null).toBe(company);
  }
  const studies = await studiesOfDemo();
  expect(studies.map((study) => study.revision.spec.name)).toEqual(
    demoStudies.map((study) => study.name).toReversed(),
  );
  const ends = studies.map((study) => study.headline?.first_limit);
  expect(new Set(ends)).toEqual(new Set(['moisture_max_g_per_g', 'oxygen_uptake_mg_per_kg', null]));
  for (const { latest_result, is_outdated } of studies) {
    expect(latest_result?.candidates.length).toBeGreaterThanOrEqual(2);
    for (const { layers, make_up } of latest_result?.candidates ?? []) {
      expect(layers.length).toBeGreaterThan(2);
      expect(make_up.mass_missing).toEqual([]);
      expect(make_up.price_per_pack).toBeGreaterThan(0);
      expect(make_up.currency).toBe('EUR');
      expect(make_up.light).not.toBeNull();
    }
    expect(is_outdated).toBe(false);
  }
});

async function studiesOfDemo(): Promise<StudyWithResult[]> {
  const [account] = await server.db.select().from(accounts);
  const engineer = await server.signInAs(['engineer'], { accountId: account?.id });
  const path = `/api/accounts/${account?.id}/studies`;
  const ids: { id: string }[] = (await engineer.get(path)).json.items;
  return Promise.all(ids.map(async ({ id }) => (await engineer.get(`${path}/${id}`)).json));
}

/** The demo's walls in one study: the answer of each by the beginning of its name. */
async function answersIn(studyName: string): Promise<(wall: string) => Candidate['answer']> {
  const study = (await studiesOfDemo()).find((one) => one.revision.spec.name.startsWith(studyName));
  const candidates = study?.latest_result?.candidates ?? [];
  return (wall) => {
    const found = candidates.find((candidate) => candidate.name.startsWith(wall));
    if (!found) throw new Error(`${studyName} has no wall ${wall}.`);
    return found.answer;
  };
}

function daysOf(limit: { status: string; days?: number } | undefined): number {
  return limit?.status === 'reached' ? (limit.days ?? NaN) : Infinity;
}

it('teaches that oxygen alone would call a wall safe which moisture ends', async () => {
  const evoh = (await answersIn('Raspberries behind EVOH'))('PET 12 / PE 60 with EVOH');
  expect(evoh.target?.is_met).toBe(false);
  expect(evoh.first_limit).toBe('moisture_max_g_per_g');
  expect(daysOf(evoh.limits.oxygen_uptake_mg_per_kg)).toBeGreaterThan(270);
});

it('teaches that a humidity-sensitive wall fails on the tropical leg only', async () => {
  const abroad = await answersIn('Hazelnuts to Singapore: EVOH on the damp side');
  const atHome = await answersIn('Hazelnuts at home');
  const outside = 'PET 12 / EVOH 5';
  const inside = 'PET 12 / HDPE 100';
  expect(abroad(outside).first_limit).toBe('oxygen_uptake_mg_per_kg');
  // The first 45 days are at sea and in port; the tropical shop begins there.
  expect(abroad(outside).shelf_life_days).toBeGreaterThan(45);
  expect(abroad(outside).shelf_life_days).toBeLessThan(100);
  expect(abroad(inside).target?.is_met).toBe(true);
  expect(atHome(outside).target?.is_met).toBe(true);
  expect(atHome(inside).target?.is_met).toBe(true);
});

it('teaches that a foil with pinholes is no better than a good coating', async () => {
  const sticks = await answersIn('Milk powder sticks');
  const flexed = sticks('Paper 50 / foil 6.3 / PE 30, folded');
  const coated = sticks('SiOx');
  expect(sticks('Paper 50 / foil 6.3 / PE 30, as delivered').shelf_life_days).toBeNull();
  expect(flexed.target?.is_met).toBe(false);
  expect(coated.target?.is_met).toBe(true);
  expect(coated.shelf_life_days ?? Infinity).toBeGreaterThan(flexed.shelf_life_days ?? Infinity);
});

it('says what its other studies say', async () => {
  const crisps = await answersIn('Crisps to Singapore');
  expect(crisps('BOPP 20 / PE 15').first_limit).toBe('moisture_max_g_per_g');
  expect(daysOf(crisps('BOPP 20 / PE 15').limits.oxygen_uptake_mg_per_kg)).toBeGreaterThan(365);
  expect(crisps('BOPP 20 / PE 15').shelf_life_days).toBeLessThan(70);
  expect(crisps('BOPP 20 / metallised').target?.is_met).toBe(true);

  const tray = await answersIn('Almonds in a tray');
  const lids = ['PET 12 / foil', 'AlOx', 'Lid: PET 12'].map((lid) => tray(lid).shelf_life_days ?? Infinity);
  expect(Math.max(...lids) / Math.min(...lids)).toBeLessThan(1.15);
  expect(Math.max(...lids)).toBeLessThan(120);

  const family = await studiesOfDemo();
  const onePolymer = family.find((study) => study.revision.spec.name.startsWith('Hazelnuts in one polymer'));
  const mono = onePolymer?.latest_result?.candidates.find((one) => one.name.startsWith('MDO-PE'));
  expect(mono?.answer.target?.is_met).toBe(true);
  expect(mono?.make_up.family_shares[0]).toMatchObject({ family: 'PE' });
  expect(mono?.make_up.family_shares[0]?.share).toBeGreaterThan(0.9);
});
