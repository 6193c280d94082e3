/**
 * How long lists and studies take in an account with 5,000 studies and 2,000 laminates. A measurement, not a test:
 * it depends on the machine. `npx tsx test/bench/many-things.ts` makes a PostgreSQL of its own and removes it again.
 */
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { pino } from 'pino';
import postgres from 'postgres';
import { createDatabase, databaseUrl } from '../../server/bin/databases.mjs';
import { runScript, say } from '../../server/bin/say.mjs';
import { openTestCluster, TEMPLATE_DATABASE } from '../../server/bin/test-cluster.mjs';
import { createApp } from '../../server/create-app';
import { openDatabase } from '../../server/db/client';
import { demoPeople } from '../../server/db/seed/demo-people';
import { originsOf } from '../../server/http/origin';
import { openSessions } from '../../server/http/sessions';
import { seedDemo } from '../../server/modules/demo/seed-demo';
import { evaluate } from '../../shared/engine';

const DATABASE = 'many_things';
const STUDIES = 5_000;
const LAMINATES = 2_000;
const TIMES = 40;
const WARM_UP = 5;

/** Copies of what the demo keeps, under new ids, each study with laminates of its own and a result. */
async function multiply(ownerUrl: string) {
  const sql = postgres(ownerUrl, { max: 1, onnotice: () => undefined });
  try {
    await sql.begin(async (tx) => {
      await tx`CREATE TEMP TABLE wall_copies ON COMMIT DROP AS
        SELECT gen_random_uuid() AS id, gen_random_uuid() AS revision_id, i, source.account_id, revision.spec
        FROM generate_series(1, ${LAMINATES}) AS i
        JOIN (SELECT *, row_number() OVER () - 1 AS n, count(*) OVER () AS total FROM laminates) AS source
          ON source.n = i % source.total
        JOIN laminate_revisions AS revision ON revision.id = source.current_revision_id`;
      await tx`INSERT INTO laminates (id, account_id, current_revision_id, name)
        SELECT id, account_id, revision_id, spec ->> 'name' || ' ' || i FROM wall_copies`;
      await tx`INSERT INTO laminate_revisions (id, account_id, thing_id, number, spec)
        SELECT revision_id, account_id, id, 1, jsonb_set(spec, '{name}', to_jsonb(spec ->> 'name' || ' ' || i))
        FROM wall_copies`;
      await tx`CREATE TEMP TABLE study_copies ON COMMIT DROP AS
        SELECT gen_random_uuid() AS id, gen_random_uuid() AS revision_id, gen_random_uuid() AS result_id, i,
          source.id AS source_id, source.account_id, revision.spec,
          (SELECT jsonb_agg(wall.id) FROM wall_copies AS wall
            WHERE wall.i BETWEEN (i * 3) % ${LAMINATES} + 1 AND (i * 3) % ${LAMINATES} + 4) AS laminate_ids
        FROM generate_series(1, ${STUDIES}) AS i
        JOIN (SELECT *, row_number() OVER () - 1 AS n, count(*) OVER () AS total FROM studies) AS source
          ON source.n = i % source.total
        JOIN study_revisions AS revision ON revision.id = source.current_revision_id`;
      await tx`INSERT INTO studies (id, account_id, current_revision_id, name)
        SELECT id, account_id, revision_id, spec ->> 'name' || ' ' || i FROM study_copies`;
      await tx`INSERT INTO study_revisions (id, account_id, thing_id, number, spec)
        SELECT revision_id, account_id, id, 1,
          spec || jsonb_build_object('name', spec ->> 'name' || ' ' || i, 'laminate_ids', laminate_ids)
        FROM study_copies`;
      await tx`INSERT INTO results
          (id, account_id, study_id, study_revision_id, number, engine_version, body, sha256, headline)
        SELECT copy.result_id, copy.account_id, copy.id, copy.revision_id, 1, engine_version, body, sha256, headline
        FROM study_copies AS copy JOIN results ON results.study_id = copy.source_id`;
      await tx`INSERT INTO result_pins (result_id, collection, thing_id, revision_id)
        SELECT copy.result_id, collection, pin.thing_id, pin.revision_id
        FROM study_copies AS copy JOIN results ON results.study_id = copy.source_id
        JOIN result_pins AS pin ON pin.result_id = results.id`;
    });
    await sql`ANALYZE`;
  } finally {
    await sql.end();
  }
}

