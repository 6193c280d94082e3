import SwaggerParser from '@apidevtools/swagger-parser';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { startTestServer, type TestServer } from '../harness/test-server';

let server: TestServer;

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

it('is a valid OpenAPI document that holds every route', async () => {
  const { json } = await server.stranger().get('/api/openapi.json');
  const documented = Object.entries(json.paths as Record<string, object>).flatMap(([path, operations]) =>
    Object.keys(operations).map((method) => `${method} ${path}`),
  );
  const served = server.routes.map(({ method, path }) => `${method} ${path.replace(/:([a-z_]+)/g, '{$1}')}`);
  expect(documented.toSorted()).toEqual(served.toSorted());
  const ids = Object.values(json.paths as Record<string, Record<string, { operationId: string }>>).flatMap(
    (operations) => Object.values(operations).map((operation) => operation.operationId),
  );
  expect(new Set(ids).size).toBe(ids.length);
  await SwaggerParser.validate(structuredClone(json));
});

it('says bounds, choices and what may be absent', async () => {
  const { components } = (await server.stranger().get('/api/openapi.json')).json;
  const { Layer, EvaluationRequest, Error: envelope } = components.schemas;
  expect(Layer.oneOf).toHaveLength(3);
  const film = Layer.oneOf[0];
  expect(film.properties.thickness_um).toMatchObject({ type: 'number', exclusiveMinimum: 0, maximum: 2000 });
  expect(film.required).toEqual(['kind', 'name', 'thickness_um', 'oxygen', 'water']);
  expect(film.additionalProperties).toBe(false);
  expect(EvaluationRequest.required.toSorted()).toEqual(['food', 'horizon_days', 'limits', 'pack', 'route']);
  expect(EvaluationRequest.properties.food.required).toEqual(['mass_kg', 'oxygen_mode']);
  expect(envelope.properties.error.properties.code.enum).toContain('edited_meanwhile');
});
