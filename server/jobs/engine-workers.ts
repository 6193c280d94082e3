import { createRequire } from 'node:module';
import { fileURLToPath } from 'node:url';
import { Worker } from 'node:worker_threads';
import { InputError, type EvaluationAnswer, type EvaluationDescription } from '../../shared/engine';
import { AppError } from '../http/app-error';
import type { EngineReply, EngineTask } from './engine-messages';

/** The engine, in a thread beside the one that answers requests. */
export interface EnginePort {
  evaluate: (description: EvaluationDescription) => Promise<EvaluationAnswer>;
}

export interface EngineWorkers extends EnginePort {
  /** Starts the threads now, so that the first computation need not wait for them. */
  warm: () => void;
  stop: () => Promise<void>;
}

function tookTooLong() {
  return new AppError(
    'computation_too_long',
    'This computation takes longer than 8 s. Use fewer layers with humidity curves, fewer points on a curve, fewer legs or a shorter horizon.',
  );
}

function tooManyWait() {
  return new AppError('too_many_requests', 'Too many computations are waiting. Try again in a moment.', {
    retryAfterS: 10,
  });
}

interface Task {
  description: EvaluationDescription;
  resolve: (answer: EvaluationAnswer) => void;
  reject: (error: Error) => void;
}

interface Lane {
  worker: Worker;
  task: Task | null;
  timer: NodeJS.Timeout | null;
}

const WORKER_FILE = fileURLToPath(new URL('./engine-worker.ts', import.meta.url));
const TSX = createRequire(import.meta.url).resolve('tsx/cjs');
/** A thread does not inherit what makes the main one read TypeScript: it is set up first. */
const WORKER_START = `require(${JSON.stringify(TSX)}); require(${JSON.stringify(WORKER_FILE)});`;
/** Below the deadline of a request, so that its ending can still be told. */
const TASK_TIMEOUT_MS = 8_000;
const MOST_WAITING = 200;

/** A pool of threads that run TypeScript through tsx. A thread that hangs or dies is replaced. */
export function engineWorkers({ threads }: { threads: number }): EngineWorkers {
  const waiting: Task[] = [];
  const lanes = new Set<Lane>();
  let isStopped = false;

  function openLane(): Lane {
    const worker = new Worker(WORKER_START, { eval: true, execArgv: [] });
    const lane: Lane = { worker, task: null, timer: null };
    worker.on('message', (reply: EngineReply) => finish(lane, reply));
    worker.on('error', (error) => closeLane(lane, error));
    worker.on('exit', () => closeLane(lane, new Error('The engine thread ended.')));
    worker.unref();
    lanes.add(lane);
    return lane;
  }

  function closeLane(lane: Lane, error: Error) {
    if (!lanes.delete(lane)) return;
    if (lane.timer) clearTimeout(lane.timer);
    lane.task?.reject(error);
    void lane.worker.terminate();
    dispatch();
  }

  function finish(lane: Lane, reply: EngineReply) {
    const { task, timer } = lane;
    if (task === null) return;
    if (timer) clearTimeout(timer);
    lane.task = null;
    lane.worker.unref();
    if (reply.ending === 'answered') task.resolve(reply.answer);
    else if (reply.ending === 'refused') task.reject(new InputError(reply.path, reply.value, reply.message));
    else task.reject(new Error(reply.message));
    dispatch();
  }

  function dispatch() {
    while (waiting.length > 0 && !isStopped) {
      const free =
        [...lanes].find((lane) => lane.task === null) ?? (lanes.size < threads ? openLane() : undefined);
      const task = free && waiting.shift();
      if (!free || !task) return;
      free.task = task;
      free.timer = setTimeout(() => closeLane(free, tookTooLong()), TASK_TIMEOUT_MS);
      free.worker.ref();
      free.worker.postMessage({ description: task.description } satisfies EngineTask);
    }
  }

  return {
    evaluate: (description) =>
      new Promise((resolve, reject) => {
        if (isStopped) {
          reject(new Error('The engine is stopped.'));
          return;
        }
        if (waiting.length >= MOST_WAITING) {
          reject(tooManyWait());
          return;
        }
        waiting.push({ description, resolve, reject });
        dispatch();
      }),
    warm() {
      while (lanes.size < threads) openLane();
    },
    async stop() {
      isStopped = true;
      for (const task of waiting.splice(0)) task.reject(new Error('The engine is stopped.'));
      await Promise.all([...lanes].map((lane) => lane.worker.terminate()));
    },
  };
}
