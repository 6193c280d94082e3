import { createRequire } from 'node:module';
import { defineConfig } from 'vitest/config';

const resolveFromHere = createRequire(import.meta.url).resolve;

/** Tests that need a real server, a browser or the power cut; everything else is a unit test. */
const NOT_UNIT = [
  '**/node_modules/**',
  '**/*.http.test.ts',
  'test/http/**',
  'test/browser/**',
  'test/recovery/**',
  'test/bench/**',
];

/** The projects run one after the other (groupOrder), so that a browser never waits for the unit tests. */
export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: 'unit',
          environment: 'node',
          include: ['{shared,server,src,test}/**/*.test.ts'],
          exclude: NOT_UNIT,
          testTimeout: 30_000,
          sequence: { groupOrder: 0 },
        },
      },
      {
        resolve: {
          alias: [
            { find: /^react-native$/, replacement: 'react-native-web' },
            {
              find: /^react-native-svg$/,
              replacement: resolveFromHere('react-native-svg/lib/module/index.js'),
            },
          ],
          extensions: [
            '.web.tsx',
            '.web.ts',
            '.web.jsx',
            '.web.js',
            '.tsx',
            '.ts',
            '.jsx',
            '.mjs',
            '.js',
            '.json',
          ],
        },
        define: { __DEV__: 'true', 'process.env.EXPO_OS': '"web"' },
        test: {
          name: 'component',
          environment: 'jsdom',
          include: ['{src,app}/**/*.test.tsx'],
          server: { deps: { inline: [/react-native/, /expo/] } },
          testTimeout: 30_000,
          sequence: { groupOrder: 1 },
        },
      },
      {
        test: {
          name: 'http',
          environment: 'node',
          include: ['test/http/**/*.test.ts', 'server/**/*.http.test.ts'],
          globalSetup: ['test/harness/test-cluster.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
          maxWorkers: 2,
          sequence: { groupOrder: 2 },
        },
      },
      {
        test: {
          name: 'recovery',
          environment: 'node',
          include: ['test/recovery/**/*.test.ts'],
          testTimeout: 300_000,
          hookTimeout: 300_000,
          fileParallelism: false,
          maxWorkers: 1,
          sequence: { groupOrder: 3 },
        },
      },
      {
        test: {
          name: 'browser',
          environment: 'node',
          include: ['test/browser/**/*.test.ts'],
          globalSetup: ['test/harness/test-cluster.ts', 'test/browser/harness/web-build.ts'],
          testTimeout: 180_000,
          hookTimeout: 180_000,
          fileParallelism: false,
          maxWorkers: 1,
          sequence: { groupOrder: 4 },
        },
      },
    ],
  },
});
