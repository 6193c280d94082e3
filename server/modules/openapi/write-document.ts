import { auditPageSchema, teamResponseSchema } from '../../../shared/contract/accounts';
import { evaluationAnswerSchema, wallAnswerSchema } from '../../../shared/contract/evaluation-answer';
import { evaluationRequestSchema } from '../../../shared/contract/evaluations';
import { healthResponseSchema } from '../../../shared/contract/health';
import { materialSpecSchema } from '../../../shared/contract/materials';
import { sessionResponseSchema } from '../../../shared/contract/session';
import { layerSchema } from '../../../shared/contract/storage-description';
import {
  candidateSchema,
  studyResultSchema,
  studySchema,
  studyWithResultSchema,
} from '../../../shared/contract/study-answers';
import { STATUS_BY_CODE, type ErrorCode } from '../../../shared/errors/error-code';
import type { Access, RouteDefinition } from '../../http/route-definition';
import { JsonSchemaWriter, type JsonSchema } from './yup-to-json-schema';

const COMPONENTS = {
  Health: healthResponseSchema,
  Session: sessionResponseSchema,
  Layer: layerSchema,
  EvaluationRequest: evaluationRequestSchema,
  WallAnswer: wallAnswerSchema,
  EvaluationAnswer: evaluationAnswerSchema,
  MaterialSpec: materialSpecSchema,
  Candidate: candidateSchema,
  StudyResult: studyResultSchema,
  Study: studySchema,
  StudyWithResult: studyWithResultSchema,
  Team: teamResponseSchema,
  AuditPage: auditPageSchema,
};

const ERROR_SCHEMA: JsonSchema = {
  type: 'object',
  required: ['error'],
  additionalProperties: false,
  properties: {
    error: {
      type: 'object',
      required: ['code', 'message', 'request_id'],
      additionalProperties: false,
      properties: {
        code: { type: 'string', enum: Object.keys(STATUS_BY_CODE) },
        message: { type: 'string' },
        request_id: { type: 'string', format: 'uuid' },
        fields: {
          type: 'array',
          items: {
            type: 'object',
            required: ['path', 'message'],
            additionalProperties: false,
            properties: { path: { type: 'string' }, value: {}, message: { type: 'string' } },
          },
        },
        current: { description: 'edited_meanwhile only: the state that won the race.' },
        retry_after_s: { type: 'number' },
      },
    },
  },
};

/** The OpenAPI 3.1 document of the routes: what is not in it is not served, and the other way round. */
export function writeDocument({
  routes,
  version,
}: {
  routes: readonly RouteDefinition[];
  version: string;
}): JsonSchema {
  const writer = new JsonSchemaWriter(COMPONENTS);
  const paths: Record<string, Record<string, JsonSchema>> = {};
  for (const route of routes) {
    const path = route.path.replace(/:([a-z_]+)/g, '{$1}');
    paths[path] = { ...paths[path], [route.method]: operationOf(route, writer) };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Larderline',
      version,
      description:
        'How many days a food keeps in a given wall, and why. Every field name carries its unit; relative humidity is a fraction.',
    },
    paths,
    components: {
      schemas: { ...writer.components, Error: ERROR_SCHEMA },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'larderline_session' } },
    },
  };
}

function operationOf(route: RouteDefinition, writer: JsonSchemaWriter): JsonSchema {
  return {
    operationId: operationId(route),
    summary: route.summary,
    description: accessInWords(route.access),
    ...(route.access.kind !== 'public' && { security: [{ session: [] }] }),
    parameters: [...pathParameters(route), ...queryParameters(route, writer), ...headerParameters(route)],
    ...(route.requestSchema && {
      requestBody: { required: true, content: jsonContent(writer.write(route.requestSchema)) },
    }),
    responses: { ...successes(route, writer), ...failures(route) },
  };
}

function operationId({ method, path }: RouteDefinition): string {
  const words = path
    .replace(/^\/api\//, '')
    .replace(/:/g, 'by_')
    .split(/[/_.-]+/);
  return method + words.map((word) => word.charAt(0).toUpperCase() + word.slice(1)).join('');
}

function accessInWords(access: Access): string {
  if (access.kind === 'public') return 'Open to anybody.';
  return access.kind === 'signed in'
    ? 'For whoever is signed in.'
    : `For the roles ${access.roles.join(' and ')}.`;
}

function pathParameters({ path }: RouteDefinition): JsonSchema[] {
  return [...path.matchAll(/:([a-z_]+)/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string', format: 'uuid' },
  }));
}

function queryParameters({ querySchema }: RouteDefinition, writer: JsonSchemaWriter): JsonSchema[] {
  if (!querySchema) return [];
  const { properties } = writer.write(querySchema);
  return Object.entries(properties ?? {}).map(([name, schema]) => ({
    name,
    in: 'query',
    required: false,
    schema,
  }));
}

function headerParameters({ wants }: RouteDefinition): JsonSchema[] {
  if (wants === undefined) return [];
  const name = wants === 'if-match' ? 'If-Match' : 'Idempotency-Key';
  return [{ name, in: 'header', required: true, schema: { type: 'string' } }];
}

function successes({ responses }: RouteDefinition, writer: JsonSchemaWriter): JsonSchema {
  return Object.fromEntries(
    Object.entries(responses).map(([status, schema]) => [
      status,
      {
        description: SUCCESS_WORDS[status] ?? 'Done.',
        ...(schema && { content: jsonContent(writer.write(schema)) }),
      },
    ]),
  );
}

const SUCCESS_WORDS: Readonly<Record<string, string>> = {
  200: 'The answer.',
  201: 'Made.',
  202: 'Taken on; it happens later.',
  204: 'Done; there is nothing to say.',
  503: 'The database is silent.',
};

function failures(route: RouteDefinition): JsonSchema {
  const codes: ErrorCode[] = ['not_found', 'internal', 'database_silent'];
  if (route.requestSchema) codes.push('input_invalid', 'file_too_large');
  if (route.querySchema) codes.push('input_invalid');
  if (route.method !== 'get') codes.push('origin_refused');
  if (route.access.kind !== 'public') codes.push('session_missing');
  if (route.wants) codes.push('precondition_missing');
  if (route.wants === 'if-match') codes.push('edited_meanwhile');
  if (route.wants === 'idempotency-key') codes.push('idempotency_key_reused');
  const statuses = [...new Set(codes.map((code) => STATUS_BY_CODE[code]))];
  const error = { content: jsonContent({ $ref: '#/components/schemas/Error' }) };
  return Object.fromEntries(
    statuses
      .filter((status) => route.responses[status] === undefined)
      .map((status) => [status, { description: ERROR_WORDS.get(status) ?? 'An error.', ...error }]),
  );
}

const ERROR_WORDS = new Map<number, string>([
  [400, 'Fields need another value; each is named.'],
  [401, 'Nobody is signed in.'],
  [403, 'The Origin header is missing or another one.'],
  [404, 'Not there, or not yours.'],
  [409, 'The Idempotency-Key was used for something else.'],
  [412, 'Somebody saved a newer revision meanwhile.'],
  [413, 'Larger than 1 MB.'],
  [428, 'The header that keeps edits safe is missing.'],
  [500, 'A fault on our side.'],
  [503, 'The database does not answer.'],
]);

function jsonContent(schema: JsonSchema): JsonSchema {
  return { 'application/json': { schema } };
}
