import { describe, expect, it } from 'vitest';
import library from '../../server/db/seed/library/materials.json';
import { circular, predict, predictable, type PublishedStructure } from './published-structures';
import { readTrustSection, readTrustTable } from './readme-section';
import { multilayerRows, ratioTo, structureRows, verdictOn } from './structure-rows';

/** Rates from which the coatings of a wall were worked out, in the gas of the structure. */
function derivedFrom({ layers, gas }: PublishedStructure): number[] {
  return layers.flatMap(([libraryId]) => {
    const material = library.materials.find(({ id }) => id === libraryId);
    const rates: Partial<Record<string, unknown>> = material?.derivation ?? {};
    const keys =
      gas === 'oxygen' ? ['filmOxygenRate', 'laminateOxygenRate'] : ['filmWaterRate', 'laminateWaterRate'];
    return keys.map((key) => rates[key]).filter((rate): rate is number => typeof rate === 'number');
  });
}

const isDerivedFromIt = (one: PublishedStructure): boolean =>
  derivedFrom(one).some((rate) => Math.abs(rate / one.high - 1) < 0.005);

describe('published structures predicted from single-film values', () => {
  it('stand in the README with the numbers the engine gives today', () => {
    expect(readTrustTable('structure')).toEqual(structureRows());
    expect(readTrustTable('multilayer, gauges ours')).toEqual(multilayerRows());
  });

  it('are at least five, none of them the source of the value that predicts it', () => {
    const independent = predictable.filter(({ basis }) => basis === 'independent');
    expect(new Set(independent.map(({ layers }) => JSON.stringify(layers))).size).toBeGreaterThanOrEqual(5);
    for (const one of independent)
      expect([one.name, one.gas, isDerivedFromIt(one)]).toEqual([one.name, one.gas, false]);
    for (const one of predictable) if (one.basis === 'partly') expect(isDerivedFromIt(one)).toBe(true);
  });

  it('leave out what is circular: the engine merely gives it back', () => {
    for (const one of circular) {
      expect([one.name, one.gas, isDerivedFromIt(one)]).toEqual([one.name, one.gas, true]);
      expect(predict(one).rate / one.high, `${one.name}, ${one.gas}`).toBeCloseTo(1, 1);
    }
    expect(readTrustSection().replace(/\s+/g, ' ')).toContain(
      `${circular.length} published rates are left out`,
    );
  });

  it('are counted by verdict in the README', () => {
    const verdicts = structureRows().map((row) => row.at(-1));
    const count = (verdict: string) => verdicts.filter((one) => one === verdict).length;
    expect(readTrustSection().replace(/\s+/g, ' ')).toContain(
      `${count('good')} good, ${count('fair')} fair, ${count('bad')} bad`,
    );
  });

  it('are judged by a factor either way', () => {
    expect([1, 1.5, 1 / 1.5, 1.6, 3, 3.1, 0.3].map(verdictOn)).toEqual([
      'good',
      'good',
      'good',
      'fair',
      'fair',
      'bad',
      'bad',
    ]);
    expect(ratioTo({ low: 2, high: 4 }, 3)).toBe(1);
    expect(ratioTo({ low: 2, high: 4 }, 8)).toBe(2);
    expect(ratioTo({ low: 2, high: 4 }, 1)).toBe(0.5);
  });
});
