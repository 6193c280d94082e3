import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { chromium, type Browser, type BrowserContextOptions, type Locator, type Page } from 'playwright-core';
import { expect, onTestFailed } from 'vitest';
import { ROOT } from '../../harness/source-files';
import { collectPageFaults, type PageFaults } from './page-faults';

export { expectNoAxeViolations } from './axe';

const CHROMIUM = '/usr/bin/chromium';
const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--disable-dev-shm-usage',
];
const ACTION_TIMEOUT_MS = 15_000;

export type Device = 'phone' | 'wide';

export const DEVICES = {
  phone: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true, deviceScaleFactor: 2 },
  wide: { viewport: { width: 1280, height: 800 }, hasTouch: false, isMobile: false, deviceScaleFactor: 1 },
} as const satisfies Record<Device, BrowserContextOptions>;

export interface JourneyPage {
  page: Page;
  faults: PageFaults;
  /** With a finger where the device has a touch screen, with the mouse elsewhere. */
  press: (target: Locator) => Promise<void>;
  /** Closes the page; fails when anything went wrong on it that no journey allowed. */
  close: () => Promise<void>;
}

export interface JourneyBrowser {
  /** A page with no history, no cookies and no storage. */
  openPage: (device: Device, options?: BrowserContextOptions) => Promise<JourneyPage>;
  close: () => Promise<void>;
}

/** Headless Chromium from Debian with a profile of its own that goes when it closes. */
export async function launchBrowser(address: string): Promise<JourneyBrowser> {
  const browser = await chromium.launch({ executablePath: CHROMIUM, args: FLAGS, headless: true });
  return {
    openPage: (device, options) => openPage(browser, { ...DEVICES[device], baseURL: address, ...options }),
    close: () => browser.close(),
  };
}

async function openPage(browser: Browser, options: BrowserContextOptions): Promise<JourneyPage> {
  const context = await browser.newContext({ locale: 'en-GB', timezoneId: 'UTC', ...options });
  const page = await context.newPage();
  page.setDefaultTimeout(ACTION_TIMEOUT_MS);
  const faults = collectPageFaults(page);
  const close = async () => {
    await context.close();
    expect(faults.list(), 'faults on the page').toEqual([]);
  };
  onTestFailed(async ({ task }) => {
    if (page.isClosed()) return;
    // What went wrong on the page is most often why the journey found no way on.
    for (const fault of faults.list()) process.stderr.write(`${fault}\n`);
    await screenshot(page, `failed-${task.id}`);
    await context.close();
  });
  const press = (target: Locator) => (options.hasTouch === true ? target.tap() : target.click());
  return { page, faults, press, close };
}

/**
 * The whole page, kept in test-results/screenshots after the run for people to look at. The window is made as high as
 * the page meanwhile: a bar that stays in sight would otherwise stand in its middle.
 */
export async function screenshot(page: Page, name: string): Promise<void> {
  const folder = path.join(ROOT, 'test-results', 'screenshots');
  mkdirSync(folder, { recursive: true });
  const before = page.viewportSize();
  const height = await page.evaluate(() => document.documentElement.scrollHeight);
  if (before !== null)
    await page.setViewportSize({ width: before.width, height: Math.max(before.height, height) });
  await page.screenshot({ path: path.join(folder, `${name}.png`), animations: 'disabled' });
  if (before !== null) await page.setViewportSize(before);
}