async function measure(name: string, ask: (turn: number) => Promise<string>) {
  const times: number[] = [];
  let bytes = 0;
  for (let turn = 0; turn < WARM_UP + TIMES; turn += 1) {
    const start = performance.now();
    bytes = (await ask(turn)).length;
    if (turn >= WARM_UP) times.push(performance.now() - start);
  }
  const sorted = times.toSorted((one, other) => one - other);
  const at = (fraction: number) => (sorted[Math.floor(fraction * (sorted.length - 1))] ?? NaN).toFixed(1);
  say(
    `${name.padEnd(44)} median ${at(0.5)} ms, nine of ten within ${at(0.9)} ms, ${Math.round(bytes / 1024)} kB`,
  );
}

void runScript(async () => {
  const { cluster, close } = await openTestCluster();
  try {
    await createDatabase(cluster, DATABASE, { template: TEMPLATE_DATABASE });
    const { db, close: closeDatabase } = openDatabase(databaseUrl(cluster, 'larderline_app', DATABASE));
    await seedDemo({ db, engine: { evaluate: async (description) => evaluate(description) } });
    await multiply(databaseUrl(cluster, 'larderline_owner', DATABASE));

    const server = createServer();
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    const baseUrl = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
    const app = createApp({
      db,
      sessions: openSessions({ db, isSecure: false }),
      jobs: { enqueue: async () => undefined },
      engine: { evaluate: async (description) => evaluate(description) },
      demo: null,
      logger: pino({ level: 'silent' }),
      version: 'bench',
      isSecure: false,
      allowedOrigins: originsOf(baseUrl),
      webDir: 'no-web-build-here',
      isCheckingAnswers: false,
    });
    server.on('request', app);
    try {
      await measureAll(baseUrl);
    } finally {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await closeDatabase();
    }
  } finally {
    await close();
  }
});

async function measureAll(baseUrl: string) {
  const [{ email, password }] = demoPeople;
  const signIn = await fetch(`${baseUrl}/api/session`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', Origin: baseUrl },
    body: JSON.stringify({ email, password }),
  });
  const { memberships } = (await signIn.json()) as { memberships: { account: { id: string } }[] };
  const cookie = signIn.headers.get('set-cookie')?.split(';')[0] ?? '';
  const account = `/api/accounts/${memberships[0]?.account.id}`;
  const get = async (path: string) => {
    const response = await fetch(`${baseUrl}${account}/${path}`, { headers: { Cookie: cookie } });
    const text = await response.text();
    if (response.status !== 200) throw new Error(`${path} answered ${response.status}: ${text}`);
    return text;
  };
  const page: { items: { id: string }[]; next_after: string } = JSON.parse(await get('studies?limit=200'));
  const material: { items: { id: string }[] } = JSON.parse(await get('materials?search=bopet%20film'));
  const lists = [
    'studies',
    'studies?limit=20',
    `studies?after=${page.next_after}`,
    'studies?sort=name',
    `studies?sort=name&after=${page.next_after}`,
    'studies?sort=days',
    `studies?sort=days&after=${page.next_after}`,
    'studies?search=crisps',
    'studies?search=nothing-is-called-so',
    'studies?tag=lesson',
    'studies?tag=lesson&sort=days',
    'studies?archived=only',
    'laminates',
    'laminates?search=evoh',
    'laminates?search=nothing-is-called-so',
    'materials',
    `materials/${material.items[0]?.id}/uses`,
  ];
  for (const path of lists) await measure(path.replace(/[0-9a-f-]{36}/, '…'), () => get(path));
  await measure('studies/…', (turn) => get(`studies/${page.items[turn]?.id}`));
}
