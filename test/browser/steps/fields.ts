import type { Locator, Page } from 'playwright-core';

type Scope = Page | Locator;

/** A field by its label, marked optional or not. */
export function field(scope: Scope, label: string): Locator {
  // A form may be called as its only field is.
  const controls = scope.locator('input, select, textarea');
  return scope.getByLabel(new RegExp(`^${escaped(label)}( · optional)?$`)).and(controls);
}

/** Types into each field, by label. */
export async function fillFields(scope: Scope, textByLabel: Record<string, string>): Promise<void> {
  for (const [label, text] of Object.entries(textByLabel)) await field(scope, label).fill(text);
}

/** A part of the page that has a heading. */
export function sheet(page: Page, title: string): Locator {
  return page.getByRole('group', { name: title, exact: true });
}

/** What is read there, its no-break spaces as plain ones. */
export async function shownText(place: Locator): Promise<string> {
  return (await place.innerText()).replace(/\u00a0/g, ' ');
}

/** One of a few, all in sight. */
export function choice(scope: Scope, group: string, option: string): Locator {
  return scope.getByRole('radiogroup', { name: group }).getByRole('radio', { name: option, exact: true });
}

function escaped(text: string): string {
  return text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
}
