import { afterAll, beforeAll } from 'vitest';
import { startProduct, type RunningProduct } from '../../harness/running-product';
import { launchBrowser, type JourneyBrowser } from './browser';

export interface JourneyFile {
  product: () => RunningProduct;
  browser: () => JourneyBrowser;
}

/** One server over one database and one browser for all journeys of a file. */
export function openJourneyFile(): JourneyFile {
  let product: RunningProduct | undefined;
  let browser: JourneyBrowser | undefined;
  beforeAll(async () => {
    product = await startProduct();
    browser = await launchBrowser(product.address);
  });
  afterAll(async () => {
    await browser?.close();
    await product?.stop();
  });
  return {
    product: () => started(product),
    browser: () => started(browser),
  };
}

function started<Part>(part: Part | undefined): Part {
  if (part === undefined) throw new Error('Ask for it inside a test, once the server and the browser run.');
  return part;
}
