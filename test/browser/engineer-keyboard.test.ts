import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { demoPeople } from '../../server/db/seed/demo-people';
import { DEVICES, expectNoAxeViolations, screenshot, type Device, type JourneyPage } from './harness/browser';
import { openJourneyFile } from './harness/journey-file';
import { hasVisibleFocus, tabTo, typeChoice, typeOver, type TabTarget } from './harness/keyboard';
import { readAnswer } from './steps/answer';
import { field, shownText } from './steps/fields';
import { waitForTitle } from './steps/places';
import { layerNames } from './steps/walls';

const file = openJourneyFile();

describe.each(Object.keys(DEVICES) as Device[])('an engineer with a keyboard alone, %s', (device) => {
  it('goes from sign-in to the answer of a new study with a wall of their own', async () => {
    const visit = await file.browser().openPage(device);
    const { page } = visit;
    const { width } = DEVICES[device].viewport;
    const wall = `Keyed wall ${width}`;

    await signInByKeyboard(page);
    await waitForTitle(visit, device === 'wide' ? /./ : 'Studies');
    await openNewStudyByKeyboard(visit);
    await buildWallByKeyboard(visit, wall);
    await screenshot(page, `engineer-keyboard-${width}-1-study-form`);
    await askByKeyboard(visit, { study: `Keyed study ${width}`, wall });

    const answer = await readAnswer(page);
    expect(answer.first).toBe(answer.oxygenDay < answer.moistureDay ? 'oxygen' : 'moisture');
    await expectNoAxeViolations(page);
    await screenshot(page, `engineer-keyboard-${width}-2-answer`);
    await openTableByKeyboard(page, wall);
    await visit.close();
  });
});

/** Tabs to it and, so that nobody is lost on the way, sees that the ring is drawn. */
async function reach(page: Page, target: TabTarget, way: { isBackwards?: boolean } = {}): Promise<void> {
  await tabTo(page, target, way);
  expect(await hasVisibleFocus(page), `a ring round ${target.role} ${String(target.name)}`).toBe(true);
}

async function pressKeyOn(page: Page, target: TabTarget, key: 'Enter' | 'Space'): Promise<void> {
  await reach(page, target);
  await page.keyboard.press(key);
}

async function fill(page: Page, label: string, text: string): Promise<void> {
  await reach(page, { role: 'textbox', name: label });
  await typeOver(page, text);
}

async function signInByKeyboard(page: Page): Promise<void> {
  const engineer = demoPeople.find((person) => person.role === 'engineer')!;
  await page.goto('/sign-in');
  await page.getByRole('heading', { name: 'Demo people' }).waitFor();
  await fill(page, 'E-mail', engineer.email);
  await fill(page, 'Password', engineer.password);
  await page.keyboard.press('Enter');
  await page.waitForURL(/\/a\//);
}

async function openNewStudyByKeyboard(visit: JourneyPage): Promise<void> {
  const { page } = visit;
  await page.getByRole('list', { name: 'Studies, newest first' }).waitFor();
  await pressKeyOn(page, { role: 'link', name: 'New study' }, 'Enter');
  await waitForTitle(visit, 'New study');
}

/** Adds four layers, takes one out of place and puts it back, doubles, re-gauges and turns the wall. */
async function buildWallByKeyboard(visit: JourneyPage, name: string): Promise<void> {
  const { page } = visit;
  await pressKeyOn(page, { role: 'link', name: 'Make a new wall' }, 'Enter');
  await waitForTitle(visit, 'New wall');
  await addLayerByKeyboard(page, 'BOPET', /^12 µm$/);
  await addLayerByKeyboard(page, 'EVOH 32', /^5 µm$/);
  await addLayerByKeyboard(page, 'LDPE', /^50 µm$/);
  const asAdded = await layerNames(page);
  expect(asAdded).toHaveLength(3);
  const [outer, barrier, inner] = asAdded as [string, string, string];

  // Reorder: by the row's own button, and back by Alt with an arrow key.
  await reach(
    page,
    { role: 'button', name: `Move ${barrier}, layer 2 of 3 outwards` },
    { isBackwards: true },
  );
  await page.keyboard.press('Enter');
  await expect.poll(() => layerNames(page)).toEqual([barrier, outer, inner]);
  await page.keyboard.press('Alt+ArrowDown');
  await expect.poll(() => layerNames(page)).toEqual([outer, barrier, inner]);

  await reach(page, { role: 'button', name: `Duplicate ${inner}, layer 3 of 3` });
  await page.keyboard.press('Space');
  await expect.poll(() => layerNames(page)).toEqual([outer, barrier, inner, inner]);

  const gauge = `Gauge of ${barrier}, layer 2 of 4, µm`;
  await reach(page, { role: 'textbox', name: gauge }, { isBackwards: true });
  await typeOver(page, '7');
  await page.keyboard.press('ArrowUp');
  expect(await page.getByRole('textbox', { name: gauge }).inputValue()).toBe('8');

  await pressKeyOn(page, { role: 'button', name: 'Turn round' }, 'Space');
  await expect.poll(() => layerNames(page)).toEqual([inner, inner, barrier, outer]);
  await page.keyboard.press('Space');
  await expect.poll(() => layerNames(page)).toEqual([outer, barrier, inner, inner]);

  await fill(page, 'Name', name);
  await expectNoAxeViolations(page);
  await page.keyboard.press('Enter');
  await waitForTitle(visit, 'New study');
}

async function addLayerByKeyboard(page: Page, search: string, gauge: RegExp): Promise<void> {
  await pressKeyOn(page, { role: 'button', name: 'Add a layer' }, 'Enter');
  const picker = page.getByRole('dialog', { name: 'Add a layer' });
  await picker.waitFor();
  await reach(page, { role: 'searchbox', name: /^Search by name/ });
  await typeOver(page, search);
  await pressKeyOn(page, { role: 'button', name: gauge }, 'Enter');
  await picker.waitFor({ state: 'hidden' });
}

async function askByKeyboard(
  visit: JourneyPage,
  { study, wall }: { study: string; wall: string },
): Promise<void> {
  const { page } = visit;
  await fill(page, 'Name', study);
  const choices = [
    { label: 'Food', typed: 'Roasted haz', chosen: /hazelnut/i },
    { label: 'Pack', typed: 'Stand-up', chosen: /^Stand-up pouch/ },
    { label: 'Route', typed: 'Europe', chosen: /^Europe/ },
  ];
  for (const { label, typed, chosen } of choices) {
    await reach(page, { role: 'combobox', name: label });
    await typeChoice(page, typed);
    expect(await field(page, label).locator('option:checked').innerText()).toMatch(chosen);
  }
  await fill(page, 'Target', '90');
  expect(await field(page, 'Wall').locator('option:checked').innerText()).toBe(wall);
  await pressKeyOn(page, { role: 'button', name: 'Compute and keep' }, 'Space');
  await waitForTitle(visit, study);
}

async function openTableByKeyboard(page: Page, wall: string): Promise<void> {
  await pressKeyOn(page, { role: 'button', name: 'Table of the ruler' }, 'Enter');
  const table = page.getByRole('table', { name: 'Days on the shelf' });
  await table.waitFor();
  expect(await shownText(table)).toContain(wall);
}
