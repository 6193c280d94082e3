import type { Locator, Page } from 'playwright-core';
import type { JourneyPage } from '../harness/browser';
import { fillFields, sheet, shownText } from './fields';

/** Takes a material at one of its usual gauges, through the picker. */
export async function addLayer(
  { page, press }: JourneyPage,
  { material, gauge }: { material: string; gauge: string },
): Promise<void> {
  await press(page.getByRole('button', { name: 'Add a layer' }));
  const picker = page.getByRole('dialog', { name: 'Add a layer' });
  await picker.getByRole('searchbox').fill(material);
  await press(
    picker
      .getByRole('group', { name: material, exact: true })
      .getByRole('button', { name: gauge, exact: true }),
  );
  await picker.waitFor({ state: 'hidden' });
}

/** The layers as they stand, outside first: 'PET', 'EVOH'. */
export async function layerNames(page: Page): Promise<string[]> {
  const labels = await layerRows(page).evaluateAll((rows) =>
    rows.map((row) => row.getAttribute('aria-label') ?? ''),
  );
  return labels.map((label) => label.replace(/, layer \d+ of \d+$/, ''));
}

function layerRows(page: Page): Locator {
  return page.getByRole('list', { name: /^Layers, outside first/ }).getByRole('listitem');
}

export function gaugeField(page: Page, material: string): Locator {
  return page.getByRole('textbox', { name: new RegExp(`^Gauge of ${material}, layer \\d+ of \\d+, µm$`) });
}

export async function setBothSides(page: Page, humidity: string): Promise<void> {
  await fillFields(sheet(page, 'The wall'), {
    Temperature: '23',
    'Humidity outside': humidity,
    'Humidity inside': humidity,
  });
}

/** The large figure: '1.97 cm³/(m²·day·atm)'. */
export async function shownOxygenPermeance(page: Page): Promise<string> {
  const text = await shownText(page.getByRole('group', { name: 'Under these conditions' }));
  const found = /Oxygen permeance\s+(\S+)\s+(cm³\S+)/.exec(text);
  return found === null ? text : `${found[1]} ${found[2]}`;
}

export async function saveNewWall({ page, press }: JourneyPage): Promise<void> {
  await press(page.getByRole('button', { name: 'Save wall' }));
}

export async function saveWallRevision({ page, press }: JourneyPage): Promise<void> {
  await press(page.getByRole('button', { name: 'Save as a new revision' }));
}
