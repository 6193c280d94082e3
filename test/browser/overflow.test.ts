import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { demoPeople } from '../../server/db/seed/demo-people';
import { DEVICES, expectNoAxeViolations, screenshot, type JourneyPage } from './harness/browser';
import { openJourneyFile } from './harness/journey-file';
import { signIn } from './steps/sign-in';
import {
  engineerScreens,
  GUEST_SCREENS,
  openScreen,
  OUTSIDE_SCREENS,
  unfold,
  type ListedScreen,
} from './steps/screens';

const NARROW_PX = 360;

const file = openJourneyFile();

function openNarrowPage() {
  return file.browser().openPage('phone', { viewport: { ...DEVICES.phone.viewport, width: NARROW_PX } });
}

function demoPerson(role: string) {
  const person = demoPeople.find((one) => one.role === role);
  if (person === undefined) throw new Error(`The demo has no ${role}.`);
  return person;
}

describe(`on a phone of ${NARROW_PX} px`, () => {
  it('no screen outside an account scrolls sideways, in light or dark', async () => {
    const visit = await openNarrowPage();
    expect(await widerThanThePhone(visit, OUTSIDE_SCREENS)).toEqual([]);
    await visit.close();
  });

  it('no screen of an engineer scrolls sideways, in light or dark', async () => {
    const visit = await openNarrowPage();
    await signIn(visit, demoPerson('engineer'));
    const screens = await engineerScreens(visit);
    expect(screens.length).toBeGreaterThan(20);
    expect(await widerThanThePhone(visit, screens)).toEqual([]);
    await visit.close();
  });

  it.each(['supplier', 'client', 'admin'] as const)('no screen of a %s scrolls sideways', async (role) => {
    const visit = await openNarrowPage();
    await signIn(visit, demoPerson(role));
    expect(await widerThanThePhone(visit, [GUEST_SCREENS[role]])).toEqual([]);
    await visit.close();
  });
});

describe('in the dark', () => {
  it.each(['phone', 'wide'] as const)('axe finds nothing on the main screens on %s', async (device) => {
    const visit = await file.browser().openPage(device, { colorScheme: 'dark' });
    const { page } = visit;
    const judge = async (screen: ListedScreen) => {
      await openScreen(visit, screen);
      expect(await schemeOf(page), screen.name).toBe('dark');
      await unfold(visit);
      await expectNoAxeViolations(page);
      await screenshot(page, `dark-${DEVICES[device].viewport.width}-${screen.name.replace(/ /g, '-')}`);
    };
    for (const screen of OUTSIDE_SCREENS.filter(({ name }) => /^(sign-in|gallery)$/.test(name)))
      await judge(screen);
    await signIn(visit, demoPerson('engineer'));
    const screens = await engineerScreens(visit);
    for (const screen of screens.filter(({ name }) => /^one of (studies|walls|materials)$/.test(name)))
      await judge(screen);
    await visit.close();
  });
});

/** Each screen as it opens and with everything unfolded, in both schemes; what sticks out is named. */
async function widerThanThePhone(visit: JourneyPage, screens: ListedScreen[]): Promise<string[]> {
  const faults: string[] = [];
  const { page } = visit;
  for (const screen of screens) {
    await page.emulateMedia({ colorScheme: 'light' });
    await openScreen(visit, screen);
    faults.push(...(await overflowOf(page, `${screen.name}, light`)));
    await page.emulateMedia({ colorScheme: 'dark' });
    await page.locator('[data-scheme="dark"]').first().waitFor();
    await unfold(visit);
    faults.push(...(await overflowOf(page, `${screen.name}, dark, unfolded`)));
  }
  return faults;
}

async function overflowOf(page: Page, name: string): Promise<string[]> {
  const found = await page.evaluate(() => {
    const width = window.innerWidth;
    if (document.documentElement.scrollWidth <= width) return null;
    const outside = [...document.querySelectorAll('main *')].filter(
      (element) => element.getBoundingClientRect().right > width + 0.5,
    );
    const last = outside.at(-1);
    return `${document.documentElement.scrollWidth} px: ${last?.outerHTML.slice(0, 160) ?? 'unknown'}`;
  });
  return found === null ? [] : [`${name}: ${found}`];
}

async function schemeOf(page: Page): Promise<string | null> {
  return page.locator('[data-scheme]').first().getAttribute('data-scheme');
}
