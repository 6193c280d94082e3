import { setTimeout as sleep } from 'node:timers/promises';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoPeople } from '../../server/db/seed/demo-people';
import { signInToSave, type Laminate, type Save, type SavingClient } from './saving-client';
import { startSupervisedProduct, type SupervisedProduct, type Victim } from './supervised-product';

const SAVES = 20;
/** The blow falls when this many saves are confirmed: some are done then, some under way, some not begun. */
const CONFIRMED_BEFORE_KILL = 6;
const PAUSE_BETWEEN_SAVES_MS = 8;
const KILL_PATIENCE_MS = 20_000;

let product: SupervisedProduct;
let client: SavingClient;

beforeAll(async () => {
  product = await startSupervisedProduct();
  const engineer = demoPeople.find((person) => person.role === 'engineer');
  if (engineer === undefined) throw new Error('There is no demo engineer.');
  client = await signInToSave(product.address, engineer);
});

afterAll(() => product?.stop());

describe('SIGKILL in the middle of 20 saves', () => {
  it.each<[title: string, victims: Victim[]]>([
    ['the server', ['server']],
    ['PostgreSQL', ['postgres']],
    ['both at once', ['server', 'postgres']],
  ])('of %s leaves each save whole or absent, and it starts again by itself', async (title, victims) => {
    const saves = Array.from({ length: SAVES }, (_, at) => client.prepareSave(`Kill test, ${title}, ${at}`));
    await saveWhileKilling(saves, victims);
    const confirmedBefore = saves.filter((save) => save.confirmed !== undefined);
    expect(confirmedBefore.length, 'the blow fell in the middle').toBeGreaterThan(0);
    expect(confirmedBefore.length, 'the blow fell in the middle').toBeLessThan(SAVES);

    await product.waitUntilHealthy();
    const afterKill = await client.list();
    for (const save of saves) {
      const found = foundFor(save, afterKill);
      expect(found.length).toBeLessThanOrEqual(1);
      for (const laminate of found) expectWhole(laminate, save);
      if (save.confirmed) expect(found.map((laminate) => laminate.id)).toEqual([save.confirmed.id]);
    }

    for (const save of saves) await client.saveWithRetries(save);
    // A key that was spent before the blow still answers with what it made.
    for (const save of confirmedBefore) await client.trySave(save);
    const atLast = await client.list();
    for (const save of saves) {
      const found = foundFor(save, atLast);
      expect(
        found.map((laminate) => laminate.id),
        save.spec.name,
      ).toEqual([save.confirmed?.id]);
      for (const laminate of found) expectWhole(laminate, save);
    }
  });
});

/** Sends all saves a few milliseconds apart, and kills as soon as some have been confirmed. */
async function saveWhileKilling(saves: readonly Save[], victims: readonly Victim[]): Promise<void> {
  const sending = sendAll(saves);
  const deadline = Date.now() + KILL_PATIENCE_MS;
  while (saves.filter((save) => save.confirmed !== undefined).length < CONFIRMED_BEFORE_KILL) {
    if (Date.now() > deadline) throw new Error('Too few saves were confirmed to kill in the middle of them.');
    await sleep(1);
  }
  for (const victim of victims) product.kill(victim);
  await sending;
}

async function sendAll(saves: readonly Save[]): Promise<void> {
  const attempts: Promise<void>[] = [];
  for (const save of saves) {
    attempts.push(client.trySave(save));
    await sleep(PAUSE_BETWEEN_SAVES_MS);
  }
  await Promise.all(attempts);
}

function foundFor(save: Save, laminates: readonly Laminate[]): Laminate[] {
  return laminates.filter((laminate) => laminate.revision.spec.name === save.spec.name);
}

function expectWhole(laminate: Laminate, save: Save): void {
  expect(laminate.revision.number).toBe(1);
  expect(laminate.revision.spec.layers).toEqual(save.spec.layers);
}
