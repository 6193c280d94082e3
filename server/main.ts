import { readFileSync } from 'node:fs';
import { createServer } from 'node:http';
import path from 'node:path';
import { pino, type Logger } from 'pino';
import { createApp } from './create-app';
import { openDatabase } from './db/client';
import { purgeExpired } from './db/purge-expired';
import { refuseDemoData } from './db/refuse-demo-data';
import { demoPeople } from './db/seed/demo-people';
import { readEnv, type Env } from './env';
import { startMailSink, type MailSink } from './fakes/mail-sink';
import { logError } from './http/log-error';
import { originsOf } from './http/origin';
import { openSessions } from './http/sessions';
import { bossJobs, type BossJobs } from './jobs/boss-jobs';
import { engineWorkers } from './jobs/engine-workers';
import { startHousekeeping } from './jobs/housekeeping';
import type { JobHandlers } from './jobs/job-port';
import { smtpMail } from './mail/smtp-mail';
import { sendResetMail } from './modules/password-resets/send-reset-mail';

const DRAIN_MS = 5_000;
const JOBS_RETRY_MS = 1_000;

async function main() {
  const env = readEnv();
  const version = readVersion();
  const logger = pino({ level: env.logLevel, serializers: { err: logError } });
  const isSecure = env.publicUrl.startsWith('https:');
  const { db, sql, close: closeDatabase } = openDatabase(env.databaseUrl);
  if (env.mode === 'live') await refuseDemoData(db);
  const sessions = openSessions({ db, isSecure });
  const sink = env.mode === 'demo' && env.smtpUrl === undefined ? await startMailSink() : null;
  const mail = smtpMail({ smtpUrl: smtpUrlOf(env, sink), from: env.mailFrom });
  const jobs = bossJobs({ sql, logger });
  const engine = engineWorkers({ threads: env.workerThreads });
  const app = createApp({
    db,
    sessions,
    jobs,
    engine,
    demo: env.mode === 'demo' ? { people: demoPeople, listMail: () => sink?.list() ?? [] } : null,
    logger,
    version,
    isSecure,
    allowedOrigins: originsOf(env.publicUrl),
    webDir: path.resolve(env.webDir),
    isCheckingAnswers: false,
    trustedProxies: env.trustedProxies,
  });

  const server = createServer(app);
  server.listen(env.port, env.host, () => logger.info({ address: env.publicUrl, version }, 'listening'));
  server.once('error', (error) => {
    logger.fatal({ err: error }, 'cannot listen');
    process.exit(1);
  });
  engine.warm();
  const jobsStart = startJobs(jobs, logger, {
    'send-password-reset': (data) => sendResetMail({ db, mail, publicUrl: env.publicUrl }, data),
  });
  const stopHousekeeping = startHousekeeping({
    logger,
    chores: [() => purgeExpired(db), () => sessions.deleteExpired()],
  });

  async function shutDown(signal: string) {
    logger.info({ signal }, 'stopping');
    const forced = setTimeout(() => process.exit(0), 2 * DRAIN_MS);
    forced.unref();
    stopHousekeeping();
    jobsStart.giveUp();
    await drain(server);
    await jobs.stop().catch((error: unknown) => logger.warn({ err: error }, 'job queue'));
    mail.close();
    await Promise.allSettled([engine.stop(), sink?.close(), closeDatabase()]);
    process.exit(0);
  }
  let isStopping = false;
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.on(signal, () => {
      if (isStopping) return;
      isStopping = true;
      void shutDown(signal);
    });
  }
}

function smtpUrlOf(env: Env, sink: MailSink | null): string {
  const smtpUrl = sink?.smtpUrl ?? env.smtpUrl;
  if (smtpUrl === undefined) throw new Error('SMTP_URL: live mode needs a mail server.');
  return smtpUrl;
}

function readVersion(): string {
  const { version }: { version: string } = JSON.parse(
    readFileSync(new URL('../package.json', import.meta.url), 'utf8'),
  );
  return version;
}

/** The queue needs the database; while that is silent the server answers already and this is tried again. */
function startJobs(jobs: BossJobs, logger: Logger, handlers: JobHandlers) {
  let isGivenUp = false;
  const attempt = () => {
    if (isGivenUp) return;
    jobs.start(handlers).catch((error: unknown) => {
      logger.warn({ err: error }, 'the job queue does not start yet');
      setTimeout(attempt, JOBS_RETRY_MS).unref();
    });
  };
  attempt();
  return {
    giveUp: () => {
      isGivenUp = true;
    },
  };
}

/** Lets running requests end, at most for a while. */
function drain(server: ReturnType<typeof createServer>): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve());
    server.closeIdleConnections();
    setTimeout(() => {
      server.closeAllConnections();
      resolve();
    }, DRAIN_MS).unref();
  });
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  process.exit(1);
});
