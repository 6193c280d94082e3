import { describe, expect, it } from 'vitest';
import { DEVICES, expectNoAxeViolations, screenshot, type Device, type JourneyPage } from './harness/browser';
import { openJourneyFile } from './harness/journey-file';
import { insertOwnAccount, insertStock } from './harness/own-account';
import { field, fillFields, shownText } from './steps/fields';
import { newPasswordLink } from './steps/mailbox';
import { waitForTitle } from './steps/places';
import { openSignIn, signIn } from './steps/sign-in';
import { gaugeField, layerNames, saveWallRevision } from './steps/walls';

const file = openJourneyFile();

describe.each(Object.keys(DEVICES) as Device[])('editing on %s', (device) => {
  const { width } = DEVICES[device].viewport;

  it('tells the second of two who edit one wall, side by side, and loses nothing', async () => {
    const account = await insertOwnAccount(file.product(), { engineers: 2 });
    const { laminateId } = await insertStock(file.product(), account.id);
    const first = await file.browser().openPage(device);
    const second = await file.browser().openPage(device);
    second.faults.allow({ status: 412, path: new RegExp(`/laminates/${laminateId}`) });
    for (const [index, visit] of [first, second].entries()) {
      await signIn(visit, account.engineers[index]!);
      await visit.page.goto(`${account.basePath}/walls/${laminateId}`);
      await outerGauge(visit).waitFor();
    }

    await outerGauge(first).fill('60');
    await saveWallRevision(first);
    await first.page.getByText(/revision 2\.$/).waitFor();

    await outerGauge(second).fill('40');
    await field(second.page, 'Name').fill('Mine, thinner');
    await saveWallRevision(second);
    const notice = second.page.getByRole('alert').filter({ hasText: 'was changed by somebody else' });
    await notice.waitFor();
    const both = notice.getByRole('table', { name: /mine and revision 2/ });
    expect(await shownText(both.getByRole('row').nth(1))).toMatch(/40 µm[\s\S]*60 µm/);
    expect(await shownText(notice)).toContain('Mine is called “Mine, thinner”');
    expect(await outerGauge(second).inputValue()).toBe('40');
    await expectNoAxeViolations(second.page);
    await screenshot(second.page, `editing-${width}-1-told`);

    await second.press(notice.getByRole('button', { name: 'Save mine on top' }));
    await notice.waitFor({ state: 'hidden' });
    await second.page.getByText(/revision 3\.$/).waitFor();
    await second.page.reload();
    await waitForTitle(second, 'Mine, thinner');
    expect(await outerGauge(second).inputValue()).toBe('40');
    await first.close();
    await second.close();
  });

  it('makes one thing of a double-clicked save', async () => {
    const account = await insertOwnAccount(file.product(), { engineers: 1 });
    const visit = await file.browser().openPage(device);
    const { page } = visit;
    await signIn(visit, account.engineers[0]!);
    await page.goto(`${account.basePath}/packs/new`);
    await field(page, 'Name').fill('Pouch of two clicks');
    await page.getByRole('button', { name: 'Save pack' }).dblclick();
    await waitForTitle(visit, 'Pouch of two clicks');
    await page.goto(`${account.basePath}/packs`);
    const packs = page.getByRole('list', { name: 'Packs' });
    await packs.getByRole('listitem').first().waitFor();
    expect(await packs.getByRole('listitem').count()).toBe(1);
    await visit.close();
  });

  it('keeps a draft through a reload and drops it when told', async () => {
    const account = await insertOwnAccount(file.product(), { engineers: 1 });
    const { laminateId } = await insertStock(file.product(), account.id);
    const visit = await file.browser().openPage(device);
    const { page, press } = visit;
    await signIn(visit, account.engineers[0]!);
    await page.goto(`${account.basePath}/walls/${laminateId}`);
    await outerGauge(visit).fill('33');
    await press(page.getByRole('button', { name: /^Duplicate A film, layer 1/ }));
    await expect.poll(() => layerNames(page)).toHaveLength(3);
    await page.reload();
    await page.getByText('Your unsaved changes are back').waitFor();
    expect(await layerNames(page)).toHaveLength(3);
    expect(await outerGauge(visit).inputValue()).toBe('33');
    await screenshot(page, `editing-${width}-2-draft-back`);
    await press(page.getByRole('button', { name: 'Drop them' }));
    await expect.poll(() => layerNames(page)).toHaveLength(2);
    expect(await outerGauge(visit).inputValue()).toBe('50');

    await page.goto(`${account.basePath}/studies/new`);
    await fillFields(page, { Name: 'Half a question', Target: '77' });
    await page.reload();
    await page.getByText('What you typed here last is still there.').waitFor();
    expect(await field(page, 'Name').inputValue()).toBe('Half a question');
    expect(await field(page, 'Target').inputValue()).toBe('77');
    await visit.close();
  });

  it('says at the field what is wrong with a gauge, and saves nothing', async () => {
    const account = await insertOwnAccount(file.product(), { engineers: 1 });
    const { laminateId } = await insertStock(file.product(), account.id);
    const visit = await file.browser().openPage(device);
    const { page } = visit;
    await signIn(visit, account.engineers[0]!);
    await page.goto(`${account.basePath}/walls/${laminateId}`);
    const writes: string[] = [];
    page.on('request', (request) => {
      if (request.method() !== 'GET') writes.push(request.url());
    });
    for (const bad of ['0', '-1', 'thick', '5000', '']) {
      const gauge = outerGauge(visit);
      await gauge.fill(bad);
      await saveWallRevision(visit);
      await expect.poll(() => gauge.getAttribute('aria-invalid'), { message: `“${bad}”` }).toBe('true');
      const description = await gauge.getAttribute('aria-describedby');
      const message = await page.locator(`[id="${description}"]`).innerText();
      expect(message, `“${bad}”`).toMatch(/gauge/i);
      expect(await gauge.inputValue()).toBe(bad);
      if (bad !== '5000') continue;
      await expectNoAxeViolations(page);
      await screenshot(page, `editing-${width}-3-bad-gauge`);
    }
    expect(writes).toEqual([]);
    await visit.close();
  });

  it('gives a new password to who forgot the old one', async () => {
    const account = await insertOwnAccount(file.product(), { engineers: 1 });
    const { email } = account.engineers[0]!;
    const visit = await file.browser().openPage(device);
    const { page, press } = visit;
    await openSignIn(visit);
    await press(page.getByRole('link', { name: 'Forgotten password' }));
    await waitForTitle(visit, 'Forgotten password');
    await field(page, 'E-mail').fill(email);
    await expectNoAxeViolations(page);
    await press(page.getByRole('button', { name: 'Send the link' }));
    await page.getByText('Look into your mailbox').waitFor();

    const link = await newPasswordLink(visit, email);
    await expectNoAxeViolations(page);
    await screenshot(page, `editing-${width}-4-mailbox`);
    await press(link);
    await waitForTitle(visit, 'New password');
    const password = 'nineteen slow herons';
    await field(page, 'New password').fill(password);
    await expectNoAxeViolations(page);
    await screenshot(page, `editing-${width}-5-new-password`);
    await press(page.getByRole('button', { name: 'Change the password' }));
    await page.getByText('Your password is changed').waitFor();
    await signIn(visit, { email, password });
    await waitForTitle(visit, 'Studies');
    await visit.close();
  });
});

/** The stock wall holds one film twice; this is the gauge of the outer one. */
function outerGauge({ page }: JourneyPage) {
  return gaugeField(page, 'A film').first();
}
