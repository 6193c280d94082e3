import { expect, it } from 'vitest';
import { safeNext } from './safe-next';

it.each([
  [undefined, '/'],
  ['', '/'],
  ['/a/haselhof/studies', '/a/haselhof/studies'],
  ['//elsewhere.example', '/'],
  ['https://elsewhere.example', '/'],
  ['/a//elsewhere.example', '/'],
  ['/a/\\elsewhere.example', '/'],
  ['/sign-in', '/'],
])('leads %j to %s', (next, href) => {
  expect(safeNext(next)).toBe(href);
});
