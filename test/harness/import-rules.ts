import type { SourceFile, SourceImport } from './source-files';

export interface Breach {
  file: string;
  message: string;
}

interface ImportRule {
  /** Who the rule binds. */
  from: RegExp;
  /** Own files it may import. */
  mayImport: readonly RegExp[];
  /** Own files it may import for their types alone. */
  mayImportTypes?: readonly RegExp[];
  /** Packages it may import; undefined: any. */
  packages?: readonly RegExp[];
  remedy: string;
}

const NO_PACKAGES: readonly RegExp[] = [];

/** Who may import whom. A file is bound by the first rule that fits it. */
const IMPORT_RULES: readonly ImportRule[] = [
  {
    from: /^shared\/engine\//,
    mayImport: [/^shared\/engine\//, /^shared\/units\b/],
    packages: NO_PACKAGES,
    remedy: 'The engine knows units only. Pass the value in as an argument.',
  },
  {
    from: /^shared\/contract\//,
    mayImport: [/^shared\/contract\//, /^shared\/units\b/, /^shared\/errors\//],
    mayImportTypes: [/^shared\/engine\//],
    packages: [/^yup$/],
    remedy:
      'A contract knows yup, units, errors and the engine’s types (import type). Move the rest to whoever uses it.',
  },
  {
    from: /^shared\/errors\//,
    mayImport: [/^shared\/errors\//],
    packages: NO_PACKAGES,
    remedy: 'Error codes know nothing else.',
  },
  {
    from: /^shared\/units\//,
    mayImport: [/^shared\/units\//],
    packages: NO_PACKAGES,
    remedy: 'Units know nothing else.',
  },
  {
    from: /^shared\/charts\//,
    mayImport: [/^shared\/charts\//, /^shared\/units\b/],
    mayImportTypes: [/^shared\/engine\//],
    packages: [/^d3-/],
    remedy: 'Chart arithmetic takes plain series; drawing belongs in src/charts.',
  },
  {
    from: /^shared\//,
    mayImport: [/^shared\//],
    packages: NO_PACKAGES,
    remedy: 'Shared code runs in the browser and on the server: no React, no Node, no input or output.',
  },
  {
    from: /^server\/db\//,
    mayImport: [/^server\/db\//, /^shared\//],
    remedy:
      'The database layer knows shared only. Turn the dependency round: let the module call the database.',
  },
  {
    from: /^server\/modules\//,
    mayImport: [/^server\/(db|http|jobs|mail)\//, /^shared\//],
    remedy:
      'A module knows server/db, server/http, the jobs and mail ports and shared. Take anything else as an argument from create-app.ts.',
  },
  {
    from: /^server\/http\//,
    mayImport: [/^server\/(http|db)\//, /^shared\//],
    remedy: 'server/http serves the modules and knows none of them. Take what differs as an argument.',
  },
  {
    from: /^server\//,
    mayImport: [/^server\//, /^shared\//],
    remedy: 'The server never imports the client. Move what both need to shared.',
  },
  {
    from: /^src\/ui\//,
    mayImport: [/^src\/ui\//, /^assets\/fonts\//],
    remedy:
      'src/ui knows no product word: only its tokens and other parts. Take the text or value as a prop.',
  },
  {
    from: /^src\/charts\//,
    mayImport: [/^src\/charts\//, /^src\/ui\//, /^shared\/charts\//],
    remedy: 'Charts draw plain series: take numbers and words as props, put arithmetic in shared/charts.',
  },
  {
    from: /^src\/api\//,
    mayImport: [/^src\/api\//, /^shared\//],
    remedy: 'src/api knows shared only.',
  },
  {
    from: /^src\/session\//,
    mayImport: [/^src\/session\//, /^src\/api\//, /^shared\//],
    remedy: 'src/session knows src/api and shared only.',
  },
  {
    // The one place that gathers the screens behind the sign-in into a single download (see server/bin/web-size.mjs).
    from: /^src\/features\/workbench\//,
    mayImport: [/^src\/(features|ui)\//],
    remedy: 'src/features/workbench only gathers screens of other features.',
  },
  {
    from: /^src\/features\//,
    mayImport: [/^src\/(ui|charts|api|session)\//, /^shared\//],
    remedy:
      'A feature knows ui, charts, api, session and shared; never another feature. Move what two need to src/ui or src/api.',
  },
  {
    from: /^app\//,
    mayImport: [/^app\//, /^src\/(features|ui|session)\//],
    remedy:
      'A route re-exports one screen from src/features; a layout takes providers from src/features, src/ui or src/session.',
  },
];

export function isTestFile(file: string): boolean {
  return file.startsWith('test/') || /\.test\.(ts|tsx)$/.test(file);
}

/** Breaches of the import rules, each with its remedy. */
export function findImportBreaches(files: readonly SourceFile[]): Breach[] {
  return files.flatMap((file) =>
    file.imports.flatMap((one) => {
      const remedy = isTestFile(file.path) ? refuseInTest(file.path, one) : refuse(file.path, one);
      return remedy === undefined
        ? []
        : [{ file: file.path, message: `imports ${one.specifier}. ${remedy}` }];
    }),
  );
}

/** Start-up scripts that are themselves a way to run checks. */
const CHECK_SCRIPT = /^server\/bin\/check-[a-z-]+\.ts$/;

/** Tests may reach further, but client and server stay apart even there. */
function refuseInTest(file: string, { target }: SourceImport): string | undefined {
  const isClientTest = /^(app|src)\//.test(file);
  return isClientTest && target?.startsWith('server/')
    ? 'The client never imports the server, not even a type.'
    : undefined;
}

function refuse(file: string, one: SourceImport): string | undefined {
  const rule = IMPORT_RULES.find((candidate) => candidate.from.test(file));
  if (rule === undefined) return undefined;
  if (one.target === undefined) {
    const isAllowed = rule.packages?.some((allowed) => allowed.test(one.specifier)) ?? true;
    return isAllowed ? undefined : rule.remedy;
  }
  const target = one.target;
  if (target.startsWith('test/')) return CHECK_SCRIPT.test(file) ? undefined : 'Only tests import from test.';
  if (ownUnit(file) !== undefined && target.startsWith(`${ownUnit(file)}/`)) return undefined;
  if (file.startsWith('server/modules/') && target.startsWith('server/modules/'))
    return refuseOtherModule(target);
  // A folder may be meant by its index file.
  const fits = (allowed: RegExp) => allowed.test(target) || allowed.test(`${target}/index`);
  if (rule.mayImport.some(fits)) return undefined;
  if (one.isTypeOnly && rule.mayImportTypes?.some(fits)) return undefined;
  return rule.remedy;
}

/** A module or a feature may import everything of its own. */
function ownUnit(file: string): string | undefined {
  return /^(server\/modules|src\/features)\/[^/]+(?=\/)/.exec(file)?.[0];
}

const NAMED_OPERATION = /^server\/modules\/[^/]+\/[a-z]+(-[a-z0-9]+)+$/;

function refuseOtherModule(target: string): string | undefined {
  return NAMED_OPERATION.test(target)
    ? undefined
    : 'Another module is used through its named operations (<verb>-<noun>.ts) only, not its routes or repository.';
}
