import type { JourneyPage } from '../harness/browser';

/** By the bar or the rail; what a phone has no room for lies behind More. */
export async function goToPlace({ page, press }: JourneyPage, place: string): Promise<void> {
  const places = page.getByRole('navigation', { name: 'Places' });
  await places.waitFor();
  const link = places.getByRole('link', { name: place, exact: true });
  if (await link.isVisible()) {
    await press(link);
  } else {
    await press(places.getByRole('link', { name: 'More', exact: true }));
    await press(page.getByRole('main').getByRole('link', { name: place, exact: true }));
  }
  await page.getByRole('heading', { level: 1 }).waitFor();
}

export async function waitForTitle({ page }: JourneyPage, title: string | RegExp): Promise<void> {
  await page.getByRole('heading', { level: 1, name: title, exact: true }).waitFor();
}
