import express, { type Request, type RequestHandler, type Response, type Router } from 'express';
import type { Logger } from 'pino';
import { canonicalJson } from '../db/canonical-json';
import type { Queryable } from '../db/client';
import { AppError, notFound } from './app-error';
import { findActor, findRolesAnywhere } from './find-memberships';
import { checkOrigin } from './origin';
import type { Actor, Answer, FullContext, Once, RouteDefinition, SignedInUser } from './route-definition';
import { sendJson } from './send-json';
import type { Sessions } from './sessions';
import { sha256Hex } from './sha256';
import { validateBody, validateQuery } from './validate-input';

export interface ServeOptions {
  db: Queryable;
  sessions: Sessions;
  allowedOrigins: readonly string[];
  logger: Logger;
  /** Tests check every answer against its schema; in use it would only cost. */
  isCheckingAnswers: boolean;
}

const MOST_BODY_BYTES = 1_000_000;
/** What somebody without a session may send: an address, a password, a token. */
const MOST_PUBLIC_BODY_BYTES = 10_000;
/** Nobody waits longer; a database that is silent this long is said to be. */
const DEADLINE_MS = 15_000;
const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;
const LONGEST_KEY = 200;

const parseJson = express.json({ limit: MOST_BODY_BYTES, strict: false });
const parsePublicJson = express.json({ limit: MOST_PUBLIC_BODY_BYTES, strict: false });

/** Registers one route: origin, session, access, then body and preconditions, then the handler. */
export function serveRoute(router: Router, route: RouteDefinition, options: ServeOptions): void {
  const handler: RequestHandler = async (request, response) => {
    await withinDeadline(answerRequest(route, options, { request, response }));
  };
  router[route.method](route.path, handler);
}

interface Exchange {
  request: Request;
  response: Response;
}

async function answerRequest(route: RouteDefinition, options: ServeOptions, exchange: Exchange) {
  const { request } = exchange;
  const isWrite = route.method !== 'get';
  if (isWrite) checkOrigin(request, options.allowedOrigins);
  const user = route.access.kind === 'public' ? null : await requireUser(options.sessions, exchange);
  const params = pathParams(request);
  const actor = await authorise(route, options.db, { params, user });
  if (isWrite) await readBody(exchange, user === null ? parsePublicJson : parseJson);
  const context: FullContext = {
    body: route.requestSchema ? validateBody(route.requestSchema, request.body) : undefined,
    query: route.querySchema ? validateQuery(route.querySchema, request.query) : {},
    params,
    networkAddress: request.ip ?? '',
    user,
    actor,
    ifMatch: route.wants === 'if-match' ? readIfMatch(request) : '',
    once: route.wants === 'idempotency-key' ? readOnce(request, user) : null,
  };
  const answer = await route.handle(context);
  if (options.isCheckingAnswers) checkAnswer(route, answer);
  await sendAnswer(exchange, answer);
}

async function requireUser(sessions: Sessions, { request, response }: Exchange): Promise<SignedInUser> {
  const found = request.headers.cookie ? await sessions.find(request.headers.cookie) : null;
  if (found === null) throw new AppError('session_missing', 'Sign in first.');
  if (found.setCookie) response.append('Set-Cookie', found.setCookie);
  response.locals.userId = found.userId;
  return { userId: found.userId, sessionId: found.sessionId };
}

async function authorise(
  { access }: RouteDefinition,
  db: Queryable,
  { params, user }: { params: Record<string, string>; user: SignedInUser | null },
): Promise<Actor | null> {
  if (!Object.values(params).every((param) => UUID.test(param))) throw notFound();
  if (access.kind === 'public' || access.kind === 'signed in' || user === null) return null;
  if (access.kind === 'role in any account') {
    const roles = await findRolesAnywhere(db, user.userId);
    if (!roles.some((role) => access.roles.includes(role))) throw notFound();
    return null;
  }
  const actor = await findActor(db, user.userId, params.account_id ?? '');
  if (!actor?.roles.some((role) => access.roles.includes(role))) throw notFound();
  return actor;
}

function pathParams(request: Request): Record<string, string> {
  return Object.fromEntries(Object.entries(request.params).map(([name, value]) => [name, String(value)]));
}

function readBody({ request, response }: Exchange, parse: RequestHandler): Promise<void> {
  return new Promise((resolve, reject) => {
    void parse(request, response, (error?: unknown) => {
      if (error === undefined || error === null) resolve();
      else reject(error instanceof Error ? error : new Error(String(error)));
    });
  });
}

function readIfMatch(request: Request): string {
  const header = request.get('If-Match');
  if (!header) {
    throw new AppError(
      'precondition_missing',
      'Send If-Match with the revision that was edited, so that no edit is lost.',
    );
  }
  return header.replace(/^"|"$/g, '');
}

function readOnce(request: Request, user: SignedInUser | null): Once {
  const key = request.get('Idempotency-Key') ?? '';
  if (key === '') {
    throw new AppError(
      'precondition_missing',
      'Send an Idempotency-Key, so that sending twice makes one thing.',
    );
  }
  if (key.length > LONGEST_KEY || !/^[\x21-\x7e]+$/.test(key)) {
    throw new AppError(
      'input_invalid',
      `Idempotency-Key: 1 to ${LONGEST_KEY} characters, letters, digits and signs.`,
      {
        fields: [{ path: 'Idempotency-Key', message: `Use 1 to ${LONGEST_KEY} letters, digits and signs.` }],
      },
    );
  }
  const fingerprint = `${request.method} ${request.path} ${canonicalJson(request.body ?? null)}`;
  return { userId: user?.userId ?? '', key, requestSha256: sha256Hex(fingerprint) };
}

async function sendAnswer({ request, response }: Exchange, answer: Answer) {
  if (answer.setCookie) response.append('Set-Cookie', answer.setCookie);
  if (answer.etag) response.set('ETag', `"${answer.etag}"`);
  response.status(answer.status);
  if (answer.body === undefined && answer.json === undefined) response.end();
  else await sendJson(request, response, answer.json ?? JSON.stringify(answer.body));
}

/** Thrown as an internal error: the fault is ours, not the caller's. */
function checkAnswer(route: RouteDefinition, answer: Answer) {
  const schema = route.responses[answer.status];
  if (schema === undefined)
    throw new Error(`${route.path} answers ${answer.status}, which its definition does not list.`);
  if (schema === null) return;
  schema.validateSync(JSON.parse(answer.json ?? JSON.stringify(answer.body)), {
    strict: true,
    abortEarly: false,
  });
}

async function withinDeadline(work: Promise<void>): Promise<void> {
  let timer: NodeJS.Timeout | undefined;
  const deadline = new Promise<never>((_resolve, reject) => {
    timer = setTimeout(() => {
      reject(
        new AppError(
          'database_silent',
          'No answer within 15 s: the database is silent or the work is long. It may still be finished; look at the present state before you send it again.',
        ),
      );
    }, DEADLINE_MS);
  });
  try {
    await Promise.race([work, deadline]);
  } finally {
    clearTimeout(timer);
  }
}
