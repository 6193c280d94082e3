import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import { asc, eq } from 'drizzle-orm';
import postgres from 'postgres';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { auditLog, laminates, results, studies } from '../../server/db/schema';
import { aFilm, aFood, aLaminate, aPack, aRoute, aStudy } from '../../server/db/seed/spec-builders';
import { keep, keepStudy, pathOf, type KeptStudy } from '../harness/kept-study';
import { startTestServer, type TestClient, type TestServer } from '../harness/test-server';

let server: TestServer;
let engineer: TestClient;
let colleague: TestClient;
let kept: KeptStudy;

beforeAll(async () => {
  server = await startTestServer();
  engineer = await server.signInAs(['engineer']);
  colleague = await server.signInAs(['engineer'], { accountId: engineer.accountId });
  kept = await keepStudy(engineer);
});
afterAll(() => server.close());

const studyParts = () => ({
  foodId: kept.foods,
  packId: kept.packs,
  routeId: kept.routes,
  laminateIds: [kept.laminates],
});

describe('a create', () => {
  it('makes one thing of ten requests with the same key at once', async () => {
    const path = pathOf(engineer, 'studies');
    const body = { spec: aStudy(studyParts(), { name: 'Clicked ten times' }) };
    const answers = await Promise.all(
      Array.from({ length: 10 }, () => engineer.send('POST', path, { body, idempotencyKey: 'ten-clicks' })),
    );
    expect(answers.map((answer) => answer.status)).toEqual(Array(10).fill(201));
    expect(new Set(answers.map((answer) => answer.text)).size).toBe(1);
    const id: string = answers[0]?.json.id;
    expect(await server.db.select().from(results).where(eq(results.studyId, id))).toHaveLength(1);
    const all = await server.db.select().from(studies).where(eq(studies.accountId, engineer.accountId));
    expect(all).toHaveLength(2);
    expect(answers[0]?.headers.get('etag')).toBe(`"${answers[0]?.json.revision.id}"`);
  });

  it('refuses the key for something else, and lets another person have the same key', async () => {
    const path = pathOf(engineer, 'packs');
    const options = { idempotencyKey: 'one-key' };
    expect((await engineer.send('POST', path, { body: { spec: aPack() }, ...options })).status).toBe(201);
    const other = await engineer.send('POST', path, {
      body: { spec: aPack({ name: 'Another' }) },
      ...options,
    });
    expect(other.json.error.code).toBe('idempotency_key_reused');
    expect(other.status).toBe(409);
    expect(
      (await colleague.send('POST', path, { body: { spec: aPack({ name: 'Hers' }) }, ...options })).status,
    ).toBe(201);
  });

  it('leaves the key free when it fails, and nothing of itself', async () => {
    const path = pathOf(engineer, 'laminates');
    const nobodysMaterial = { id: kept.foods, revisionId: kept.foods };
    const options = { idempotencyKey: 'fails-first' };
    const before = await server.db.$count(laminates);
    const failed = await engineer.send('POST', path, {
      body: { spec: aLaminate([nobodysMaterial]) },
      ...options,
    });
    expect(failed.status).toBe(400);
    expect(await server.db.$count(laminates)).toBe(before);
    const material = { id: kept.materials, revisionId: kept.materialRevision };
    expect(
      (await engineer.send('POST', path, { body: { spec: aLaminate([material]) }, ...options })).status,
    ).toBe(201);
  });

  it('wants a key', async () => {
    const answer = await engineer.send('POST', pathOf(engineer, 'packs'), {
      body: { spec: aPack() },
      headers: { 'Idempotency-Key': '' },
    });
    expect([answer.status, answer.json.error.code]).toEqual([428, 'precondition_missing']);
  });
});

describe('an edit', () => {
  it('loses nothing when two people edit one laminate at once', async () => {
    const material = { id: kept.materials, revisionId: kept.materialRevision };
    const laminate = await keep(engineer, 'laminates', aLaminate([material], { name: 'Before' }));
    const path = `${pathOf(engineer, 'laminates')}/${laminate.id}`;
    const edit = (who: TestClient, name: string) =>
      who.send('PUT', path, {
        body: { spec: aLaminate([material], { name }) },
        ifMatch: laminate.revision.id,
      });
    const answers = await Promise.all([edit(engineer, 'His'), edit(colleague, 'Hers')]);
    expect(answers.map((answer) => answer.status).toSorted()).toEqual([200, 412]);
    const winner = answers.find((answer) => answer.status === 200);
    const loser = answers.find((answer) => answer.status === 412);
    expect(loser?.json.error.code).toBe('edited_meanwhile');
    expect(loser?.json.error.current).toEqual(winner?.json);
    // On top of what won, the second edit is kept too.
    const again = await colleague.send('PUT', path, {
      body: { spec: aLaminate([material], { name: 'On top' }), note: 'after talking' },
      ifMatch: loser?.json.error.current.revision.id,
    });
    expect(again.json.revision).toMatchObject({
      number: 3,
      note: 'after talking',
      created_by: colleague.userId,
    });
    const revisions = await engineer.get(`${path}/revisions`);
    expect(revisions.json.items.map((one: { number: number }) => one.number)).toEqual([3, 2, 1]);
    expect((await engineer.get(path)).headers.get('etag')).toBe(`"${again.json.revision.id}"`);
  });

  it('wants If-Match, and tells a study’s editor the state that won, answer and all', async () => {
    const path = `${pathOf(engineer, 'studies')}/${kept.studies}`;
    const body = { spec: aStudy(studyParts(), { targetDays: 90 }) };
    expect((await engineer.send('PUT', path, { body })).status).toBe(428);
    const lost = await engineer.send('PUT', path, { body, ifMatch: kept.foods });
    expect(lost.status).toBe(412);
    expect(lost.json.error.current.latest_result.id).toBe(kept.result);
  });
});

