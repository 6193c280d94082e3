/**
 * The only reader of the environment on the server. Every key has one line here and the same line in .env.example;
 * env.test.ts keeps both in step.
 */

export type Mode = 'demo' | 'live';
export type LogLevel = (typeof LOG_LEVELS)[number];

const LOG_LEVELS = ['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'] as const;
const NODE_ENVS = ['development', 'test', 'production'] as const;
const MODES = ['demo', 'live'] as const;

export interface Env {
  nodeEnv: (typeof NODE_ENVS)[number];
  mode: Mode;
  host: string;
  port: number;
  /** Where people reach the product, without a slash at the end; writes from any other origin are refused. */
  publicUrl: string;
  /** Application role: reads and writes rows. */
  databaseUrl: string;
  /** Owner role, for migrations only; undefined in the running server. */
  databaseOwnerUrl: string | undefined;
  /** Undefined only in demo mode: mail then goes to the local sink. */
  smtpUrl: string | undefined;
  mailFrom: string;
  logLevel: LogLevel;
  /** Folder of the web build, from the project's folder or absolute. */
  webDir: string;
  workerThreads: number;
  /** How many proxies of our own stand before the server; 0: the network address is the peer's. */
  trustedProxies: number;
}

/** All keys with what they are for, as .env.example prints them. `default` is what an absent key means. */
export const ENV_KEYS = {
  NODE_ENV: { purpose: 'development, test or production', default: 'development' },
  // Not plain MODE: Vite sets that in every test.
  APP_MODE: {
    purpose: 'demo: invented people and data, loopback only, refuses NODE_ENV=production · live: neither',
    default: 'demo',
  },
  HOST: {
    purpose: 'the address to listen on; demo mode takes loopback addresses only',
    default: '127.0.0.1',
  },
  PORT: {
    purpose: 'the port to listen on; npm start takes the next free one when it is taken',
    default: '4310',
  },
  PUBLIC_URL: { purpose: 'where people reach the product; by default http://HOST:PORT', default: '' },
  DATABASE_URL: { purpose: 'PostgreSQL as the application role; npm start sets it', default: '' },
  DATABASE_OWNER_URL: {
    purpose: 'PostgreSQL as the owner role, for migrations only; npm start sets it',
    default: '',
  },
  SMTP_URL: {
    purpose: 'the mail server, smtp://… or smtps://…; absent in demo mode: the local sink',
    default: '',
  },
  MAIL_FROM: { purpose: 'the sender of mail', default: 'Larderline <post@larderline.example>' },
  LOG_LEVEL: { purpose: 'fatal, error, warn, info, debug, trace or silent', default: 'info' },
  WEB_DIR: { purpose: 'the folder of the web build', default: 'dist' },
  WORKER_THREADS: { purpose: 'threads for engine runs beyond 50 ms, 1 to 64', default: '2' },
  TRUSTED_PROXIES: {
    purpose: 'proxies of your own before the server, whose X-Forwarded-For is believed; 0 for none',
    default: '0',
  },
} as const satisfies Record<string, { purpose: string; default: string }>;

export type EnvKey = keyof typeof ENV_KEYS;
type Source = Readonly<Record<string, string | undefined>>;

/** Thrown with every fault at once, each with its remedy. */
export class EnvError extends Error {
  constructor(readonly faults: readonly string[]) {
    super(`The environment does not fit:\n${faults.map((fault) => `  ${fault}`).join('\n')}`);
    this.name = 'EnvError';
  }
}

export function readEnv(source: Source = process.env): Env {
  const faults: string[] = [];
  const text = (key: EnvKey) => source[key]?.trim() || ENV_KEYS[key].default;

  function oneOf<Choice extends string>(key: EnvKey, choices: readonly Choice[]): Choice {
    const found = choices.find((choice) => choice === text(key));
    if (found === undefined) faults.push(`${key}: "${text(key)}" does not fit; use ${choices.join(', ')}.`);
    return found ?? (ENV_KEYS[key].default as Choice);
  }
  function wholeNumber(key: EnvKey, min: number, max: number): number {
    const value = Number(text(key));
    const isFitting = Number.isInteger(value) && value >= min && value <= max;
    if (!isFitting)
      faults.push(`${key}: "${text(key)}" does not fit; use a whole number from ${min} to ${max}.`);
    return value;
  }
  function url(key: EnvKey, schemes: readonly string[], fallback = ''): string | undefined {
    const value = text(key) || fallback;
    if (value === '') return undefined;
    const isFitting = URL.canParse(value) && schemes.includes(new URL(value).protocol.slice(0, -1));
    if (!isFitting)
      faults.push(
        `${key}: not an address that begins with ${schemes.map((one) => `${one}://`).join(' or ')}.`,
      );
    return value.replace(/\/+$/, '');
  }

  const host = text('HOST');
  const port = wholeNumber('PORT', 0, 65_535);
  const env: Env = {
    nodeEnv: oneOf('NODE_ENV', NODE_ENVS),
    mode: oneOf('APP_MODE', MODES),
    host,
    port,
    publicUrl:
      url('PUBLIC_URL', ['http', 'https'], `http://${host.includes(':') ? `[${host}]` : host}:${port}`) ?? '',
    databaseUrl: url('DATABASE_URL', ['postgres', 'postgresql']) ?? '',
    databaseOwnerUrl: url('DATABASE_OWNER_URL', ['postgres', 'postgresql']),
    smtpUrl: url('SMTP_URL', ['smtp', 'smtps']),
    mailFrom: text('MAIL_FROM'),
    logLevel: oneOf('LOG_LEVEL', LOG_LEVELS),
    webDir: text('WEB_DIR'),
    workerThreads: wholeNumber('WORKER_THREADS', 1, 64),
    trustedProxies: wholeNumber('TRUSTED_PROXIES', 0, 10),
  };
  if (env.databaseUrl === '')
    faults.push('DATABASE_URL: give the address of the database, or use npm start.');
  faults.push(...modeFaults(env));
  if (faults.length > 0) throw new EnvError(faults);
  return env;
}

function modeFaults(env: Env): string[] {
  if (env.mode === 'live') {
    return env.smtpUrl === undefined
      ? ['SMTP_URL: APP_MODE=live needs a mail server; give smtp://… or smtps://….']
      : [];
  }
  const faults: string[] = [];
  if (env.nodeEnv === 'production')
    faults.push('APP_MODE: demo refuses NODE_ENV=production; set APP_MODE=live.');
  if (!isLoopback(env.host)) {
    faults.push(
      `HOST: demo mode listens on loopback only, not on "${env.host}"; use 127.0.0.1, or set APP_MODE=live.`,
    );
  }
  return faults;
}

function isLoopback(host: string): boolean {
  return host === 'localhost' || host === '::1' || /^127(\.\d{1,3}){3}$/.test(host);
}
