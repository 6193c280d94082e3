import { evaluationAnswerSchema } from '../../../shared/contract/evaluation-answer';
import {
  EVALUATIONS_PATH,
  evaluationRequestSchema,
  type EvaluationRequest,
} from '../../../shared/contract/evaluations';
import { schemaOf, signedInRoute, type RouteDefinition } from '../../http/route-definition';
import type { EnginePort } from '../../jobs/engine-workers';
import { evaluateDescription } from './evaluate-description';
import { limitEvaluations } from './limit-evaluations';

export function evaluationRoutes({ engine }: { engine: EnginePort }): RouteDefinition[] {
  const countEvaluation = limitEvaluations();
  return [
    signedInRoute({
      method: 'post',
      path: EVALUATIONS_PATH,
      summary: 'Answer a whole description; nothing is stored',
      roles: ['engineer'],
      requestSchema: schemaOf<EvaluationRequest>(evaluationRequestSchema),
      responses: { 200: evaluationAnswerSchema },
      async handle({ user, body }) {
        countEvaluation(user.userId);
        return { status: 200, body: await evaluateDescription(engine, body) };
      },
    }),
  ];
}
