import { randomUUID } from 'node:crypto';
import { setTimeout as sleep } from 'node:timers/promises';
import { collectionPath, type KeptThing, type Page } from '../../shared/contract/kept-things';
import type { LaminateSpec } from '../../shared/contract/laminates';
import { SESSION_PATH, type SessionResponse } from '../../shared/contract/session';

export type Laminate = KeptThing<LaminateSpec>;

export interface Save {
  spec: LaminateSpec;
  idempotencyKey: string;
  /** Set once the server has said that it is saved. */
  confirmed?: Laminate;
}

export interface SavingClient {
  /** Laminates of the demo account. */
  list: () => Promise<Laminate[]>;
  /** A wall of three layers under the given name, not yet sent. */
  prepareSave: (name: string) => Save;
  /** Sends once; an unanswered save stays unconfirmed. */
  trySave: (save: Save) => Promise<void>;
  /** Sends the same save again, with the same key, until it is answered. */
  saveWithRetries: (save: Save) => Promise<void>;
}

const RETRY_PAUSE_MS = 150;
const RETRY_PATIENCE_MS = 60_000;
const REQUEST_PATIENCE_MS = 8_000;
const PAGE_LIMIT = 200;

export async function signInToSave(
  address: string,
  person: { email: string; password: string },
): Promise<SavingClient> {
  const signIn = await fetch(address + SESSION_PATH, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: address },
    body: JSON.stringify({ email: person.email, password: person.password }),
  });
  if (!signIn.ok) throw new Error(`Sign-in answered ${signIn.status}: ${await signIn.text()}`);
  const cookie = signIn.headers
    .getSetCookie()
    .map((one) => one.split(';')[0])
    .join('; ');
  const headers = { 'content-type': 'application/json', origin: address, cookie };

  async function ask<Body>(path: string): Promise<Body> {
    const response = await fetch(address + path, { headers });
    if (!response.ok) throw new Error(`${path} answered ${response.status}: ${await response.text()}`);
    return (await response.json()) as Body;
  }

  const session = await ask<SessionResponse>(SESSION_PATH);
  const accountId = session.memberships[0]?.account.id;
  if (accountId === undefined) throw new Error('The demo engineer belongs to no account.');
  const laminates = collectionPath(accountId, 'laminates');
  const materials = await ask<Page<KeptThing<object>>>(`${collectionPath(accountId, 'materials')}?limit=3`);

  async function trySave(save: Save): Promise<void> {
    const response = await fetch(address + laminates, {
      method: 'POST',
      headers: { ...headers, 'idempotency-key': save.idempotencyKey },
      body: JSON.stringify({ spec: save.spec }),
      signal: AbortSignal.timeout(REQUEST_PATIENCE_MS),
    }).catch(() => undefined);
    if (response?.status === 201)
      save.confirmed = (await response.json().catch(() => undefined)) as Laminate | undefined;
    // A refusal is a fault of this test, not of the power cut.
    if (response && response.status >= 400 && response.status < 500 && response.status !== 409) {
      throw new Error(`A save was refused with ${response.status}: ${await response.text()}`);
    }
  }

  return {
    list: () => listAll(laminates, ask),
    prepareSave: (name) => ({
      idempotencyKey: randomUUID(),
      spec: {
        name,
        layers: materials.items.map((material, at) => ({
          material_id: material.id,
          material_revision_id: material.revision.id,
          thickness_um: 10 + at,
        })),
      },
    }),
    trySave,
    saveWithRetries: async (save) => {
      const deadline = Date.now() + RETRY_PATIENCE_MS;
      while (save.confirmed === undefined && Date.now() < deadline) {
        await trySave(save);
        if (save.confirmed === undefined) await sleep(RETRY_PAUSE_MS);
      }
    },
  };
}

async function listAll(path: string, ask: <Body>(path: string) => Promise<Body>): Promise<Laminate[]> {
  const found: Laminate[] = [];
  let after: string | null = null;
  do {
    const page: Page<Laminate> = await ask(
      `${path}?limit=${PAGE_LIMIT}${after === null ? '' : `&after=${after}`}`,
    );
    found.push(...page.items);
    after = page.next_after;
  } while (after !== null);
  return found;
}
