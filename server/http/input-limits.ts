import type { FieldFault } from '../../shared/errors/error-code';

const DEEPEST = 40;
const LONGEST_ARRAY = 10_000;
const MOST_VALUES = 200_000;

interface Place {
  value: unknown;
  path: string;
  depth: number;
}

/**
 * What no schema is asked to look at: text that PostgreSQL cannot keep (NUL, lone surrogates), nesting and lists
 * beyond any sense. Walks without recursion, so that a hostile body cannot exhaust the stack.
 */
export function findUnkeepable(body: unknown): FieldFault | undefined {
  const open: Place[] = [{ value: body, path: '', depth: 0 }];
  let seen = 0;
  for (let place = open.pop(); place !== undefined; place = open.pop()) {
    seen += 1;
    const message = faultOf(place, seen);
    if (message !== undefined) return { path: place.path, message };
    if (typeof place.value !== 'object' || place.value === null) continue;
    for (const [key, value] of Object.entries(place.value)) {
      if (isUnkeepableText(key))
        return { path: place.path, message: 'A field name holds characters that cannot be kept.' };
      open.push({ value, path: pathOf(place, key), depth: place.depth + 1 });
    }
  }
  return undefined;
}

function faultOf({ value, depth }: Place, seen: number): string | undefined {
  if (depth > DEEPEST) return `Nested deeper than ${DEEPEST} levels.`;
  if (seen > MOST_VALUES) return `More than ${MOST_VALUES} values.`;
  if (Array.isArray(value) && value.length > LONGEST_ARRAY) return `At most ${LONGEST_ARRAY} entries.`;
  if (typeof value === 'string' && isUnkeepableText(value)) return 'Remove the control or broken characters.';
  return undefined;
}

function isUnkeepableText(text: string): boolean {
  return text.includes('\0') || /\p{Surrogate}/u.test(text);
}

function pathOf({ value, path }: Place, key: string): string {
  if (Array.isArray(value)) return `${path}[${key}]`;
  return path === '' ? key : `${path}.${key}`;
}
