import { gzipSync } from 'node:zlib';
import type { Page, Response } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { FIRST_SCREEN_BUDGET_KB, measureFirstScreen } from '../../server/bin/web-size.mjs';
import { startProduct, type RunningProduct } from '../harness/running-product';
import { ROOT } from '../harness/source-files';
import {
  DEVICES,
  expectNoAxeViolations,
  launchBrowser,
  screenshot,
  type Device,
  type JourneyBrowser,
} from './harness/browser';

let product: RunningProduct;
let browser: JourneyBrowser;

beforeAll(async () => {
  product = await startProduct();
  browser = await launchBrowser(product.address);
});

afterAll(async () => {
  await browser?.close();
  await product?.stop();
});

describe('the first screen', () => {
  it.each(Object.keys(DEVICES) as Device[])('opens without a fault on %s', async (device) => {
    const { page, close } = await browser.openPage(device);
    await openSignIn(page);
    await expectNoAxeViolations(page);
    await screenshot(page, `first-screen-${device}`);
    await close();
  });

  it('loads no more JavaScript than the budget, as the build prints it', async () => {
    const { page, close } = await browser.openPage('phone');
    const scripts: Response[] = [];
    page.on('response', (response) => {
      if (new URL(response.url()).pathname.endsWith('.js')) scripts.push(response);
    });
    await openSignIn(page);
    let loadedKb = 0;
    for (const script of scripts) loadedKb += gzipSync(await script.body()).length / 1000;
    await close();
    expect(loadedKb).toBeGreaterThan(50);
    expect(loadedKb).toBeLessThanOrEqual(FIRST_SCREEN_BUDGET_KB);
    const { kilobytes: printedKb } = measureFirstScreen(`${ROOT}/dist`);
    expect(
      Math.abs(loadedKb - printedKb) / loadedKb,
      `loaded ${loadedKb} kB, printed ${printedKb} kB`,
    ).toBeLessThan(0.02);
  });
});

/** The start leads a stranger to the sign-in page; its first field is the sign that it stands. */
async function openSignIn(page: Page): Promise<void> {
  await page.goto('/');
  await page.getByRole('textbox').first().waitFor();
  await page.waitForLoadState('networkidle');
}
