import type { Locator, Page } from 'playwright-core';
import type { JourneyPage } from '../harness/browser';

/** What every drawing of the page says of itself. */
export async function drawingNames(page: Page): Promise<string[]> {
  const labels = await page
    .getByRole('main')
    .getByRole('img')
    .evaluateAll((images) => images.map((image) => image.getAttribute('aria-label') ?? ''));
  return labels.map((label) => label.split('. ')[0] ?? '');
}

/** Opens the table behind a chart and gives back how many rows of figures it holds. */
export async function openTable({ page, press }: JourneyPage, button: string): Promise<number> {
  const opener = page.getByRole('button', { name: button, exact: true });
  await press(opener);
  const contentId = await opener.getAttribute('aria-controls');
  const table: Locator = page.locator(`[id="${contentId}"]`).getByRole('table');
  await table.waitFor();
  return table.locator('tbody tr').count();
}
