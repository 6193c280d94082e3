import type { EvaluationAnswer, EvaluationDescription } from '../../shared/engine';

/** One at a time per thread, so a reply needs no number. */
export interface EngineTask {
  description: EvaluationDescription;
}

export type EngineReply =
  | { ending: 'answered'; answer: EvaluationAnswer }
  | { ending: 'refused'; path: string; value: unknown; message: string }
  | { ending: 'failed'; message: string };
