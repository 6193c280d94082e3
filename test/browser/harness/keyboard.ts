import type { Page } from 'playwright-core';

/** What has the focus, as a screen reader would name it. */
interface Focused {
  role: string;
  name: string;
}

export interface TabTarget {
  role: 'textbox' | 'searchbox' | 'combobox' | 'button' | 'link' | 'radio' | 'checkbox' | 'region';
  name: string | RegExp;
}

const MOST_STOPS = 250;

/**
 * Presses Tab, or Shift+Tab, until the focus stands on the target; fails where the page has no such stop. Nothing
 * is focused but by these keys.
 */
export async function tabTo(page: Page, target: TabTarget, { isBackwards = false } = {}): Promise<void> {
  const seen: string[] = [];
  for (let stop = 0; stop <= MOST_STOPS; stop += 1) {
    const focused = await focusedElement(page);
    if (fits(focused, target)) return;
    seen.push(`${focused.role} "${focused.name}"`);
    await page.keyboard.press(isBackwards ? 'Shift+Tab' : 'Tab');
  }
  const stops = [...new Set(seen)].join('\n  ');
  throw new Error(`No Tab leads to ${target.role} ${String(target.name)}. The stops are:\n  ${stops}`);
}

function fits(focused: Focused, { role, name }: TabTarget): boolean {
  if (focused.role !== role) return false;
  return typeof name === 'string' ? focused.name === name : name.test(focused.name);
}

/** Whether the browser draws a ring round what has the focus. */
export async function hasVisibleFocus(page: Page): Promise<boolean> {
  return page.evaluate(() => {
    const active = document.activeElement;
    if (active === null || active === document.body) return false;
    const { outlineStyle, outlineWidth } = getComputedStyle(active);
    return outlineStyle !== 'none' && parseFloat(outlineWidth) > 0;
  });
}

/** Replaces what stands in the field that has the focus. */
export async function typeOver(page: Page, text: string): Promise<void> {
  await page.keyboard.press('Control+A');
  await page.keyboard.type(text);
}

/** Chooses in the list that has the focus, as its type-ahead does. */
export async function typeChoice(page: Page, text: string): Promise<void> {
  await page.keyboard.type(text);
  // The list takes what is typed within a second for one word; leaving it ends that.
  await page.keyboard.press('Tab');
}

/** Role and name as the page declares them: label, aria-label, aria-labelledby or the text inside. */
async function focusedElement(page: Page): Promise<Focused> {
  return page.evaluate(() => {
    const active = document.activeElement;
    if (active === null || active === document.body) return { role: 'none', name: '' };
    const tidy = (text: string | null | undefined) => (text ?? '').replace(/\s+/g, ' ').trim();
    const type = active.getAttribute('type') ?? 'text';
    const isTextBox = active.tagName === 'TEXTAREA' || active.tagName === 'INPUT';
    const ofTag = active.tagName === 'A' ? 'link' : active.tagName === 'SELECT' ? 'combobox' : 'none';
    const ofInput = type === 'search' ? 'searchbox' : type === 'checkbox' ? 'checkbox' : 'textbox';
    const role = active.getAttribute('role') ?? (isTextBox ? ofInput : ofTag);
    const labelledBy = (active.getAttribute('aria-labelledby') ?? '')
      .split(' ')
      .map((id) => tidy(document.getElementById(id)?.textContent))
      .join(' ')
      .trim();
    const labels =
      active instanceof HTMLInputElement ||
      active instanceof HTMLSelectElement ||
      active instanceof HTMLTextAreaElement
        ? [...(active.labels ?? [])].map((label) => tidy(label.textContent)).join(' ')
        : '';
    const name = tidy(active.getAttribute('aria-label')) || labelledBy || labels || tidy(active.textContent);
    return { role, name };
  });
}
