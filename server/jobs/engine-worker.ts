import { parentPort } from 'node:worker_threads';
import { evaluate, InputError } from '../../shared/engine';
import type { EngineReply, EngineTask } from './engine-messages';

/** Runs in a worker thread: descriptions in, answers out, one at a time. */
parentPort?.on('message', ({ description }: EngineTask) => {
  parentPort?.postMessage(reply(description));
});

function reply(description: EngineTask['description']): EngineReply {
  try {
    return { ending: 'answered', answer: evaluate(description) };
  } catch (error) {
    if (error instanceof InputError) {
      return { ending: 'refused', path: error.path, value: error.value, message: error.message };
    }
    return {
      ending: 'failed',
      message: error instanceof Error ? (error.stack ?? error.message) : String(error),
    };
  }
}