describe('a result', () => {
  it('keeps its inputs, engine version, time, and bytes that its SHA-256 fits', async () => {
    const path = `${pathOf(engineer, 'studies')}/${kept.studies}/results/${kept.result}`;
    const { sha256, ...rest } = (await engineer.get(path)).json;
    const [row] = await server.db.select().from(results).where(eq(results.id, kept.result));
    expect(row?.body.toString('utf8')).toBe(canonicalize(rest));
    expect(
      createHash('sha256')
        .update(row?.body ?? '')
        .digest('hex'),
    ).toBe(sha256);
    expect(rest.engine_version).toBe(row?.engineVersion);
    const [candidate] = rest.candidates;
    expect(
      candidate.description.pack.walls[0].layers[0].oxygen.permeability_mol_m_per_m2_s_Pa,
    ).toBeGreaterThan(0);
    expect(candidate.description.pack.seal.sealant_thickness_um).toBe(100);
    expect(candidate.answer.courses.days.length).toBeGreaterThan(100);
    expect(candidate.answer.walls[0].area_m2).toBeCloseTo(2 * 0.144 * 0.218 + 2 * 0.144 * 0.04, 9);
  });

  it('is the same again when nothing changed, and newer data make it outdated', async () => {
    const study = `${pathOf(engineer, 'studies')}/${kept.studies}`;
    const first = (await engineer.get(study)).json;
    expect(first.is_outdated).toBe(false);
    const again = await engineer.send('POST', `${study}/results`, { body: {} });
    expect(again.json.number).toBe(2);
    expect(again.json.candidates).toEqual(first.latest_result.candidates);

    const food = (await engineer.get(`${pathOf(engineer, 'foods')}/${kept.foods}`)).json;
    const limits = { oxygen_uptake_mg_per_kg: 400, moisture_max_g_per_g: 0.05 };
    await engineer.send('PUT', `${pathOf(engineer, 'foods')}/${kept.foods}`, {
      body: { spec: aFood({ limits }) },
      ifMatch: food.revision.id,
    });
    const outdated = (await engineer.get(pathOf(engineer, 'studies'))).json.items.find(
      (one: { id: string }) => one.id === kept.studies,
    );
    expect(outdated.is_outdated).toBe(true);
    expect(outdated.headline.shelf_life_days).toBe(first.headline.shelf_life_days);
    const rerun = await engineer.send('POST', `${study}/results`, { body: {} });
    expect(rerun.json.candidates[0].answer.shelf_life_days).toBeGreaterThan(first.headline.shelf_life_days);
    expect((await engineer.get(study)).json.is_outdated).toBe(false);
    const list = await engineer.get(`${study}/results?limit=2`);
    expect(list.json.items.map((one: { number: number }) => one.number)).toEqual([3, 2]);
    expect((await engineer.get(`${study}/results?after=${list.json.next_after}`)).json.items).toHaveLength(1);
  });

  it('compares walls and names the best', async () => {
    const material = { id: kept.materials, revisionId: kept.materialRevision };
    const thick = await keep(engineer, 'laminates', aLaminate([material, material], { name: 'Double' }));
    const parts = { ...studyParts(), laminateIds: [kept.laminates, thick.id] };
    const study = await keep(engineer, 'studies', aStudy(parts, { name: 'Two walls' }));
    expect(study.headline.best_laminate_name).toBe('Double');
    expect(study.latest_result.candidates).toHaveLength(2);
  });
});

