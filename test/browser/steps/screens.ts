import type { Page } from 'playwright-core';
import { demoAccount } from '../../../server/db/seed/demo-account';
import type { JourneyPage } from '../harness/browser';

const BASE = `/a/${demoAccount.slug}`;

export interface ListedScreen {
  /** For reports: 'study'. */
  name: string;
  path: string;
}

export const OUTSIDE_SCREENS: ListedScreen[] = [
  { name: 'sign-in', path: '/sign-in' },
  { name: 'forgotten password', path: '/forgotten-password' },
  { name: 'new password', path: '/reset-password?token=a-token-of-some-length' },
  { name: 'mailbox', path: '/mailbox' },
  { name: 'gallery', path: '/gallery' },
  { name: 'nothing there', path: '/nothing-there' },
];

export const GUEST_SCREENS: Record<'supplier' | 'client' | 'admin', ListedScreen> = {
  supplier: { name: 'requests', path: `${BASE}/requests` },
  client: { name: 'reports', path: `${BASE}/reports` },
  admin: { name: 'team', path: `${BASE}/team` },
};

const COLLECTIONS = [
  { place: 'studies', collection: 'studies' },
  { place: 'walls', collection: 'laminates' },
  { place: 'materials', collection: 'materials' },
  { place: 'packs', collection: 'packs' },
  { place: 'foods', collection: 'foods' },
  { place: 'routes', collection: 'routes' },
];

/** Every screen of the signed-in engineer of the demo: each list, its newest thing, and the form for a new one. */
export async function engineerScreens({ page }: JourneyPage): Promise<ListedScreen[]> {
  const accountId = await accountIdOf(page);
  const screens: ListedScreen[] = [
    { name: 'account', path: `${BASE}/account` },
    { name: 'more', path: `${BASE}/more` },
  ];
  for (const { place, collection } of COLLECTIONS) {
    const answer = await page.request.get(`/api/accounts/${accountId}/${collection}`);
    const { items } = (await answer.json()) as { items: { id: string }[] };
    const newest = items[0];
    if (newest === undefined) throw new Error(`The demo has no ${collection}.`);
    screens.push(
      { name: place, path: `${BASE}/${place}` },
      { name: `one of ${place}`, path: `${BASE}/${place}/${newest.id}` },
      { name: `new in ${place}`, path: `${BASE}/${place}/new` },
    );
    if (place === 'studies') screens.push({ name: 'edit study', path: `${BASE}/${place}/${newest.id}/edit` });
  }
  return screens;
}

async function accountIdOf(page: Page): Promise<string> {
  const answer = await page.request.get('/api/session');
  const { memberships } = (await answer.json()) as { memberships: { account: { id: string } }[] };
  return memberships[0]?.account.id ?? '';
}

/** Opens a screen and waits until it stands there whole: nothing is being fetched any more. */
export async function openScreen({ page }: JourneyPage, { path }: ListedScreen): Promise<void> {
  await page.goto(path);
  await page.waitForLoadState('networkidle');
  await page.getByRole('heading', { level: 1 }).waitFor();
}

/** Opens everything that can be folded away, so that nothing escapes by being shut. */
export async function unfold({ page }: JourneyPage): Promise<void> {
  const shut = page.locator('main [role="button"][aria-expanded="false"]');
  for (let round = 0; round < 3 && (await shut.count()) > 0; round += 1) {
    await shut.evaluateAll((buttons) => {
      for (const button of buttons) if (button instanceof HTMLElement) button.click();
    });
  }
}
