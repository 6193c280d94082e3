import type { KeptThing } from '../../../shared/contract/kept-things';
import type { Queryable } from '../../db/client';
import { findThing, type ThingTables } from '../../db/kept-thing-store';
import { notFound } from '../../http/app-error';

export async function getThing<Spec>(
  db: Queryable,
  tables: ThingTables<Spec>,
  key: { accountId: string; id: string },
): Promise<KeptThing<Spec>> {
  const thing = await findThing(db, tables, key);
  if (!thing) throw notFound();
  return thing;
}
