import type { AnyObjectSchema, Lazy, Schema } from 'yup';
import type { ArchivedFilter, StudySort } from '../../shared/contract/fields';
import type { Role } from '../../shared/contract/session';
import { notFound } from './app-error';

/** Who may call a route. Everything else is answered 401 (no session) or the one 404. */
export type Access =
  | { kind: 'public' }
  | { kind: 'signed in' }
  /** A member with one of the roles, in whichever account. */
  | { kind: 'role in any account'; roles: readonly Role[] }
  /** A member with one of the roles in the account that the path names. */
  | { kind: 'role in account'; roles: readonly Role[] };

export interface SignedInUser {
  userId: string;
  /** What the cookie holds. */
  sessionId: string;
}

/** Somebody acting in one account. */
export interface Actor {
  userId: string;
  accountId: string;
  roles: readonly Role[];
  companyId: string | null;
}

/** Names one create, so that doing it twice makes one thing. */
export interface Once {
  userId: string;
  key: string;
  requestSha256: string;
}

export interface Answer {
  status: number;
  body?: unknown;
  /** The body already written, where it must be the same bytes as before. */
  json?: string;
  etag?: string;
  setCookie?: string;
}

export interface PublicContext<Body> {
  body: Body;
  params: Readonly<Record<string, string>>;
  query: PageQuery;
  networkAddress: string;
}
export interface PageQuery {
  after?: string;
  limit?: number;
  /** On lists of kept things. */
  search?: string;
  archived?: ArchivedFilter;
  /** On the list of studies. */
  tag?: string;
  sort?: StudySort;
}
export interface SignedInContext<Body> extends PublicContext<Body> {
  user: SignedInUser;
}
export interface AccountContext<Body> extends PublicContext<Body> {
  actor: Actor;
  /** Of If-Match, without quotes; '' on routes that want none. */
  ifMatch: string;
  /** On routes that want an Idempotency-Key. */
  once: Once;
}

/** Everything the adapter may have found out; the route builders below narrow it. */
export interface FullContext extends PublicContext<unknown> {
  user: SignedInUser | null;
  actor: Actor | null;
  ifMatch: string;
  once: Once | null;
}

export type ResponseSchema = AnyObjectSchema | Lazy<unknown>;

/** A lazy schema (layers, forms, materials) hides its type from yup's inference; the contract's own types say it. */
export function schemaOf<Body>(schema: AnyObjectSchema): Schema<Body> {
  return schema;
}

interface RouteDescription<Body> {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** As Express writes it: /api/accounts/:account_id/studies. Every parameter is an id. */
  path: string;
  summary: string;
  requestSchema?: Schema<Body>;
  querySchema?: AnyObjectSchema;
  wants?: 'if-match' | 'idempotency-key';
  /** By status; null: no body. */
  responses: Readonly<Record<number, ResponseSchema | null>>;
}

export interface RouteDefinition extends RouteDescription<unknown> {
  access: Access;
  handle: (context: FullContext) => Promise<Answer>;
}

export function publicRoute<Body = undefined>(
  route: RouteDescription<Body> & { handle: (context: PublicContext<Body>) => Promise<Answer> },
): RouteDefinition {
  return {
    ...route,
    access: { kind: 'public' },
    handle: (context) => route.handle({ ...context, body: context.body as Body }),
  };
}

export function signedInRoute<Body = undefined>(
  route: RouteDescription<Body> & {
    /** Absent: anybody signed in. */
    roles?: readonly Role[];
    handle: (context: SignedInContext<Body>) => Promise<Answer>;
  },
): RouteDefinition {
  return {
    ...route,
    access: route.roles ? { kind: 'role in any account', roles: route.roles } : { kind: 'signed in' },
    handle: (context) => {
      if (context.user === null) throw notFound();
      return route.handle({ ...context, user: context.user, body: context.body as Body });
    },
  };
}

const NEVER_TWICE: Once = { userId: '', key: '', requestSha256: '' };

export function accountRoute<Body = undefined>(
  route: RouteDescription<Body> & {
    roles: readonly Role[];
    handle: (context: AccountContext<Body>) => Promise<Answer>;
  },
): RouteDefinition {
  return {
    ...route,
    access: { kind: 'role in account', roles: route.roles },
    handle: (context) => {
      if (context.actor === null) throw notFound();
      return route.handle({
        ...context,
        actor: context.actor,
        once: context.once ?? NEVER_TWICE,
        body: context.body as Body,
      });
    },
  };
}
