import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { storage, type LimitName, type StorageDescription } from '../../shared/engine';

/** As coupled-routes.py writes them. */
interface Route {
  id: string;
  input: StorageDescription;
  expected: {
    limits: Partial<
      Record<
        LimitName,
        | { status: 'reached'; days: number; condition: number }
        | { status: 'not reached'; value_at_horizon: number }
      >
    >;
    courses: Record<string, number[]>;
  };
}

const { cases } = JSON.parse(
  readFileSync(path.join(__dirname, '..', 'reference', 'coupled-routes.json'), 'utf8'),
) as { cases: Route[] };

/** |d ln day / d ln value| beyond which a day tells of the value's last digits; −1: a step between legs. */
const MOST_CONDITION = 1e3;
const PROMISED = 1e-6;
/** Of a headspace, a moisture or an absorber: what is no more than rounding beside it. */
const NOTHING = 1e-9;

const off = (got: number, expected: number): number => Math.abs(got - expected) / Math.abs(expected);

describe('two hundred random coupled routes by scipy.integrate.solve_ivp (rtol 1e-10)', () => {
  const answers = cases.map((given) => ({ given, answer: storage(given.input) }));
  const crossings = answers.flatMap(({ given, answer }) =>
    Object.entries(given.expected.limits).map(([name, expected]) => ({
      id: `${given.id} ${name}`,
      expected,
      got: answer.limits[name as LimitName],
    })),
  );

  it('reach the same limits', () => {
    expect(cases).toHaveLength(200);
    expect(crossings.filter(({ expected, got }) => expected.status !== got?.status)).toEqual([]);
  });

  it('on the same days, to 1e-6', () => {
    const compared = crossings.flatMap(({ id, expected, got }) =>
      expected.status === 'reached' && got?.status === 'reached' && expected.condition <= MOST_CONDITION
        ? [{ id, expected: expected.days, got: got.days }]
        : [],
    );
    expect(compared.length).toBeGreaterThan(150);
    expect(
      compared.filter(({ expected, got }) =>
        expected === 0 ? got !== 0 : !(off(got, expected) <= PROMISED),
      ),
    ).toEqual([]);
  });

  it('and hold the same values, on given days and where a crossing is too badly conditioned for a day', () => {
    const ill = crossings.filter(
      ({ expected }) => expected.status === 'reached' && expected.condition > MOST_CONDITION,
    );
    expect(ill.length).toBeGreaterThan(5);
    const wrong = answers.flatMap(({ given, answer }) =>
      Object.entries(given.expected.courses).flatMap(([name, expected]) => {
        const got = (answer.courses as unknown as Record<string, number[]>)[name];
        return expected.flatMap((value, i) =>
          Math.abs(got[i] - value) <= PROMISED * Math.abs(value) + NOTHING
            ? []
            : [{ id: given.id, name, i, value, got: got[i] }],
        );
      }),
    );
    expect(wrong).toEqual([]);
    expect(
      crossings.filter(
        ({ expected, got }) =>
          expected.status === 'not reached' &&
          got?.status === 'not reached' &&
          !(
            Math.abs(got.value_at_horizon - expected.value_at_horizon) <=
            PROMISED * Math.abs(expected.value_at_horizon) + NOTHING
          ),
      ),
    ).toEqual([]);
  });
});
