import { readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { findHouseBreaches } from './harness/house-rules';
import { findImportBreaches, type Breach } from './harness/import-rules';
import { ROOT, parseSource, readSourceFiles } from './harness/source-files';

const files = readSourceFiles();

function inWords(breaches: readonly Breach[]): string[] {
  return breaches.map(({ file, message }) => `${file} ${message}`);
}

function importBreaches(file: string, text: string): string[] {
  return inWords(findImportBreaches([parseSource(file, text)]));
}

function houseBreaches(file: string, text: string): string[] {
  return inWords(findHouseBreaches([parseSource(file, text)]));
}

describe('the project', () => {
  it('keeps its import rules', () => {
    expect(files.length).toBeGreaterThan(50);
    expect(inWords(findImportBreaches(files))).toEqual([]);
  });

  it('keeps its house rules', () => {
    expect(inWords(findHouseBreaches(files))).toEqual([]);
  });

  it('has nothing else at its top level', () => {
    const layout = [
      'app',
      'src',
      'server',
      'drizzle',
      'shared',
      'test',
      'assets',
      'README.md',
      'DEVELOPERS.md',
      'LICENSE',
      'package.json',
      'package-lock.json',
      'tsconfig.json',
      'babel.config.js',
      'app.json',
      'vitest.config.mts',
      'eslint.config.js',
      'drizzle.config.ts',
      'metro.config.js',
    ];
    const ignored = ['node_modules', 'dist', 'test-results', 'expo-env.d.ts'];
    const found = readdirSync(ROOT).filter((name) => !name.startsWith('.') && !ignored.includes(name));
    const stray = found.filter((name) => !layout.includes(name));
    expect(stray, 'Move these into one of the folders that style.md names.').toEqual([]);
    expect(readdirSync(path.join(ROOT, 'assets')), 'assets holds fonts only.').toEqual(['fonts']);
    expect(readdirSync(path.join(ROOT, 'src')), 'Expo would take src/app instead of app.').not.toContain(
      'app',
    );
  });

  it('writes no download address into package-lock.json', () => {
    const lock = readFileSync(path.join(ROOT, 'package-lock.json'), 'utf8');
    expect(
      lock.match(/"resolved": "[a-z+]*:\/\/[^"]*"/g) ?? [],
      'Run npm install with omit-lockfile-registry-resolved.',
    ).toEqual([]);
    expect(readFileSync(path.join(ROOT, '.npmrc'), 'utf8')).not.toMatch(/registry/);
  });
});

describe('the import rules', () => {
  it.each([
    ['shared/engine/wall.ts', "import x from '../contract/routes'"],
    ['shared/engine/wall.ts', "import fs from 'node:fs'"],
    ['shared/contract/routes.ts', "import { evaluate } from '../engine/evaluate'"],
    ['shared/contract/routes.ts', "import { z } from 'zod'"],
    ['server/db/client.ts', "import { x } from '../modules/studies/get-study'"],
    ['server/db/client.ts', "import { x } from '../http/session'"],
    ['server/modules/studies/create-study.ts', "import { x } from '../packs/packs.repository'"],
    ['server/modules/studies/create-study.ts', "import { x } from '../packs/packs.routes'"],
    ['server/modules/studies/create-study.ts', "import { x } from '../../fakes/mail'"],
    ['server/main.ts', "import { x } from '../src/ui/tokens'"],
    ['src/ui/button.tsx', "import { x } from '../../shared/units'"],
    ['src/charts/stair.tsx', "import { x } from '../api/client'"],
    ['src/features/studies/study-screen.tsx', "import { x } from '../packs/pack-form'"],
    ['src/features/studies/study-screen.tsx', "import type { X } from '../../../server/env'"],
    ['src/features/studies/study-screen.test.tsx', "import type { X } from '../../../server/env'"],
    ['src/features/studies/study-screen.tsx', "const x = await import('../../../server/env')"],
    ['app/index.tsx', "export { default } from '../src/api/client'"],
    ['src/api/client.ts', "import { x } from '../../test/harness/browser'"],
  ])('refuse in %s: %s', (file, text) => {
    expect(importBreaches(file, text)).toHaveLength(1);
  });

  it.each([
    ['shared/engine/wall.ts', "import { x } from '../units'"],
    ['shared/contract/routes.ts', "import type { X } from '../engine/description/evaluation'"],
    ['shared/contract/routes.ts', "import { type X } from '../engine'"],
    ['shared/contract/routes.ts', "import * as yup from 'yup'"],
    ['server/modules/studies/create-study.ts', "import { getPack } from '../packs/get-pack'"],
    ['server/modules/studies/create-study.ts', "import { x } from './studies.repository'"],
    ['server/modules/studies/create-study.ts', "import { x } from '../../http/app-error'"],
    ['src/features/studies/study-screen.tsx', "import { x } from './components/wall'"],
    ['src/features/studies/study-screen.tsx', "import { x } from '../../charts/stair'"],
    ['app/index.tsx', "export { StudyScreen as default } from '../src/features/studies/study-screen'"],
  ])('let pass in %s: %s', (file, text) => {
    expect(importBreaches(file, text)).toEqual([]);
  });
});

describe('the house rules', () => {
  it.each([
    ['app/sign-in.tsx', 'export default function SignIn() { return null; }', /re-export/],
    ['shared/engine/draw.ts', 'export const x = Math.random();', /Randomness/],
    ['shared/engine/draw.ts', 'export const x = Date.now();', /Time/],
    ['server/modules/x/get-x.ts', 'export const x = process.env.X;', /env\.ts/],
    ['src/api/client.ts', 'export const x = y as any;', /Narrow/],
    ['src/api/utils.ts', 'export const x = 1;', /bucket/],
    ['src/ui/Button.tsx', 'export const x = 1;', /kebab/],
  ])('refuse %s: %s', (file, text, remedy) => {
    const breaches = houseBreaches(file, text);
    expect(breaches).toHaveLength(1);
    expect(breaches[0]).toMatch(remedy);
  });

  it.each([
    [
      'app/a/[account]/studies/[studyId].tsx',
      "export { StudyScreen as default } from '../src/features/studies/study-screen'",
    ],
    ['app/(signed-in)/_layout.tsx', 'export default function Layout() { return null; }'],
    ['server/bin/start.mjs', 'const port = process.env.PORT;'],
    ['server/modules/studies/studies.repository.ts', 'export const x = 1;'],
  ])('let pass %s', (file, text) => {
    expect(houseBreaches(file, text)).toEqual([]);
  });
});
