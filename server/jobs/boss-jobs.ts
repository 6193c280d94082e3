import { PostgresJsSession } from 'drizzle-orm/postgres-js/session';
import PgBoss from 'pg-boss';
import type { Logger } from 'pino';
import type { DatabaseConnection, Transaction } from '../db/client';
import { JOBS_SCHEMA, JOB_QUEUES, jobExecutor, type JobQueue } from '../db/job-queues';
import type { JobData, JobHandlers, JobPort } from './job-port';

const POLL_EVERY_S = 1;
/** 5, 10, 20 … s: about half a day before a job is given up. */
const RETRIES = { retryLimit: 13, retryDelay: 5, retryBackoff: true };

export interface BossJobs extends JobPort {
  start: (handlers: JobHandlers) => Promise<void>;
  stop: () => Promise<void>;
}

export function bossJobs({ sql, logger }: { sql: DatabaseConnection['sql']; logger: Logger }): BossJobs {
  let boss = makeBoss();

  /** A boss that failed to start never starts again: each try needs its own. */
  function makeBoss(): PgBoss {
    const made = new PgBoss({ db: jobExecutor(sql), schema: JOBS_SCHEMA, migrate: false, schedule: false });
    made.on('error', (error) => logger.warn({ err: error }, 'job queue'));
    return made;
  }

  async function work<Name extends JobQueue>(name: Name, handle: (data: JobData[Name]) => Promise<void>) {
    await boss.work<JobData[Name]>(
      name,
      { batchSize: 1, pollingIntervalSeconds: POLL_EVERY_S },
      async (jobs) => {
        for (const job of jobs) {
          try {
            await handle(job.data);
          } catch (error) {
            logger.warn({ err: error, job: name, job_id: job.id }, 'job failed, will be tried again');
            throw error;
          }
        }
      },
    );
  }

  return {
    async start(handlers) {
      boss = makeBoss();
      await boss.start();
      for (const name of JOB_QUEUES) await work(name, handlers[name]);
    },
    async enqueue(tx, name, data) {
      await boss.send(name, data, { ...RETRIES, db: jobExecutor(driverOf(tx)) });
    },
    stop: () => boss.stop({ graceful: true, timeout: 3000, close: false }),
  };
}

/** The driver's transaction below drizzle's, so that a job is written by the same transaction. */
function driverOf(tx: Transaction) {
  const { session } = tx._;
  if (!(session instanceof PostgresJsSession)) throw new TypeError('Not a transaction of postgres.js.');
  return session.client;
}
