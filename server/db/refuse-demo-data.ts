import { inArray } from 'drizzle-orm';
import type { Database } from './client';
import { people } from './schema';
import { demoPeople } from './seed/demo-people';

/**
 * Live mode never runs on a database that holds the demo people: their passwords are printed on a page.
 * Begin with an empty database, or take the demo data out first.
 */
export async function refuseDemoData(db: Database): Promise<void> {
  const emails = demoPeople.map((person) => person.email);
  const [found] = await db
    .select({ userId: people.userId })
    .from(people)
    .where(inArray(people.email, emails))
    .limit(1);
  if (found === undefined) return;
  throw new Error(
    'This database holds the demo people, whose passwords are public. APP_MODE=live refuses it: give DATA_DIR (or DATABASE_URL) of a database of its own.',
  );
}
