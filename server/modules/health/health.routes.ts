import { sql } from 'drizzle-orm';
import { HEALTH_PATH, healthResponseSchema, type HealthResponse } from '../../../shared/contract/health';
import { ENGINE_VERSION } from '../../../shared/engine';
import type { Queryable } from '../../db/client';
import { publicRoute, type RouteDefinition } from '../../http/route-definition';

const PATIENCE_MS = 2_000;

export function healthRoutes({ db, version }: { db: Queryable; version: string }): RouteDefinition[] {
  return [
    publicRoute({
      method: 'get',
      path: HEALTH_PATH,
      summary: 'Whether the database answers and which version runs',
      responses: { 200: healthResponseSchema, 503: healthResponseSchema },
      async handle() {
        const isAnswering = await isDatabaseAnswering(db);
        const body: HealthResponse = {
          status: isAnswering ? 'ok' : 'degraded',
          database: isAnswering ? 'answers' : 'silent',
          version,
          engine_version: ENGINE_VERSION,
        };
        return { status: isAnswering ? 200 : 503, body };
      },
    }),
  ];
}

async function isDatabaseAnswering(db: Queryable): Promise<boolean> {
  let timer: NodeJS.Timeout | undefined;
  const silence = new Promise<false>((resolve) => {
    timer = setTimeout(() => resolve(false), PATIENCE_MS);
  });
  const answer = db.execute(sql`SELECT 1`).then(
    () => true,
    () => false,
  );
  try {
    return await Promise.race([answer, silence]);
  } finally {
    clearTimeout(timer);
  }
}
