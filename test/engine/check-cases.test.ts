import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { compare, readCheckCases, runCase, type Mismatch } from '../reference/check-case-adaptor';

const read = (name: string): ReturnType<typeof readCheckCases> =>
  readCheckCases(readFileSync(path.join(__dirname, '..', 'reference', name), 'utf8'));

describe('the check cases but those of section 10', () => {
  const file = read('check-cases.json');
  const ours = file.cases.filter((given) => given.section !== '10');

  it('are all there', () => {
    expect(ours).toHaveLength(49);
  });

  it.each(ours.map((given) => [`${given.id} ${given.description}`, given] as const))('%s', (_name, given) => {
    expect(runCase(given, file.atol_by_key)).toEqual({ status: 'passed' });
  });

  it('leaves the fits for later', () => {
    const later = file.cases.filter((given) => given.section === '10');
    expect(later.map((given) => runCase(given, file.atol_by_key).status)).toEqual(later.map(() => 'skipped'));
  });
});

describe('cases worked by a second method (second-method.py)', () => {
  const file = read('second-method.json');

  it.each(file.cases.map((given) => [`${given.id} ${given.description}`, given] as const))(
    '%s',
    (_name, given) => {
      expect(runCase(given, file.atol_by_key)).toEqual({ status: 'passed' });
    },
  );

  it('agree to 1e-8, far within what is promised', () => {
    const off = file.cases.filter((given) => runCase({ ...given, rtol: 1e-8 }, {}).status !== 'passed');
    expect(off.map((given) => given.id)).toEqual([]);
  });
});

describe('the comparison', () => {
  const compared = (expected: unknown, got: unknown, atolByKey: Record<string, number> = {}): Mismatch[] => {
    const mismatches: Mismatch[] = [];
    compare(expected, got, { path: '', atol: null, rtol: 1e-6, atolByKey }, mismatches);
    return mismatches;
  };

  it('takes the tolerance of the nearest enclosing key', () => {
    expect(compared({ days: { a: { b: 0 } } }, { days: { a: { b: 1e-7 } } }, { days: 1e-6 })).toEqual([]);
    expect(compared({ days: { a: 0 } }, { days: { a: 1e-7 } }, { days: 1e-6, a: 1e-9 })).toHaveLength(1);
    expect(compared({ days: 0 }, { days: 1e-7 })).toHaveLength(1);
  });

  it('wants every expected key, the same length and equal words', () => {
    expect(compared({ a: null }, {})).toHaveLength(1);
    expect(compared({ a: null }, { a: null, b: 1 })).toEqual([]);
    expect(compared([1, 2], [1, 2, 3])).toHaveLength(1);
    expect(compared('reached', 'not reached')).toHaveLength(1);
    expect(compared(1, Number.NaN)).toHaveLength(1);
  });

  it('counts a refusal that was not expected, and one that was missed, as failures', () => {
    const bad = { calculation: 'saturation', temperature_C: [70] };
    const good = { calculation: 'saturation', temperature_C: [20] };
    const base = { id: 'x', section: '2', rtol: 1e-6 };
    expect(runCase({ ...base, input: bad, expected: { pressure_Pa: [1] } }, {}).status).toBe('failed');
    expect(runCase({ ...base, input: good, expected: { error: true } }, {}).status).toBe('failed');
    expect(runCase({ ...base, input: { calculation: 'layer' }, expected: { error: true } }, {}).status).toBe(
      'passed',
    );
    expect(runCase({ ...base, input: { calculation: 'tea' }, expected: {} }, {}).status).toBe('failed');
  });
});
