import type { EvaluationAnswer, EvaluationDescription } from '../../shared/engine';

export interface EngineTask {
  taskId: number;
  description: EvaluationDescription;
}

export type EngineReply =
  | { taskId: number; ending: 'answered'; answer: EvaluationAnswer }
  | { taskId: number; ending: 'refused'; path: string; value: unknown; message: string }
  | { taskId: number; ending: 'failed'; message: string };
