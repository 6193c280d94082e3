import { expect, it } from 'vitest';
import { newId } from './new-id';

it('makes UUIDv7 that rise, also many within a millisecond and when the clock goes back', () => {
  const ids = Array.from({ length: 10_000 }, () => newId(1_800_000_000_000));
  ids.push(newId(1_700_000_000_000));
  expect(ids).toEqual(ids.toSorted());
  expect(new Set(ids).size).toBe(ids.length);
  for (const id of ids)
    expect(id).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
  expect(ids[0]).toMatch(/^01a3185c-5000-7000-/);
});
