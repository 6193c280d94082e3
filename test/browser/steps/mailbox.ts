import type { Locator } from 'playwright-core';
import type { JourneyPage } from '../harness/browser';

const MOST_LOOKS = 40;

/** Looks into the demo mailbox until the message for this address is there: mail goes out in the background. */
export async function newPasswordLink({ page, press }: JourneyPage, email: string): Promise<Locator> {
  await page.goto('/mailbox');
  const message = page.getByRole('group').filter({ hasText: email });
  const lookAgain = page.getByRole('button', { name: 'Look again', exact: true });
  for (let look = 0; look < MOST_LOOKS && (await message.count()) === 0; look += 1) {
    const answer = page.waitForResponse(/\/api\/demo\/mailbox/);
    await press(lookAgain);
    await answer;
    await lookAgain.waitFor();
  }
  return message.getByRole('link').first();
}
