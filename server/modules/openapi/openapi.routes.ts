import { closedObject } from '../../../shared/contract/fields';
import { publicRoute, type RouteDefinition } from '../../http/route-definition';
import { writeDocument } from './write-document';

const OPENAPI_PATH = '/api/openapi.json';

/** The document describes all routes, itself included, so it takes them when they are all there. */
export function openApiRoutes({
  routes,
  version,
}: {
  routes: readonly RouteDefinition[];
  version: string;
}): RouteDefinition[] {
  const own = publicRoute({
    method: 'get',
    path: OPENAPI_PATH,
    summary: 'This document',
    // Any object: its shape is OpenAPI's own.
    responses: { 200: closedObject({}).noUnknown(false) },
    handle: async () => ({ status: 200, body: document }),
  });
  const document = writeDocument({ routes: [...routes, own], version });
  return [own];
}
