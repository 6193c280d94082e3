import { openDatabase } from '../../../server/db/client';
import { insertThing } from '../../../server/db/kept-thing-store';
import { newId } from '../../../server/db/new-id';
import {
  foodRevisions,
  foods,
  laminateRevisions,
  laminates,
  materialRevisions,
  materials,
  packRevisions,
  packs,
  routeRevisions,
  routes,
} from '../../../server/db/schema';
import { insertAccount, insertMembership, insertPerson } from '../../../server/db/seed/people-builders';
import { aFilm, aFood, aLaminate, aPack, aRoute } from '../../../server/db/seed/spec-builders';
import { hashPassword } from '../../../server/modules/session/hash-password';
import type { RunningProduct } from '../../harness/running-product';

export interface OwnPerson {
  email: string;
  password: string;
}

export interface OwnAccount {
  id: string;
  /** '/a/<slug>' */
  basePath: string;
  engineers: OwnPerson[];
}

const PASSWORD = 'a journey of one thousand steps';

/** A new account, empty but for its engineers, so that no journey stands on another's ground. */
export async function insertOwnAccount(
  { database }: RunningProduct,
  { engineers }: { engineers: number },
): Promise<OwnAccount> {
  const { db, close } = openDatabase(database.url);
  try {
    const slug = `journey-${newId()}`;
    const id = await insertAccount(db, { slug, name: 'Journey kitchen' });
    const passwordHash = await hashPassword(PASSWORD);
    const people: OwnPerson[] = [];
    for (let number = 1; number <= engineers; number += 1) {
      const email = `engineer-${number}-${newId()}@journey.example`;
      const userId = await insertPerson(db, { passwordHash, email, name: `Engineer ${number}` });
      await insertMembership(db, { accountId: id, userId, roles: ['engineer'] });
      people.push({ email, password: PASSWORD });
    }
    return { id, basePath: `/a/${slug}`, engineers: people };
  } finally {
    await close();
  }
}

export interface Stock {
  /** Of 'A wall', two layers of 'A film'. */
  laminateId: string;
}

/** One of everything that a study asks for, under the default names of the spec builders. */
export async function insertStock({ database }: RunningProduct, accountId: string): Promise<Stock> {
  const { db, close } = openDatabase(database.url);
  try {
    return await db.transaction(async (tx) => {
      const whose = { accountId, createdBy: null };
      const film = { ...whose, spec: aFilm() };
      const material = await insertThing(tx, { things: materials, revisions: materialRevisions }, film);
      const layer = { id: material.id, revisionId: material.revision.id };
      const wall = { ...whose, spec: aLaminate([layer, layer]) };
      const laminate = await insertThing(tx, { things: laminates, revisions: laminateRevisions }, wall);
      await insertThing(tx, { things: packs, revisions: packRevisions }, { ...whose, spec: aPack() });
      await insertThing(tx, { things: foods, revisions: foodRevisions }, { ...whose, spec: aFood() });
      await insertThing(tx, { things: routes, revisions: routeRevisions }, { ...whose, spec: aRoute() });
      return { laminateId: laminate.id };
    });
  } finally {
    await close();
  }
}
