import canonicalize from 'canonicalize';
import * as fc from 'fast-check';
import { expect, it } from 'vitest';
import { canonicalJson } from './canonical-json';

it('writes the example of RFC 8785, section 3.2.2', () => {
  const value = {
    numbers: [333333333.33333329, 1e30, 4.5, 2e-3, 0.000000000000000000000000001],
    string: '\u20ac$\u000f\nA\'B"\\\\"/',
    literals: [null, true, false],
  };
  expect(canonicalJson(value)).toBe(
    String.raw`{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\u000f\nA'B\"\\\\\"/"}`,
  );
});

it('agrees with another implementation', () => {
  fc.assert(
    fc.property(fc.jsonValue(), (value) => {
      expect(canonicalJson(value)).toBe(canonicalize(value));
    }),
    { seed: 8785 },
  );
});

it('sorts by UTF-16 code units and leaves undefined out', () => {
  expect(canonicalJson({ '\u{1f600}': 1, '\ufb33': 2, b: undefined, a: 0 })).toBe(
    '{"a":0,"\u{1f600}":1,"\ufb33":2}',
  );
});

it('refuses what JSON cannot say', () => {
  for (const value of [NaN, Infinity, '\ud800', { '\udfff': 1 }, undefined, 1n]) {
    expect(() => canonicalJson(value)).toThrow(TypeError);
  }
});
