import * as fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { aFilm, aFood, aLaminate, aPack, aRoute, aStudy } from '../../server/db/seed/spec-builders';
import { evaluationBody } from '../harness/evaluation-body';
import { keepStudy, pathOf, type KeptStudy } from '../harness/kept-study';
import { startTestServer, type TestClient, type TestServer } from '../harness/test-server';

let server: TestServer;
let engineer: TestClient;
let kept: KeptStudy;

beforeAll(async () => {
  server = await startTestServer();
  engineer = await server.signInAs(['engineer']);
  kept = await keepStudy(engineer);
});
afterAll(() => server.close());

/** A copy with the value at a path such as `a.b[0].c` replaced; undefined removes it. */
function changed(body: unknown, path: string, value: unknown): unknown {
  const copy = structuredClone(body) as Record<string, unknown>;
  const steps = path.split(/[.[\]]+/).filter((step) => step !== '');
  const last = steps.pop() ?? '';
  const parent = steps.reduce<Record<string, unknown>>(
    (place, step) => place[step] as Record<string, unknown>,
    copy,
  );
  if (value === undefined) delete parent[last];
  else parent[last] = value;
  return copy;
}

const layers = (count: number) =>
  Array.from({ length: count }, () => evaluationBody().pack.walls[0]?.layers[0]);

/** Answered in closed form, since many of it are sent. */
function quickBody() {
  const { pack, ...rest } = evaluationBody();
  const lid = pack.walls.slice(1);
  const food = { mass_kg: 0.2, oxygen_mode: 'at_once', inside_relative_humidity: 0.3 };
  return { ...rest, pack: { walls: lid }, food, limits: { oxygen_uptake_mg_per_kg: 40 }, tests: [] };
}

/** What is changed, to what, and where the API says the fault is when that is not where it was made. */
const BAD_EVALUATIONS: [name: string, path: string, value: unknown, faultPath?: string][] = [
  ['a gauge of zero', 'pack.walls[0].layers[1].thickness_um', 0],
  ['a negative gauge', 'pack.walls[0].layers[1].thickness_um', -5],
  ['an absurd gauge', 'pack.walls[0].layers[1].thickness_um', 1e9],
  ['a gauge in words', 'pack.walls[0].layers[1].thickness_um', '5'],
  ['no gauge', 'pack.walls[0].layers[1].thickness_um', undefined],
  ['null for a gauge', 'pack.walls[0].layers[1].thickness_um', null],
  ['a permeability of zero', 'pack.walls[0].layers[0].oxygen.permeability_mol_m_per_m2_s_Pa', 0],
  ['a negative permeability', 'pack.walls[0].layers[0].water.permeability_mol_m_per_m2_s_Pa', -1e-18],
  ['no oxygen block', 'pack.walls[0].layers[0].oxygen', undefined],
  ['an unknown kind of layer', 'pack.walls[0].layers[0].kind', 'paper'],
  ['an empty wall', 'pack.walls[0].layers', []],
  ['200 layers', 'pack.walls[0].layers', layers(200)],
  ['no wall', 'pack.walls', []],
  ['an area of zero', 'pack.walls[1].area_m2', 0],
  ['humidity over 100 %', 'route.legs[1].relative_humidity', 1.01],
  ['negative humidity', 'route.legs[1].relative_humidity', -0.01],
  ['60.1 °C', 'route.legs[0].temperature_C', 60.1],
  ['−30.1 °C', 'route.legs[0].temperature_C', -30.1],
  ['a leg of no days', 'route.legs[0].days', 0],
  ['no legs', 'route.legs', []],
  ['an unknown ending of the route', 'route.after_last', 'stop'],
  ['an unsorted curve', 'pack.walls[0].layers[1].oxygen.humidity_curve.relative_humidity', [0.8, 0.6, 0.9]],
  [
    'a curve with a humidity twice',
    'pack.walls[0].layers[1].oxygen.humidity_curve.relative_humidity',
    [0.6, 0.6, 0.9],
  ],
  [
    'a curve with a factor too few',
    'pack.walls[0].layers[1].oxygen.humidity_curve.factor',
    [1, 9],
    'pack.walls[0].layers[1].oxygen.humidity_curve',
  ],
  ['a factor of zero', 'pack.walls[0].layers[1].oxygen.humidity_curve.factor[0]', 0],
  ['a food of no mass', 'food.mass_kg', 0],
  ['an unknown oxygen mode', 'food.oxygen_mode', 'slowly'],
  ['a GAB C of zero', 'food.isotherm.C', 0],
  ['an unknown isotherm', 'food.isotherm.type', 'BET'],
  ['no moisture as packed', 'food.initial_moisture_g_per_g', undefined],
  ['headspace of 101 % oxygen', 'pack.starting_headspace_oxygen_percent', 101],
  ['half a leak', 'pack.leaks', { count: 0.5, length_mm: 10, diameter_um: 20 }, 'pack.leaks.count'],
  ['no limits', 'limits', {}],
  ['a negative limit', 'limits.oxygen_uptake_mg_per_kg', -1],
  ['a horizon of zero', 'horizon_days', 0],
  ['a target of zero', 'target_days', 0],
  ['an unknown key', 'pack.walls[0].colour', 'red'],
  ['an unknown key at the top', 'seed', 1],
  ['text where the pack should be', 'pack', 'a pouch'],
  ['a list where the food should be', 'food', []],
  ['a test whose moist side is dry', 'tests', [waterTest(0.1, 0.5)], 'tests[0]'],
];

