import type { TestProject } from 'vitest/node';
import { takeOrOpenTestCluster } from '../../server/bin/test-cluster.mjs';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Where the test cluster keeps its cluster.json; test-database.ts opens it from there. */
    testClusterHome: string;
  }
}

/**
 * Vitest's global set-up: takes the cluster that `npm test` started, or starts one of its own for
 * `npx vitest run --project http …` and removes it afterwards.
 */
export default async function setUp(project: TestProject) {
  const { home, close } = await takeOrOpenTestCluster();
  project.provide('testClusterHome', home);
  return close;
}
