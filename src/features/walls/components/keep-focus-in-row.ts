const FOCUSABLE = 'input, [role="button"], button, a[href]';

/** A row that is moved takes the focus out of what was pressed in it; gives it back once the row stands anew. */
export function keepFocusInRow(rowId: string): void {
  const row = document.getElementById(rowId);
  const active = document.activeElement;
  if (row === null || !(active instanceof HTMLElement) || !row.contains(active)) return;
  const position = [...row.querySelectorAll(FOCUSABLE)].indexOf(active);
  requestAnimationFrame(() => {
    if (row.contains(document.activeElement)) return;
    const target = row.querySelectorAll<HTMLElement>(FOCUSABLE)[position];
    target?.focus();
  });
}
