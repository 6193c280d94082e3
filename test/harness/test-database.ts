import { randomBytes } from 'node:crypto';
import { inject } from 'vitest';
import { prepareCluster } from '../../server/bin/cluster.mjs';
import { createDatabase, databaseUrl, dropDatabase } from '../../server/bin/databases.mjs';
import { TEMPLATE_DATABASE } from '../../server/bin/test-cluster.mjs';
import './test-cluster';

export interface TestDatabase {
  name: string;
  /** Application role: what the server under test connects with. */
  url: string;
  /** Owner role: for tests of migrations and of what the application may not do. */
  ownerUrl: string;
  drop: () => Promise<void>;
}

/**
 * A fresh, migrated, empty database for one test file, copied from the template of this run. Drop it in afterAll;
 * connections that are still open are ended.
 */
export async function createTestDatabase(): Promise<TestDatabase> {
  const cluster = await prepareCluster({ home: inject('testClusterHome'), isDurable: false });
  const name = `test_${randomBytes(6).toString('hex')}`;
  await createDatabase(cluster, name, { template: TEMPLATE_DATABASE });
  return {
    name,
    url: databaseUrl(cluster, 'larderline_app', name),
    ownerUrl: databaseUrl(cluster, 'larderline_owner', name),
    drop: () => dropDatabase(cluster, name),
  };
}
