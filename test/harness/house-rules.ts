import ts from 'typescript';
import { isTestFile, type Breach } from './import-rules';
import type { SourceFile } from './source-files';

/** Rules about what a file holds and how it is called, each breach with its remedy. */
export function findHouseBreaches(files: readonly SourceFile[]): Breach[] {
  return files.flatMap((file) =>
    [routeFileFault(file), ...textFaults(file), nameFault(file.path)].flatMap((message) =>
      message === undefined ? [] : [{ file: file.path, message }],
    ),
  );
}

/** Every file in app is a route: it re-exports one screen, or it is a layout. */
function routeFileFault(file: SourceFile): string | undefined {
  if (!file.path.startsWith('app/')) return undefined;
  if (/\.test\.tsx?$/.test(file.path))
    return 'lies in app, where every file is a route. Put the test beside the screen in src.';
  const name = file.path.split('/').at(-1) ?? '';
  if (/^(_layout|\+html)\.tsx$/.test(name)) return undefined;
  const isReExportOnly =
    file.tree.statements.length > 0 &&
    file.tree.statements.every((one) => ts.isExportDeclaration(one) && one.moduleSpecifier !== undefined);
  return isReExportOnly
    ? undefined
    : "holds more than a re-export. Write `export { FooScreen as default } from '…/foo-screen'` and move the rest to src/features.";
}

interface TextRule {
  pattern: RegExp;
  isBound: (file: string) => boolean;
  message: string;
}

const isEngine = (file: string) => file.startsWith('shared/engine/') && !isTestFile(file);
const mayReadEnvironment = (file: string) =>
  file === 'server/env.ts' || /^server\/bin\/[^/]+\.mjs$/.test(file) || isTestFile(file);
/** The rules themselves name what they forbid. */
const isNotARuleFile = (file: string) => !/^test\/(architecture\.test|harness\/house-rules)\.ts$/.test(file);

const TEXT_RULES: readonly TextRule[] = [
  {
    pattern: /\bMath\.random\b/,
    isBound: isEngine,
    message: 'uses Math.random. Randomness is an argument of the engine.',
  },
  {
    pattern: /\bDate\.now\b|\bnew Date\(\)/,
    isBound: isEngine,
    message: 'reads the clock. Time is an argument of the engine.',
  },
  {
    pattern: /\bconsole\./,
    isBound: isEngine,
    message: 'uses console. Return what there is to say as data.',
  },
  {
    pattern: /\bprocess\.env\b/,
    isBound: (file) => !mayReadEnvironment(file),
    message: 'reads process.env. Add the key to server/env.ts and take the value as an argument.',
  },
  { pattern: /\bas any\b/, isBound: isNotARuleFile, message: 'casts to any. Narrow the value instead.' },
  {
    pattern: /@ts-(ignore|nocheck)/,
    isBound: isNotARuleFile,
    message: 'silences the type checker. Mend the type.',
  },
  {
    pattern: /\b(it|test|describe)\.only\(/,
    isBound: isNotARuleFile,
    message: 'holds .only, which hides all other tests. Remove it.',
  },
  {
    pattern: /\b(TODO|FIXME|XXX)\b/,
    isBound: isNotARuleFile,
    message: 'puts work off. Do it, or say in DEVELOPERS.md why not.',
  },
];

function textFaults(file: SourceFile): string[] {
  return TEXT_RULES.filter((rule) => rule.isBound(file.path) && rule.pattern.test(file.text)).map(
    (rule) => rule.message,
  );
}

const KEBAB_FILE = /^[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9]+)*\.(ts|tsx|mjs|js)$/;
const ROUTE_FILE = /^(_layout|\+[a-z-]+|\[{1,2}(\.\.\.)?[a-zA-Z-]+\]{1,2}|[a-z0-9]+(-[a-z0-9]+)*)\.tsx$/;
const BUCKET = /(^|\/)(utils?|helpers?|types|misc|common)(\/|\.(ts|tsx|mjs|js)$)/;

function nameFault(file: string): string | undefined {
  if (BUCKET.test(file)) return 'is a bucket. Name it for what it holds.';
  const name = file.split('/').at(-1) ?? '';
  const pattern = file.startsWith('app/') ? ROUTE_FILE : KEBAB_FILE;
  return pattern.test(name) ? undefined : 'is not named in kebab-case.';
}
