import { describe, expect, it } from 'vitest';
import { demoPeople } from '../../server/db/seed/demo-people';
import { DEVICES, expectNoAxeViolations, screenshot, type Device } from './harness/browser';
import { openJourneyFile } from './harness/journey-file';
import { waitForTitle } from './steps/places';
import { signIn } from './steps/sign-in';

const file = openJourneyFile();

const FIRST_SCREENS = [
  { role: 'supplier', title: 'Requests', says: 'Nothing is waiting for you now', notTheirs: 'studies' },
  { role: 'client', title: 'Reports', says: 'No report is shared with you now', notTheirs: 'materials' },
  { role: 'admin', title: 'Team', says: 'What happened last', notTheirs: 'requests' },
] as const;

function demoPerson(role: string) {
  const person = demoPeople.find((one) => one.role === role);
  if (person === undefined) throw new Error(`The demo has no ${role}.`);
  return person;
}

describe.each(Object.keys(DEVICES) as Device[])('on %s', (device) => {
  const { width } = DEVICES[device].viewport;

  it.each(FIRST_SCREENS)('a $role lands on $title and finds nothing elsewhere', async (expected) => {
    const visit = await file.browser().openPage(device);
    const { page } = visit;
    await signIn(visit, demoPerson(expected.role));
    await waitForTitle(visit, expected.title);
    await page.getByText(expected.says).waitFor();
    await screenshot(page, `other-people-${width}-${expected.role}`);
    await expectNoAxeViolations(page);

    await page.goto(`/a/tannhollow/${expected.notTheirs}`);
    await waitForTitle(visit, 'Nothing at this address');
    await expectNoAxeViolations(page);
    await screenshot(page, `other-people-${width}-${expected.role}-not-found`);
    await visit.press(page.getByRole('link', { name: 'To my first screen' }));
    await waitForTitle(visit, expected.title);
    await visit.close();
  });

  it('an admin sees who is in the account and what was done in it', async () => {
    const visit = await file.browser().openPage(device);
    const { page } = visit;
    await signIn(visit, demoPerson('admin'));
    const people = page.getByRole('table', { name: 'People in this account' });
    await people.waitFor();
    for (const { name } of demoPeople) expect(await people.innerText()).toContain(name);
    await page.getByText('seats', { exact: true }).waitFor();
    const entries = page.getByRole('table', { name: 'Latest entries of the audit log' });
    await entries.waitFor();
    expect(await entries.innerText()).toMatch(/Mirela Tosk\s[\s\S]*study created/);
    await visit.close();
  });

  it('somebody who is not in an account finds nothing there', async () => {
    const visit = await file.browser().openPage(device);
    await signIn(visit, demoPerson('engineer'));
    await visit.page.goto('/a/some-other-kitchen/studies');
    await waitForTitle(visit, 'Nothing at this address');
    await visit.close();
  });
});
