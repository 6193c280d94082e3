import { eq } from 'drizzle-orm';
import type { LaminateSpec } from '../../../shared/contract/laminates';
import type { PackSpec } from '../../../shared/contract/packs';
import type { KeptThing } from '../../../shared/contract/kept-things';
import type { Database, Transaction } from '../../db/client';
import { insertThing, type ThingTables } from '../../db/kept-thing-store';
import {
  accounts,
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
} from '../../db/schema';
import {
  demoAccount,
  demoLaminates,
  demoMassesKg,
  demoPacks,
  demoStudies,
  demoTrays,
} from '../../db/seed/demo-account';
import { demoMaterialSpecs } from '../../db/seed/demo-materials';
import { demoPeople } from '../../db/seed/demo-people';
import { libraryFoods } from '../../db/seed/library-foods';
import { libraryMaterials } from '../../db/seed/library-materials';
import { libraryRoutes } from '../../db/seed/library-routes';
import { insertAccount, insertCompany, insertMembership, insertPerson } from '../../db/seed/people-builders';
import type { EnginePort } from '../../jobs/engine-workers';
import { hashPassword } from '../session/hash-password';
import { createStudy } from '../studies/create-study';

type Kept = Map<string, KeptThing<unknown>>;

/** Fills an empty database with the demo account, all or nothing. False where it is there already. */
export async function seedDemo({ db, engine }: { db: Database; engine: EnginePort }): Promise<boolean> {
  return db.transaction(async (tx) => {
    const [existing] = await tx
      .select({ id: accounts.id })
      .from(accounts)
      .where(eq(accounts.slug, demoAccount.slug));
    if (existing) return false;
    const { accountId, engineerId } = await seedPeople(tx);
    const kept = await seedThings(tx, accountId);
    const actor = { userId: engineerId, accountId, roles: ['engineer'], companyId: null } as const;
    for (const study of demoStudies) {
      const spec = {
        name: study.name,
        food_id: idOf(kept, `foods/${study.food}`),
        pack_id: idOf(kept, `packs/${study.pack}`),
        route_id: idOf(kept, `routes/${study.route}`),
        laminate_ids: study.laminates.map((key) => idOf(kept, `laminates/${key}`)),
        target_days: study.targetDays,
        notes: study.notes,
        tags: [...study.tags],
        laminate_notes: Object.entries(study.verdicts ?? {}).map(([key, [verdict, note]]) => ({
          laminate_id: idOf(kept, `laminates/${key}`),
          verdict,
          note,
        })),
      };
      await createStudy(tx, engine, { actor, spec });
    }
    return true;
  });
}

async function seedPeople(tx: Transaction): Promise<{ accountId: string; engineerId: string }> {
  const accountId = await insertAccount(tx, demoAccount);
  const companyIds = new Map<string, string>();
  for (const name of demoAccount.companies) companyIds.set(name, await insertCompany(tx, accountId, name));
  let engineerId: string | undefined;
  for (const { name, email, password, memberRoles, company } of demoPeople) {
    const userId = await insertPerson(tx, { name, email, passwordHash: await hashPassword(password) });
    const companyId = company === null ? null : companyIds.get(company);
    await insertMembership(tx, { accountId, userId, roles: memberRoles, companyId });
    engineerId ??= userId;
  }
  if (engineerId === undefined) throw new Error('The demo has no engineer.');
  return { accountId, engineerId };
}

/** By collection and the library's own id. */
async function seedThings(tx: Transaction, accountId: string): Promise<Kept> {
  const kept: Kept = new Map();
  async function keep<Spec extends { name: string }>(key: string, tables: ThingTables<Spec>, spec: Spec) {
    kept.set(key, await insertThing(tx, tables, { accountId, spec, createdBy: null }));
  }
  // Lists show the newest first: what the library names first is inserted last.
  for (const { key, spec } of demoMaterialSpecs()) {
    await keep(`materials/${key}`, { things: materials, revisions: materialRevisions }, spec);
  }
  for (const { libraryId, spec } of libraryMaterials().reverse()) {
    await keep(`materials/${libraryId}`, { things: materials, revisions: materialRevisions }, spec);
  }
  for (const { libraryId, spec } of libraryFoods(demoMassesKg).reverse()) {
    await keep(`foods/${libraryId}`, { things: foods, revisions: foodRevisions }, spec);
  }
  for (const { libraryId, spec } of libraryRoutes().reverse()) {
    await keep(`routes/${libraryId}`, { things: routes, revisions: routeRevisions }, spec);
  }
  for (const { key, spec } of [...demoPacks].reverse()) {
    await keep(`packs/${key}`, { things: packs, revisions: packRevisions }, spec);
  }
  for (const laminate of [...demoLaminates].reverse()) {
    const spec: LaminateSpec = {
      name: laminate.name,
      layers: laminate.layers.map(([libraryId, thicknessUm]) => {
        const material = thingOf(kept, `materials/${libraryId}`);
        return {
          material_id: material.id,
          material_revision_id: material.revision.id,
          thickness_um: thicknessUm,
        };
      }),
    };
    await keep(`laminates/${laminate.key}`, { things: laminates, revisions: laminateRevisions }, spec);
  }
  for (const tray of demoTrays) {
    const spec: PackSpec = {
      name: tray.name,
      form: {
        type: 'tray',
        tray_area_m2: tray.trayAreaM2,
        lid_area_m2: tray.lidAreaM2,
        tray_laminate_id: idOf(kept, `laminates/${tray.trayLaminate}`),
      },
      headspace_cm3: tray.headspaceCm3,
      starting_headspace_oxygen_percent: tray.startingHeadspaceOxygenPercent,
      has_seal_path: false,
      leaks: null,
    };
    await keep(`packs/${tray.key}`, { things: packs, revisions: packRevisions }, spec);
  }
  return kept;
}

function thingOf(kept: Kept, key: string): KeptThing<unknown> {
  const thing = kept.get(key);
  if (!thing) throw new Error(`The demo names ${key}, which is not in the library.`);
  return thing;
}

function idOf(kept: Kept, key: string): string {
  return thingOf(kept, key).id;
}
