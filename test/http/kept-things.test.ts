import { asc, eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { auditLog, people } from '../../server/db/schema';
import { aFilm, aFood, aLaminate, aPack, aRoute, aStudy } from '../../server/db/seed/spec-builders';
import { keep, keepStudy, pathOf, type KeptStudy } from '../harness/kept-study';
import { startTestServer, type TestAnswer, type TestClient, type TestServer } from '../harness/test-server';

let server: TestServer;
let engineer: TestClient;
let kept: KeptStudy;

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

/** A fresh account with one study in it, so that lists hold only what a test made. */
async function startAccount() {
  engineer = await server.signInAs(['engineer']);
  kept = await keepStudy(engineer);
}

function archive(collection: string, id: string, isArchived = true): Promise<TestAnswer> {
  return engineer.send('PUT', `${pathOf(engineer, collection)}/${id}/archived`, {
    body: { is_archived: isArchived },
  });
}

async function namesIn(collection: string, query: string): Promise<string[]> {
  const answer = await engineer.get(`${pathOf(engineer, collection)}?${query}`);
  if (answer.status !== 200) throw new Error(answer.text);
  return answer.json.items.map((item: { revision: { spec: { name: string } } }) => item.revision.spec.name);
}

/** Every page of a list, a few at a time. */
async function pagesOf(collection: string, query: string): Promise<string[]> {
  const names: string[] = [];
  for (let after = ''; ;) {
    const page = (await engineer.get(`${pathOf(engineer, collection)}?limit=2&${query}${after}`)).json;
    names.push(
      ...page.items.map((item: { revision: { spec: { name: string } } }) => item.revision.spec.name),
    );
    if (page.next_after === null) return names;
    after = `&after=${page.next_after}`;
  }
}

const studyParts = () => ({
  foodId: kept.foods,
  packId: kept.packs,
  routeId: kept.routes,
  laminateIds: [kept.laminates],
});

describe('an archived thing', () => {
  beforeAll(startAccount);

  it.each(['materials', 'laminates', 'packs', 'foods', 'routes', 'studies'] as const)(
    'of %s leaves the list, is found among the archived, and comes back; saying it twice changes nothing',
    async (collection) => {
      const id = kept[collection];
      const [name = ''] = await namesIn(collection, '');
      const archived = await archive(collection, id);
      expect(archived.status).toBe(200);
      expect(archived.json.archived_at).toMatch(/^\d{4}-/);
      expect((await archive(collection, id)).json.archived_at).toBe(archived.json.archived_at);
      expect(await namesIn(collection, '')).toEqual([]);
      expect(await namesIn(collection, 'archived=only')).toEqual([name]);
      expect(await namesIn(collection, `archived=only&search=${name.slice(0, 3)}`)).toEqual([name]);
      const one = (await engineer.get(`${pathOf(engineer, collection)}/${id}`)).json;
      expect(one.archived_at).toBe(archived.json.archived_at);
      expect((await archive(collection, id, false)).json.archived_at).toBeNull();
      expect(await namesIn(collection, '')).toEqual([name]);
      expect(await namesIn(collection, 'archived=only')).toEqual([]);
      const entries = await server.db
        .select()
        .from(auditLog)
        .where(eq(auditLog.subjectId, id))
        .orderBy(asc(auditLog.id));
      expect(entries.map(({ action }) => action.split('.')[1]).slice(-2)).toEqual([
        'archived',
        'brought_back',
      ]);
      expect(entries.filter(({ action }) => action.endsWith('.archived'))).toHaveLength(1);
    },
  );

  it('goes on working where it is used, and may not be chosen anew', async () => {
    for (const collection of ['materials', 'laminates', 'packs', 'foods', 'routes'] as const) {
      await archive(collection, kept[collection]);
    }
    const path = `${pathOf(engineer, 'studies')}/${kept.studies}`;
    expect((await engineer.send('POST', `${path}/results`, { body: {} })).status).toBe(201);
    const study = (await engineer.get(path)).json;
    const longer = { ...study.revision.spec, target_days: 200 };
    const revised = await engineer.send('PUT', path, { body: { spec: longer }, ifMatch: study.revision.id });
    expect(revised.status).toBe(200);

    const anew = await engineer.send('POST', pathOf(engineer, 'studies'), {
      body: { spec: aStudy(studyParts()) },
    });
    expect(anew.status).toBe(400);
    expect(anew.json.error.fields.map((fault: { path: string }) => fault.path)).toEqual([
      'spec.food_id',
      'spec.pack_id',
      'spec.route_id',
      'spec.laminate_ids[0]',
    ]);
    expect(anew.json.error.fields[3].message).toBe(
      'Wall: this one is archived. Bring it back first, or choose another.',
    );
    const material = { id: kept.materials, revisionId: kept.materialRevision };
    const wall = await engineer.send('POST', pathOf(engineer, 'laminates'), {
      body: { spec: aLaminate([material]) },
    });
    expect(wall.json.error.fields[0].path).toBe('spec.layers[0].material_id');
    const own = (await engineer.get(`${pathOf(engineer, 'laminates')}/${kept.laminates}`)).json;
    const thicker = await engineer.send('PUT', `${pathOf(engineer, 'laminates')}/${kept.laminates}`, {
      body: { spec: aLaminate([material], { thicknessUm: 70 }) },
      ifMatch: own.revision.id,
    });
    expect(thicker.status).toBe(200);
  });

  it('is asked for by a body that says yes or no', async () => {
    const path = `${pathOf(engineer, 'packs')}/${kept.packs}/archived`;
    for (const body of [{}, { is_archived: 'yes' }, { is_archived: true, more: 1 }]) {
      expect((await engineer.send('PUT', path, { body })).status).toBe(400);
    }
  });
});

describe('a list', () => {
  beforeAll(startAccount);

  it('is searched by part of the name, in any case, signs standing for themselves', async () => {
    for (const name of ['Ä film 100%', 'A_film', 'Plain', 'back\\slash']) {
      await keep(engineer, 'routes', aRoute({ name }));
    }
    const found = (search: string) => namesIn('routes', `search=${encodeURIComponent(search)}`);
    expect(await found('FILM')).toEqual(['A_film', 'Ä film 100%']);
    expect(await found('%')).toEqual(['Ä film 100%']);
    expect(await found('_')).toEqual(['A_film']);
    expect(await found('\\')).toEqual(['back\\slash']);
    expect(await found("'; DROP TABLE routes; --")).toEqual([]);
    expect(await pagesOf('routes', 'search=l')).toEqual([
      'back\\slash',
      'Plain',
      'A_film',
      'Ä film 100%',
      'A shelf',
    ]);
  });

  it('finds a thing by its newest name only', async () => {
    const route = await keep(engineer, 'routes', aRoute({ name: 'Old road' }));
    await engineer.send('PUT', `${pathOf(engineer, 'routes')}/${route.id}`, {
      body: { spec: aRoute({ name: 'New road' }) },
      ifMatch: route.revision.id,
    });
    expect(await namesIn('routes', 'search=road')).toEqual(['New road']);
    expect(await namesIn('routes', 'search=old')).toEqual([]);
  });

  it('of studies is filtered by tag and ordered by name or by days, page by page', async () => {
    const thick = await keep(
      engineer,
      'laminates',
      aLaminate([{ id: kept.materials, revisionId: kept.materialRevision }], {
        name: 'Thick',
        thicknessUm: 400,
      }),
    );
    const add = (name: string, tags: string[], laminateIds: string[]) =>
      keep(engineer, 'studies', { ...aStudy({ ...studyParts(), laminateIds }, { name }), tags });
    await add('bravo', ['nuts', 'export'], [kept.laminates]);
    await add('Alpha', ['nuts'], [thick.id]);
    await add('charlie', [], [thick.id]);
    await add('alpha', ['export'], [kept.laminates]);
    expect(await pagesOf('studies', 'sort=name')).toEqual(['A study', 'Alpha', 'alpha', 'bravo', 'charlie']);
    expect(await pagesOf('studies', 'sort=newest')).toEqual([
      'alpha',
      'charlie',
      'Alpha',
      'bravo',
      'A study',
    ]);
    const byDays = await pagesOf('studies', 'sort=days');
    expect(byDays.slice(0, 2)).toEqual(['charlie', 'Alpha']);
    expect(byDays.toSorted()).toEqual(['A study', 'Alpha', 'alpha', 'bravo', 'charlie']);
    expect(await namesIn('studies', 'tag=nuts')).toEqual(['Alpha', 'bravo']);
    expect(await namesIn('studies', 'tag=nuts&search=ALP')).toEqual(['Alpha']);
    expect(await namesIn('studies', 'tag=nut')).toEqual([]);
    expect(await pagesOf('studies', 'tag=export&sort=name')).toEqual(['alpha', 'bravo']);
  });

  it('refuses what it does not know', async () => {
    for (const query of ['archived=yes', 'colour=red', `search=${'x'.repeat(121)}`]) {
      expect((await engineer.get(`${pathOf(engineer, 'packs')}?${query}`)).status, query).toBe(400);
    }
    expect((await engineer.get(`${pathOf(engineer, 'studies')}?sort=colour`)).status).toBe(400);
    expect((await engineer.get(`${pathOf(engineer, 'packs')}?tag=nuts`)).status).toBe(400);
  });
});

describe('what is kept', () => {
  beforeAll(startAccount);

  it('says where it is used', async () => {
    const uses = async (collection: string, id: string) =>
      (await engineer.get(`${pathOf(engineer, collection)}/${id}/uses`)).json;
    const studies = [{ id: kept.studies, name: 'A study' }];
    const laminates = [{ id: kept.laminates, name: 'A wall' }];
    expect(await uses('materials', kept.materials)).toEqual({ laminates, packs: [], studies });
    for (const collection of ['laminates', 'packs', 'foods', 'routes'] as const) {
      expect(await uses(collection, kept[collection])).toEqual({ laminates: [], packs: [], studies });
    }
    const unused = await keep(engineer, 'materials', aFilm({ name: 'Unused' }));
    expect(await uses('materials', unused.id)).toEqual({ laminates: [], packs: [], studies: [] });
    // A newer revision without the material no longer uses it.
    const wall = (await engineer.get(`${pathOf(engineer, 'laminates')}/${kept.laminates}`)).json;
    await engineer.send('PUT', `${pathOf(engineer, 'laminates')}/${kept.laminates}`, {
      body: { spec: aLaminate([{ id: unused.id, revisionId: unused.revision.id }]) },
      ifMatch: wall.revision.id,
    });
    expect((await uses('materials', kept.materials)).laminates).toEqual([]);
    expect(await uses('materials', unused.id)).toMatchObject({ studies });
  });

  it('says who revised it and why; once the person is erased, only that somebody did', async () => {
    const colleague = await server.signInAs(['engineer'], { accountId: engineer.accountId });
    await server.db.update(people).set({ name: 'Ines Varga' }).where(eq(people.userId, colleague.userId));
    const path = `${pathOf(engineer, 'packs')}/${kept.packs}`;
    const pack = (await engineer.get(path)).json;
    await colleague.send('PUT', path, {
      body: { spec: aPack({ headspace_cm3: 130 }), note: 'measured again' },
      ifMatch: pack.revision.id,
    });
    const [newest, first] = (await engineer.get(`${path}/revisions`)).json.items;
    expect(newest).toMatchObject({ number: 2, note: 'measured again', created_by_name: 'Ines Varga' });
    expect(first).toMatchObject({ number: 1, created_by_name: 'A person' });
    await server.db.delete(people).where(eq(people.userId, colleague.userId));
    const [erased] = (await engineer.get(`${path}/revisions`)).json.items;
    expect(erased).toMatchObject({ created_by: colleague.userId, created_by_name: null });
    const studyRevisions = await engineer.get(`${pathOf(engineer, 'studies')}/${kept.studies}/revisions`);
    expect(studyRevisions.json.items[0].created_by_name).toBe('A person');
  });
});

describe('a study', () => {
  beforeAll(startAccount);

  it('keeps tags and verdicts, and computes nothing anew for them', async () => {
    const path = `${pathOf(engineer, 'studies')}/${kept.studies}`;
    const study = (await engineer.get(path)).json;
    const note = { laminate_id: kept.laminates, verdict: 'dropped', note: 'Too dear.' };
    const spec = { ...study.revision.spec, name: 'Renamed', tags: ['nuts'], laminate_notes: [note] };
    const revised = await engineer.send('PUT', path, { body: { spec }, ifMatch: study.revision.id });
    expect(revised.json.revision.spec).toMatchObject({ tags: ['nuts'], laminate_notes: [note] });
    expect(revised.json.latest_result.id).toBe(study.latest_result.id);
    const asked = { ...spec, target_days: 90 };
    const again = await engineer.send('PUT', path, {
      body: { spec: asked },
      ifMatch: revised.json.revision.id,
    });
    expect(again.json.latest_result.number).toBe(2);

    for (const [changes, field] of [
      [{ tags: ['a', 'a'] }, 'spec.tags'],
      [{ tags: [' a'] }, 'spec.tags[0]'],
      [{ tags: Array.from({ length: 11 }, (_, i) => `tag ${i}`) }, 'spec.tags'],
      [{ laminate_notes: [note, note] }, 'spec.laminate_notes'],
      [{ laminate_notes: [{ ...note, laminate_id: kept.foods }] }, 'spec.laminate_notes[0].laminate_id'],
      [{ laminate_notes: [{ ...note, verdict: 'maybe' }] }, 'spec.laminate_notes[0].verdict'],
    ] as const) {
      const answer = await engineer.send('PUT', path, {
        body: { spec: { ...spec, ...changes } },
        ifMatch: again.json.revision.id,
      });
      expect([answer.status, answer.json.error.fields?.[0]?.path]).toEqual([400, field]);
    }
  });

  it('names what is newer, and which walls still hold the older material', async () => {
    const path = `${pathOf(engineer, 'studies')}/${kept.studies}`;
    const before = (await engineer.get(path)).json;
    expect([before.is_outdated, before.newer]).toEqual([false, []]);
    const material = (await engineer.get(`${pathOf(engineer, 'materials')}/${kept.materials}`)).json;
    const revisedMaterial = await engineer.send('PUT', `${pathOf(engineer, 'materials')}/${kept.materials}`, {
      body: { spec: aFilm({ name: 'A better film' }) },
      ifMatch: material.revision.id,
    });
    const food = (await engineer.get(`${pathOf(engineer, 'foods')}/${kept.foods}`)).json;
    await engineer.send('PUT', `${pathOf(engineer, 'foods')}/${kept.foods}`, {
      body: { spec: aFood({ name: 'A drier food' }) },
      ifMatch: food.revision.id,
    });
    const outdated = (await engineer.get(path)).json;
    const walls = [{ id: kept.laminates, name: 'A wall' }];
    expect(outdated.is_outdated).toBe(true);
    expect(outdated.newer).toEqual([
      { kind: 'material', id: kept.materials, name: 'A better film', laminates: walls },
      { kind: 'food', id: kept.foods, name: 'A drier food', laminates: [] },
    ]);
    // Run again: the food is taken, the material waits for its wall.
    await engineer.send('POST', `${path}/results`, { body: {} });
    expect((await engineer.get(path)).json.newer).toMatchObject([{ kind: 'material', laminates: walls }]);
    const wall = (await engineer.get(`${pathOf(engineer, 'laminates')}/${kept.laminates}`)).json;
    await engineer.send('PUT', `${pathOf(engineer, 'laminates')}/${kept.laminates}`, {
      body: { spec: aLaminate([{ id: kept.materials, revisionId: revisedMaterial.json.revision.id }]) },
      ifMatch: wall.revision.id,
    });
    expect((await engineer.get(path)).json.newer).toMatchObject([
      { kind: 'material', laminates: [] },
      { kind: 'laminate', id: kept.laminates },
    ]);
    await engineer.send('POST', `${path}/results`, { body: {} });
    expect((await engineer.get(path)).json).toMatchObject({ is_outdated: false, newer: [] });
    const { items } = (await engineer.get(`${path}/results?limit=2`)).json;
    expect(items.map((one: { food: { name: string } }) => one.food.name)).toEqual([
      'A drier food',
      'A drier food',
    ]);
  });

  it('says what a pack is made of, and what it cannot say', async () => {
    const material = await keep(engineer, 'materials', {
      ...aFilm({ name: 'Weighed' }),
      light: { per_um: { uv_350nm: 0.99, visible_550nm: 0.999 } },
    });
    const unweighed = await keep(
      engineer,
      'materials',
      aFilm({ name: 'Unweighed', density_kg_per_m3: null, price_per_kg: null }),
    );
    const wallOf = (name: string, one: { id: string; revision: { id: string } }) =>
      keep(engineer, 'laminates', aLaminate([{ id: one.id, revisionId: one.revision.id }], { name }));
    const laminateIds = [(await wallOf('Known', material)).id, (await wallOf('Unknown', unweighed)).id];
    const study = await keep(engineer, 'studies', aStudy({ ...studyParts(), laminateIds }));
    const [known, unknown] = study.latest_result.candidates;
    // By hand: 50 µm · 920 kg/m³ = 46 g/m²; cut 2·0.160·0.230 + 2·0.040·0.160 = 0.0864 m²: 3.9744 g, at 1.50/kg.
    expect(known.make_up).toMatchObject({
      currency: 'EUR',
      mass_missing: [],
      price_missing: [],
      light_missing: [],
    });
    expect(known.make_up.mass_g_per_m2).toBeCloseTo(46, 9);
    expect(known.make_up.cut_area_m2).toBeCloseTo(0.0864, 12);
    expect(known.make_up.mass_g_per_pack).toBeCloseTo(3.9744, 9);
    expect(known.make_up.price_per_pack).toBeCloseTo(0.0059616, 12);
    expect(known.make_up.family_shares).toEqual([{ family: 'PE', share: 1 }]);
    expect(known.make_up.light.visible_550nm).toBeCloseTo(0.999 ** 50, 12);
    expect(known.layers[0].polymer_family).toBe('PE');
    expect(unknown.make_up).toMatchObject({
      mass_g_per_pack: null,
      price_per_pack: null,
      light: null,
      mass_missing: ['Unweighed'],
      price_missing: ['Unweighed'],
      light_missing: ['Unweighed'],
    });
  });
});

describe('a tray', () => {
  beforeAll(startAccount);
  const trayOf = (laminateId: string, revisionId?: string) =>
    aPack({
      name: 'A tray',
      form: {
        type: 'tray',
        tray_area_m2: 0.05,
        lid_area_m2: 0.02,
        tray_laminate_id: laminateId,
        ...(revisionId !== undefined && { tray_laminate_revision_id: revisionId }),
      },
      has_seal_path: false,
    });

  it('has a body of its own under each candidate’s lid, pinned with the result', async () => {
    const material = { id: kept.materials, revisionId: kept.materialRevision };
    const body = await keep(
      engineer,
      'laminates',
      aLaminate([material], { name: 'Tray body', thicknessUm: 400 }),
    );
    const pack = await keep(engineer, 'packs', trayOf(body.id));
    const study = await keep(engineer, 'studies', aStudy({ ...studyParts(), packId: pack.id }));
    const { pack: inResult, candidates } = study.latest_result;
    expect(inResult.tray).toMatchObject({
      laminate_id: body.id,
      laminate_revision_id: body.revision.id,
      name: 'Tray body',
      layers: [{ thickness_um: 400 }],
    });
    const [lid, tray] = candidates[0].description.pack.walls;
    expect([lid.name, lid.area_m2, lid.layers[0].thickness_um]).toEqual(['lid', 0.02, 50]);
    expect([tray.name, tray.area_m2, tray.layers[0].thickness_um]).toEqual(['tray', 0.05, 400]);
    expect(candidates[0].answer.walls).toHaveLength(2);
    // By hand: lid 46 g/m² · 0.02 m² = 0.92 g; tray 400 µm · 920 kg/m³ = 368 g/m² · 0.05 m² = 18.4 g.
    expect(candidates[0].make_up.mass_g_per_m2).toBeCloseTo(46, 9);
    expect(candidates[0].make_up.mass_g_per_pack).toBeCloseTo(19.32, 9);
    const uses = (await engineer.get(`${pathOf(engineer, 'laminates')}/${body.id}/uses`)).json;
    expect(uses.packs).toEqual([{ id: pack.id, name: 'A tray' }]);
    expect(uses.studies).toEqual([{ id: study.id, name: 'A study' }]);

    await engineer.send('PUT', `${pathOf(engineer, 'laminates')}/${body.id}`, {
      body: { spec: aLaminate([material], { name: 'Thicker body', thicknessUm: 600 }) },
      ifMatch: body.revision.id,
    });
    const path = `${pathOf(engineer, 'studies')}/${study.id}`;
    expect((await engineer.get(path)).json.newer).toMatchObject([{ kind: 'laminate', name: 'Thicker body' }]);
    await engineer.send('POST', `${path}/results`, { body: {} });
    const again = (await engineer.get(path)).json;
    expect(again.newer).toEqual([]);
    expect(again.latest_result.pack.tray.name).toBe('Thicker body');

    const held = await keep(engineer, 'packs', trayOf(body.id, body.revision.id));
    const heldStudy = await keep(engineer, 'studies', aStudy({ ...studyParts(), packId: held.id }));
    expect(heldStudy.latest_result.pack.tray.name).toBe('Tray body');
  });

  it('is made of a wall of this account, in one of its revisions', async () => {
    const outsider = await server.signInAs(['engineer']);
    const theirs = await keepStudy(outsider);
    for (const [spec, field] of [
      [trayOf(theirs.laminates), 'spec.form.tray_laminate_id'],
      [trayOf(kept.laminates, kept.materialRevision), 'spec.form.tray_laminate_revision_id'],
      [{ ...trayOf(kept.laminates), form: { type: 'tray', tray_area_m2: 0.05 } }, 'spec.form.lid_area_m2'],
    ] as const) {
      const answer = await engineer.send('POST', pathOf(engineer, 'packs'), { body: { spec } });
      expect(answer.status).toBe(400);
      expect(answer.json.error.fields.map((fault: { path: string }) => fault.path)).toContain(field);
    }
  });
});
