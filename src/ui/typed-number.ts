/** What people type for a number: digits, one decimal point or comma, a sign, a power of ten. */
const TYPED_NUMBER = /^[+-]?(\d+([.,]\d*)?|[.,]\d+)(e[+-]?\d+)?$/i;

/**
 * undefined for nothing typed, NaN for what is no number, so that a schema can tell "enter a number" from a value out
 * of range. A decimal comma counts as a point; with both in one text it is not guessed which is which.
 */
export function parseTypedNumber(text: string): number | undefined {
  const compact = text.replace(/[\s\u00A0\u202F]/g, '').replace(/\u2212/g, '-');
  if (compact === '') return undefined;
  if (!TYPED_NUMBER.test(compact)) return Number.NaN;
  return Number(compact.replace(',', '.'));
}

/** The text after one step up or down; a text that is no number stays as it is. */
export function stepTypedNumber(
  text: string,
  step: number,
  bounds: { min?: number; max?: number } = {},
): string {
  const parsed = parseTypedNumber(text) ?? 0;
  if (Number.isNaN(parsed)) return text;
  // Twelve digits hide what binary fractions leave behind: 0.1 + 0.2.
  const stepped = Number((parsed + step).toPrecision(12));
  const bounded = Math.min(Math.max(stepped, bounds.min ?? -Infinity), bounds.max ?? Infinity);
  const usesComma = text.includes(',');
  return usesComma ? String(bounded).replace('.', ',') : String(bounded);
}
