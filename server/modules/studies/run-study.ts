import { createHash } from 'node:crypto';
import { eq } from 'drizzle-orm';
import type { KeptThing } from '../../../shared/contract/kept-things';
import type { Candidate, StudyResult, StudySpec } from '../../../shared/contract/studies';
import { ENGINE_VERSION, InputError } from '../../../shared/engine';
import { canonicalJson } from '../../db/canonical-json';
import type { Transaction } from '../../db/client';
import { newId } from '../../db/new-id';
import { accounts } from '../../db/schema';
import { inputInvalid } from '../../http/app-error';
import type { Actor } from '../../http/route-definition';
import type { EnginePort } from '../../jobs/engine-workers';
import { computeCandidate } from './compute-candidate';
import { describeCandidate, describeLayers } from './describe-candidate';
import { headlineOf } from './headline';
import { loadInputs, type StudyInputs } from './load-inputs';
import { insertResult, nextResultNumber, type Pin } from './results.repository';

/**
 * Computes a study with the newest revisions of what it uses and stores the result. The study must be locked. `base`:
 * what the study chose before; archived things may stay, not come in anew.
 */
export async function runStudy(
  tx: Transaction,
  engine: EnginePort,
  { actor, study, base }: { actor: Actor; study: KeptThing<StudySpec>; base?: StudySpec },
): Promise<StudyResult> {
  const { accountId, userId } = actor;
  const { spec } = study.revision;
  const inputs = await loadInputs(tx, { accountId, spec, base });
  const currency = await findCurrency(tx, accountId);
  const candidates = await computeCandidates(engine, inputs, { targetDays: spec.target_days, currency });
  const unsigned: Omit<StudyResult, 'sha256'> = {
    id: newId(),
    number: await nextResultNumber(tx, study.id),
    study_id: study.id,
    study_revision_id: study.revision.id,
    created_at: new Date().toISOString(),
    created_by: userId,
    engine_version: ENGINE_VERSION,
    target_days: spec.target_days,
    food: { ...pinned(inputs.food), cautions: inputs.food.revision.spec.cautions },
    pack: { ...pinned(inputs.pack), tray: pinnedTray(inputs) },
    route: pinned(inputs.route),
    candidates,
  };
  const body = Buffer.from(canonicalJson(unsigned), 'utf8');
  const sha256 = createHash('sha256').update(body).digest();
  await insertResult(tx, {
    accountId,
    result: unsigned,
    body,
    sha256,
    headline: headlineOf(candidates),
    pins: pinsOf(inputs),
  });
  return { ...unsigned, sha256: sha256.toString('hex') };
}

function computeCandidates(
  engine: EnginePort,
  inputs: StudyInputs,
  { targetDays, currency }: { targetDays: number; currency: string },
): Promise<Candidate[]> {
  return Promise.all(
    inputs.laminates.map(async (laminate, i) => {
      const { description, layers, makeUp } = describeCandidate(laminate, inputs, targetDays);
      const computed = await computeCandidate(engine, description).catch((error: unknown) => {
        throw error instanceof InputError ? asFieldFault(error, i) : error;
      });
      return {
        laminate_id: laminate.id,
        laminate_revision_id: laminate.revision.id,
        name: laminate.revision.spec.name,
        layers,
        ...computed,
        make_up: { ...makeUp, currency },
      };
    }),
  );
}

/** What the engine refuses belongs to one of the things that the study chose. */
function asFieldFault(error: InputError, laminateIndex: number) {
  const value = typeof error.value === 'object' ? undefined : error.value;
  return inputInvalid([
    { path: chosenField(error.path, laminateIndex), value, message: `${error.path}: ${error.message}` },
  ]);
}

function chosenField(path: string, laminateIndex: number): string {
  if (path.startsWith('pack.walls[1]')) return 'spec.pack_id';
  if (path.startsWith('pack.walls')) return `spec.laminate_ids[${laminateIndex}]`;
  if (path.startsWith('pack')) return 'spec.pack_id';
  if (path.startsWith('route') || path.startsWith('horizon')) return 'spec.route_id';
  return path.startsWith('target') ? 'spec.target_days' : 'spec.food_id';
}

function pinned({ id, revision }: KeptThing<{ name: string }>) {
  return { id, revision_id: revision.id, name: revision.spec.name };
}

function pinnedTray({ tray, materialRevisions }: StudyInputs): StudyResult['pack']['tray'] {
  return (
    tray && {
      laminate_id: tray.id,
      laminate_revision_id: tray.revision.id,
      name: tray.revision.spec.name,
      layers: describeLayers(tray, materialRevisions),
    }
  );
}

async function findCurrency(tx: Transaction, accountId: string): Promise<string> {
  const [account] = await tx
    .select({ currency: accounts.currency })
    .from(accounts)
    .where(eq(accounts.id, accountId));
  if (!account) throw new Error(`Account ${accountId} is missing.`);
  return account.currency;
}

function pinsOf({ food, pack, route, laminates, tray }: StudyInputs): Pin[] {
  const pin = (
    collection: Pin['collection'],
    { id, revision }: { id: string; revision: { id: string } },
  ): Pin => ({
    collection,
    thingId: id,
    revisionId: revision.id,
  });
  const walls = [...laminates, ...(tray ? [tray] : [])];
  const layers = walls.flatMap((wall) => wall.revision.spec.layers);
  const pins: Pin[] = [
    pin('foods', food),
    pin('packs', pack),
    pin('routes', route),
    ...walls.map((wall) => pin('laminates', wall)),
    ...layers.map((layer): Pin => ({
      collection: 'materials',
      thingId: layer.material_id,
      revisionId: layer.material_revision_id,
    })),
  ];
  return [...new Map(pins.map((one) => [one.revisionId, one])).values()];
}
