import type { Transaction } from '../db/client';

/** What each queue carries. No secret ever goes in: a dump of the database holds the queues too. */
export interface JobData {
  'send-password-reset': { user_id: string; reset_id: string };
}

/** Work for later. Enqueueing is part of the transaction: no commit, no job. */
export interface JobPort {
  enqueue: <Name extends keyof JobData>(tx: Transaction, name: Name, data: JobData[Name]) => Promise<void>;
}

export type JobHandlers = { [Name in keyof JobData]: (data: JobData[Name]) => Promise<void> };