describe('what the application role may not do', () => {
  const IMMUTABLE = [
    'material_revisions',
    'laminate_revisions',
    'pack_revisions',
    'food_revisions',
    'route_revisions',
    'study_revisions',
    'results',
    'result_pins',
    'audit_log',
  ];

  it.each(IMMUTABLE)('change or delete rows of %s, and neither may the owner', async (table) => {
    for (const url of [server.database.url, server.database.ownerUrl]) {
      const sql = postgres(url, { max: 1, onnotice: () => undefined });
      try {
        const [{ rows }] = (await sql.unsafe(`SELECT count(*)::int AS rows FROM ${table}`)) as [
          { rows: number },
        ];
        expect(rows).toBeGreaterThan(0);
        const [column] = await sql`
          SELECT column_name AS name FROM information_schema.columns WHERE table_name = ${table} LIMIT 1`;
        await expect(sql.unsafe(`DELETE FROM ${table}`)).rejects.toMatchObject({ code: '42501' });
        await expect(
          sql.unsafe(`UPDATE ${table} SET ${column?.name} = ${column?.name}`),
        ).rejects.toMatchObject({ code: '42501' });
        await expect(sql.unsafe(`TRUNCATE ${table} CASCADE`)).rejects.toMatchObject({ code: '42501' });
        expect(await sql.unsafe(`SELECT count(*)::int AS rows FROM ${table}`)).toMatchObject([{ rows }]);
      } finally {
        await sql.end();
      }
    }
  });

  it('make or drop tables, or delete what has revisions', async () => {
    const sql = postgres(server.database.url, { max: 1 });
    try {
      for (const statement of [
        'CREATE TABLE mine (a int)',
        'DROP TABLE audit_log',
        'DELETE FROM laminates',
        'ALTER TABLE users ADD a int',
      ]) {
        await expect(sql.unsafe(statement), statement).rejects.toMatchObject({ code: '42501' });
      }
    } finally {
      await sql.end();
    }
  });

  it('give a guest a seat, or a member two kinds of role', async () => {
    const sql = postgres(server.database.url, { max: 1 });
    try {
      for (const roles of [['supplier'], ['engineer', 'supplier'], [], ['engineer', 'engineer'], ['king']]) {
        const insert = sql`UPDATE memberships SET roles = ${roles} WHERE user_id = ${engineer.userId}`;
        await expect(insert, roles.join()).rejects.toMatchObject({ code: '23514' });
      }
    } finally {
      await sql.end();
    }
  });
});

it('writes down what happened, by id and without names', async () => {
  const fresh = await server.signInAs(['engineer', 'admin']);
  const pack = await keep(fresh, 'packs', aPack());
  await fresh.send('PUT', `${pathOf(fresh, 'packs')}/${pack.id}`, {
    body: { spec: aPack({ name: 'Wider' }) },
    ifMatch: pack.revision.id,
  });
  const entries = await server.db
    .select()
    .from(auditLog)
    .where(eq(auditLog.accountId, fresh.accountId))
    .orderBy(asc(auditLog.id));
  expect(entries.map(({ action, subjectId, actorUserId }) => [action, subjectId, actorUserId])).toEqual([
    ['pack.created', pack.id, fresh.userId],
    ['pack.revised', pack.id, fresh.userId],
  ]);
  const listed = await fresh.get(pathOf(fresh, 'audit-entries'));
  expect(listed.json.items[0]).toMatchObject({ action: 'pack.revised', actor_name: 'A person' });
  const team = await fresh.get(pathOf(fresh, 'team'));
  expect(team.json).toMatchObject({
    seats_in_use: 1,
    people: [{ roles: ['engineer', 'admin'], company: null }],
  });
});

it('pages through a collection without a gap or a repeat', async () => {
  const fresh = await server.signInAs(['engineer']);
  const made: string[] = [];
  for (let i = 0; i < 7; i += 1)
    made.unshift((await keep(fresh, 'routes', aRoute({ name: `Route ${i}` }))).id);
  const seen: string[] = [];
  let after = '';
  do {
    const page = await fresh.get(`${pathOf(fresh, 'routes')}?limit=3${after}`);
    seen.push(...page.json.items.map((one: { id: string }) => one.id));
    after = page.json.next_after === null ? '' : `&after=${page.json.next_after}`;
  } while (after !== '');
  expect(seen).toEqual(made);
});

it('does not lend another account’s material to a wall, nor its wall to a study', async () => {
  const outsider = await server.signInAs(['engineer']);
  const theirs = await keep(outsider, 'materials', aFilm());
  const stolen = aLaminate([{ id: theirs.id, revisionId: theirs.revision.id }]);
  const wall = await engineer.send('POST', pathOf(engineer, 'laminates'), { body: { spec: stolen } });
  expect(wall.json.error.fields[0].path).toBe('spec.layers[0].material_revision_id');
  const study = await outsider.send('POST', pathOf(outsider, 'studies'), {
    body: { spec: aStudy(studyParts()) },
  });
  expect(study.json.error.fields.map((fault: { path: string }) => fault.path)).toEqual([
    'spec.food_id',
    'spec.pack_id',
    'spec.route_id',
    'spec.laminate_ids[0]',
  ]);
  const overwrite = await outsider.send('PUT', `${pathOf(outsider, 'packs')}/${kept.packs}`, {
    body: { spec: aPack() },
    ifMatch: kept.packs,
  });
  expect(overwrite.status).toBe(404);
});
