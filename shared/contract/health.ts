import * as yup from 'yup';
import { closedObject } from './fields';

/** GET, public: whether the database answers and which version runs. 200 when it does, 503 when not. */
export const HEALTH_PATH = '/api/health';

export interface HealthResponse {
  status: 'ok' | 'degraded';
  database: 'answers' | 'silent';
  version: string;
  engine_version: string;
}

export const healthResponseSchema = closedObject({
  status: yup
    .string()
    .strict()
    .oneOf(['ok', 'degraded'] as const)
    .required(),
  database: yup
    .string()
    .strict()
    .oneOf(['answers', 'silent'] as const)
    .required(),
  version: yup.string().strict().required(),
  engine_version: yup.string().strict().required(),
});
