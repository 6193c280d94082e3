/**
 * RFC 8785 canonical JSON: keys sorted by UTF-16 code units, no spaces, numbers as ECMAScript prints them. The same
 * value always gives the same bytes. Refuses what JSON cannot say (NaN, infinities, lone surrogates) instead of
 * writing something else; keys whose value is undefined are left out, as JSON.stringify does.
 */
export function canonicalJson(value: unknown): string {
  if (value === null || typeof value === 'boolean') return String(value);
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) throw new TypeError(`${value} has no canonical JSON.`);
    return JSON.stringify(value);
  }
  if (typeof value === 'string') return canonicalString(value);
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`;
  if (typeof value === 'object') {
    const members = Object.entries(value)
      .filter(([, member]) => member !== undefined)
      .sort(([one], [other]) => (one < other ? -1 : 1))
      .map(([key, member]) => `${canonicalString(key)}:${canonicalJson(member)}`);
    return `{${members.join(',')}}`;
  }
  throw new TypeError(`A ${typeof value} has no canonical JSON.`);
}

function canonicalString(text: string): string {
  if (/\p{Surrogate}/u.test(text)) throw new TypeError('A lone surrogate has no canonical JSON.');
  return JSON.stringify(text);
}