function waterTest(high: number, low: number) {
  return { gas: 'water', temperature_C: 38, relative_humidity_high: high, relative_humidity_low: low };
}

describe('POST /api/evaluations', () => {
  it('answers what is right', async () => {
    const answer = await engineer.send('POST', '/api/evaluations', { body: evaluationBody() });
    expect(answer.status, answer.text).toBe(200);
    expect(answer.json.shelf_life_days).toBeGreaterThan(0);
  });

  it.each(BAD_EVALUATIONS)('refuses %s at its field', async (_name, path, value, faultPath = path) => {
    const answer = await engineer.send('POST', '/api/evaluations', {
      body: changed(evaluationBody(), path, value),
    });
    expect(answer.status, answer.text).toBe(400);
    expect(answer.json.error.code).toBe('input_invalid');
    const paths: string[] = answer.json.error.fields.map((fault: { path: string }) => fault.path);
    expect(paths).toContain(faultPath);
    const fault = answer.json.error.fields.find((one: { path: string }) => one.path === faultPath);
    expect(fault.message.length).toBeGreaterThan(10);
    expect(fault.message).not.toMatch(/must be a `|undefined|NaN/);
  });

  it('names every faulty field at once', async () => {
    const body = changed(changed(evaluationBody(), 'food.mass_kg', -1), 'route.legs[1].relative_humidity', 2);
    const answer = await engineer.send('POST', '/api/evaluations', { body });
    const paths = answer.json.error.fields.map((fault: { path: string }) => fault.path);
    expect(paths.toSorted()).toEqual(['food.mass_kg', 'route.legs[1].relative_humidity']);
  });

  it.each([
    ['NaN', '"mass_kg":NaN'],
    ['Infinity', '"mass_kg":Infinity'],
    ['a number beyond numbers', '"mass_kg":1e999'],
    ['a leading zero', '"mass_kg":01'],
  ])('refuses %s', async (_name, text) => {
    const raw = JSON.stringify(evaluationBody()).replace('"mass_kg":0.2', text);
    const answer = await engineer.send('POST', '/api/evaluations', { raw });
    expect([answer.status, answer.json.error.code]).toEqual([400, 'input_invalid']);
  });

  it('answers "day 0" and says so where a limit is passed as packed', async () => {
    const body = changed(evaluationBody(), 'limits', { oxygen_uptake_mg_per_kg: 0.001 });
    const answer = await engineer.send('POST', '/api/evaluations', { body });
    expect(answer.status, answer.text).toBe(200);
    expect(answer.json.shelf_life_days).toBe(0);
    expect(answer.json.warnings.map((warning: { code: string }) => warning.code)).toContain(
      'limit_passed_at_packing',
    );
  });

  it('lets a person evaluate only so often', async () => {
    const busy = await server.signInAs(['engineer']);
    const bad = { body: { pack: 1 } };
    const good = { body: quickBody() };
    // Refused input does not count; computed answers do.
    expect((await busy.send('POST', '/api/evaluations', bad)).status).toBe(400);
    let limited = 0;
    for (let batch = 0; batch < 62 && limited === 0; batch += 1) {
      const answers = await Promise.all(
        Array.from({ length: 10 }, () => busy.send('POST', '/api/evaluations', good)),
      );
      limited = answers.filter((answer) => answer.status === 429).length;
    }
    expect(limited).toBeGreaterThan(0);
    expect((await engineer.send('POST', '/api/evaluations', good)).status).toBe(200);
  });
});

type Make = () => unknown;
const material = () => ({ id: kept.materials, revisionId: kept.materialRevision });
const studySpec = () =>
  aStudy({ foodId: kept.foods, packId: kept.packs, routeId: kept.routes, laminateIds: [kept.laminates] });

const BAD_SPECS: [
  name: string,
  collection: string,
  make: Make,
  path: string,
  value: unknown,
  faultPath?: string,
][] = [
  ['a name of spaces', 'packs', aPack, 'name', '   '],
  ['seals wider than the pouch', 'packs', aPack, 'form.seal_left_mm', 155, 'form'],
  ['no form', 'packs', aPack, 'form', undefined],
  ['an unknown form', 'packs', aPack, 'form.type', 'can'],
  ['no spec', 'packs', aPack, '', undefined],
  [
    'a typed value that is another',
    'packs',
    aPack,
    'typed',
    { headspace_cm3: { value: 8, unit: 'fl_oz' } },
    'headspace_cm3',
  ],
  [
    'a typed value of another kind',
    'packs',
    aPack,
    'typed',
    { headspace_cm3: { value: 8, unit: 'mm' } },
    'typed["headspace_cm3"]',
  ],
  [
    'a typed value of nothing',
    'packs',
    aPack,
    'typed',
    { nowhere_mm: { value: 8, unit: 'mm' } },
    'typed["nowhere_mm"]',
  ],
  ['an empty wall', 'laminates', () => aLaminate([material()]), 'layers', []],
  ['51 layers', 'laminates', () => aLaminate([material()]), 'layers', Array.from({ length: 51 }, () => ({}))],
  ['a gauge of zero', 'laminates', () => aLaminate([material()]), 'layers[0].thickness_um', 0],
  ['a material that is none', 'laminates', () => aLaminate([material()]), 'layers[0].material_id', 'x'],
  [
    'a coefficient that does not follow',
    'materials',
    aFilm,
    'oxygen.gas.permeability_mol_m_per_m2_s_Pa',
    1e-15,
  ],
  ['an energy that does not follow', 'materials', aFilm, 'oxygen.gas.activation_energy_J_per_mol', 50_000],
  [
    'a permeance for a film without the gauge it was measured on',
    'materials',
    aFilm,
    'oxygen.stated.unit',
    'cm3(STP)/(m2*day*atm)',
    'oxygen.stated.thickness_um',
  ],
  [
    'a measured range upside down',
    'materials',
    aFilm,
    'oxygen.stated.measured_temperature_min_C',
    80,
    'oxygen.gas.measured_temperature_min_C',
  ],
  ['an unknown unit', 'materials', aFilm, 'water.stated.unit', 'furlong'],
  ['a rate without its test', 'materials', aFilm, 'water.stated.relative_humidity_high', undefined],
  ['an unknown class', 'materials', aFilm, 'material_class', 'wood'],
  ['an unknown kind', 'materials', aFilm, 'kind', 'wood'],
  ['no limits', 'foods', aFood, 'limits', {}],
  ['an isotherm without moisture as packed', 'foods', aFood, 'food.initial_moisture_g_per_g', undefined],
  [
    'a rate mode without a rate',
    'foods',
    aFood,
    'food.oxygen_mode',
    'rate',
    'food.rate_constant_mol_per_kg_s_Pa',
  ],
  ['70 °C', 'routes', aRoute, 'route.legs[0].temperature_C', 70],
  ['401 legs', 'routes', aRoute, 'route.legs', Array.from({ length: 401 }, () => ({}))],
  ['no wall', 'studies', studySpec, 'laminate_ids', []],
  ['a target of zero', 'studies', studySpec, 'target_days', 0],
  ['a food that is none', 'studies', studySpec, 'food_id', '01900000-0000-7000-8000-000000000000'],
];

describe('what is kept', () => {
  it.each(BAD_SPECS)(
    'refuses %s (%s) at its field',
    async (_name, collection, make, path, value, faultPath = path) => {
      const body = path === '' ? {} : { spec: changed(make(), path, value) };
      const answer = await engineer.send('POST', pathOf(engineer, collection), { body });
      expect(answer.status, answer.text).toBe(400);
      const paths = answer.json.error.fields.map((fault: { path: string }) => fault.path);
      expect(paths).toContain(path === '' ? 'spec' : `spec.${faultPath}`);
    },
  );

  it('keeps what was typed beside what it means', async () => {
    const typed = { headspace_cm3: { value: 4, unit: 'fl_oz' } };
    const spec = aPack({ headspace_cm3: 118.29411825, typed });
    const answer = await engineer.send('POST', pathOf(engineer, 'packs'), { body: { spec } });
    expect(answer.status, answer.text).toBe(201);
    expect(answer.json.revision.spec.typed).toEqual(typed);
  });

  it('lays what the engine refuses at the thing that was chosen', async () => {
    const limits = { headspace_oxygen_percent: 2 };
    const food = { mass_kg: 0.2, oxygen_mode: 'none', inside_relative_humidity: 0.5 } as const;
    const kept_ = await engineer.send('POST', pathOf(engineer, 'foods'), {
      body: { spec: aFood({ limits, food }) },
    });
    expect(kept_.status, kept_.text).toBe(201);
    const pack = await engineer.send('POST', pathOf(engineer, 'packs'), {
      body: { spec: aPack({ headspace_cm3: 0 }) },
    });
    const spec = { ...studySpec(), food_id: kept_.json.id, pack_id: pack.json.id };
    const answer = await engineer.send('POST', pathOf(engineer, 'studies'), { body: { spec } });
    expect(answer.status, answer.text).toBe(400);
    expect(answer.json.error.fields[0].path).toMatch(/^spec\.(pack_id|food_id)$/);
  });
});

describe('whatever is sent', () => {
  it('answers with the one envelope and the request’s number, never 5xx', async () => {
    const paths = [
      '/api/evaluations',
      '/api/session',
      '/api/password-resets',
      pathOf(engineer, 'studies'),
      pathOf(engineer, 'materials'),
    ];
    const raws: (string | Uint8Array<ArrayBuffer>)[] = [
      '',
      '{',
      'null',
      '[]',
      '"text"',
      '0',
      '{"__proto__":{"a":1}}',
      '{"constructor":{"prototype":{}}}',
      '{"spec":null}',
      '{"spec":{"name":"\\u0000"}}',
      '{"spec":{"name":"\\ud800"}}',
      '{"email":"a\\u0000@b.c","password":"x"}',
      `${'['.repeat(100_000)}${']'.repeat(100_000)}`,
      `{"a":${'{"a":'.repeat(10_000)}1${'}'.repeat(10_000)}}`,
      `{"report_days":[${'1,'.repeat(200_000)}1]}`,
      `{"email":"${'a'.repeat(900_000)}@b.c","password":"x"}`,
      new Uint8Array([0xff, 0xfe, 0x00, 0x80]),
    ];
    for (const path of paths) {
      for (const raw of raws) {
        const answer = await engineer.send('POST', path, { raw });
        expect(
          [400, 401, 404, 413, 429],
          `${path} ${raw.toString().slice(0, 40)}: ${answer.text.slice(0, 200)}`,
        ).toContain(answer.status);
        expect(answer.json.error.request_id).toBe(answer.headers.get('x-request-id'));
      }
    }
  });

  it('answers 413 beyond 1 MB, and 400 for other media and broken encodings', async () => {
    const send = (options: Parameters<TestClient['send']>[2]) =>
      engineer.send('POST', '/api/evaluations', options);
    const large = await send({ raw: `"${'a'.repeat(1_000_001)}"` });
    expect([large.status, large.json.error.code]).toEqual([413, 'file_too_large']);
    expect((await send({ raw: '{}', headers: { 'Content-Type': 'text/plain' } })).status).toBe(400);
    expect(
      (await send({ raw: '{}', headers: { 'Content-Type': 'application/json; charset=klingon' } })).status,
    ).toBe(400);
    expect((await send({ raw: '{}', headers: { 'Content-Encoding': 'gzip' } })).status).toBe(400);
    expect(
      (await engineer.send('POST', pathOf(engineer, 'packs'), { body: {}, idempotencyKey: 'x'.repeat(300) }))
        .status,
    ).toBe(400);
    expect((await engineer.get(`${pathOf(engineer, 'packs')}?limit=0`)).status).toBe(400);
    expect((await engineer.get(`${pathOf(engineer, 'packs')}?limit=many`)).status).toBe(400);
    expect((await engineer.get(`${pathOf(engineer, 'packs')}?after=x&after=y`)).status).toBe(400);
    expect((await engineer.get(`${pathOf(engineer, 'packs')}?colour=red`)).status).toBe(400);
  });

  it('survives random changes to a whole description', async () => {
    const anyone = await server.signInAs(['engineer']);
    const places = pathsOf(evaluationBody());
    await fc.assert(
      fc.asyncProperty(fc.constantFrom(...places), fc.jsonValue({ maxDepth: 2 }), async (path, value) => {
        const answer = await anyone.send('POST', '/api/evaluations', {
          body: changed(evaluationBody(), path, value),
        });
        expect([200, 400], `${path} = ${JSON.stringify(value)}: ${answer.text.slice(0, 300)}`).toContain(
          answer.status,
        );
      }),
      { numRuns: 300, seed: 20_261_201 },
    );
  });
});

function pathsOf(value: unknown, path = ''): string[] {
  if (typeof value !== 'object' || value === null) return [path];
  const inner = Object.entries(value).flatMap(([key, member]) =>
    pathsOf(member, Array.isArray(value) ? `${path}[${key}]` : path === '' ? key : `${path}.${key}`),
  );
  return path === '' ? inner : [path, ...inner];
}
