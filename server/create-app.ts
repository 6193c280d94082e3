import express, { type Express } from 'express';
import type { Logger } from 'pino';
import type { Database } from './db/client';
import { answerUnknownPath, handleErrors } from './http/error-handler';
import { logRequests } from './http/request-log';
import type { RouteDefinition } from './http/route-definition';
import { securityHeaders } from './http/security-headers';
import { serveRoute } from './http/serve-route';
import type { Sessions } from './http/sessions';
import { serveWebFiles } from './http/web-files';
import type { EnginePort } from './jobs/engine-workers';
import type { JobPort } from './jobs/job-port';
import { accountRoutes } from './modules/accounts/accounts.routes';
import { demoRoutes, type Demo } from './modules/demo/demo.routes';
import { evaluationRoutes } from './modules/evaluations/evaluations.routes';
import { healthRoutes } from './modules/health/health.routes';
import { keptThingRoutes } from './modules/kept-things/kept-things.routes';
import { openApiRoutes } from './modules/openapi/openapi.routes';
import { passwordResetRoutes } from './modules/password-resets/password-resets.routes';
import { sessionRoutes } from './modules/session/session.routes';
import { studyRoutes } from './modules/studies/studies.routes';

export interface AppDeps {
  db: Database;
  sessions: Sessions;
  jobs: JobPort;
  engine: EnginePort;
  /** Null in live mode. */
  demo: Demo | null;
  logger: Logger;
  version: string;
  isSecure: boolean;
  allowedOrigins: readonly string[];
  webDir: string;
  isCheckingAnswers: boolean;
  trustedProxies?: number;
}

/** Every route there is. Express, the OpenAPI document and the access suite all read this one table. */
export function routeTable(deps: AppDeps): RouteDefinition[] {
  const routes = [
    ...healthRoutes(deps),
    ...sessionRoutes(deps),
    ...passwordResetRoutes(deps),
    ...demoRoutes(deps),
    ...evaluationRoutes(deps),
    ...keptThingRoutes(deps),
    ...studyRoutes(deps),
    ...accountRoutes(deps),
  ];
  return [...routes, ...openApiRoutes({ routes, version: deps.version })];
}

/** The Express application over its parts; main.ts and the tests both use it. */
export function createApp(deps: AppDeps): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('etag', false);
  app.set('trust proxy', deps.trustedProxies ?? 0);
  app.use(logRequests(deps.logger));
  app.use(securityHeaders({ isSecure: deps.isSecure }));
  for (const route of routeTable(deps)) serveRoute(app, route, deps);
  app.use('/api', answerUnknownPath);
  app.use(serveWebFiles({ folder: deps.webDir }));
  app.use(answerUnknownPath);
  app.use(handleErrors(deps.logger));
  return app;
}
