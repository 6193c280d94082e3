import { readFileSync } from 'node:fs';
import path from 'node:path';
import postgres from 'postgres';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { prepareCluster } from '../../server/bin/cluster.mjs';
import { createTestDatabase, type TestDatabase } from '../harness/test-database';

let database: TestDatabase;
let application: postgres.Sql;

beforeAll(async () => {
  database = await createTestDatabase();
  application = postgres(database.url, { max: 1, onnotice: () => undefined });
});

afterAll(async () => {
  await application.end();
  await database.drop();
});

describe('a test database', () => {
  it('is migrated', async () => {
    const rows =
      await application`SELECT count(*)::int AS tables FROM information_schema.tables WHERE table_schema = 'public'`;
    expect(rows[0]?.tables).toBeGreaterThan(5);
  });

  it('lets the application role make no table and read no password', async () => {
    await expect(application`CREATE TABLE intruder (id int)`).rejects.toThrow(/permission denied/);
    await expect(application`SELECT rolpassword FROM pg_authid`).rejects.toThrow(/permission denied/);
  });

  it('listens on loopback alone, without a socket file', async () => {
    const [row] = await application`SELECT current_setting('listen_addresses') AS addresses`;
    expect(row?.addresses).toBe('127.0.0.1');
    const cluster = await prepareCluster({ home: inject('testClusterHome'), isDurable: false });
    // The fifth line of postmaster.pid names the folder of the socket file.
    const lines = readFileSync(path.join(cluster.folder, 'postmaster.pid'), 'utf8').split('\n');
    expect(lines[4]).toBe('');
  });

  it('keeps its password secret from whoever has none', async () => {
    const url = new URL(database.url);
    url.password = 'guessed';
    const stranger = postgres(url.href, { max: 1 });
    await expect(stranger`SELECT 1`).rejects.toThrow(/password authentication failed/);
    await stranger.end();
  });
});
