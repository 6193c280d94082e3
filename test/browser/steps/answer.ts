import type { Page } from 'playwright-core';
import { shownText } from './fields';

export interface ReadAnswer {
  sentence: string;
  oxygenDay: number;
  moistureDay: number;
  /** The limit that the screen marks as coming first. */
  first: 'oxygen' | 'moisture';
}

/** Reads the answer off the study's screen, from words that a person reads. */
export async function readAnswer(page: Page): Promise<ReadAnswer> {
  const limits = page.getByRole('list', { name: 'Limits' });
  await limits.waitFor();
  const oxygen = await shownText(limits.getByRole('listitem').filter({ hasText: 'Oxygen taken up' }));
  const moisture = await shownText(limits.getByRole('listitem').filter({ hasText: 'Moisture, at most' }));
  const sentence = await shownText(
    page.getByRole('heading', { level: 2, name: /^(Ends by|Keeps|Past its|No limit)/ }),
  );
  const isOxygenFirst = oxygen.includes('comes first');
  if (isOxygenFirst === moisture.includes('comes first'))
    throw new Error(`One limit comes first, not: ${oxygen} | ${moisture}`);
  return {
    sentence,
    oxygenDay: dayIn(oxygen),
    moistureDay: dayIn(moisture),
    first: isOxygenFirst ? 'oxygen' : 'moisture',
  };
}

function dayIn(words: string): number {
  const found = /day ([\d.,\s]*\d)/.exec(words);
  if (found?.[1] === undefined) throw new Error(`No day stands in: ${words}`);
  return Number(found[1].replace(/[\s,]/g, ''));
}
