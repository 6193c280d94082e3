import { describe, expect, it } from 'vitest';
import { heldAgainstPublished, quantitiesWithRange, type Held } from './held-against';
import { libraryFilmIds } from './library-layers';
import { outsideRanges } from './outside-ranges';
import { publishedRanges, QUANTITIES, withoutRange } from './published-ranges';
import { readTrustSection } from './readme-section';

const held = heldAgainstPublished();
const outside = held.filter(({ isInside }) => !isInside);
const keyOf = ({ film, quantity, source }: Pick<Held, 'film' | 'quantity' | 'source'>) =>
  `${film}, ${quantity}, ${source}`;

describe('the films of the library at 25 µm', () => {
  it('lie inside the published ranges but for those listed, by the factor listed', () => {
    const listed = outsideRanges.flatMap(({ film, quantities, source, times }) =>
      quantities.map((quantity, index) => [keyOf({ film, quantity, source }), times[index]?.toFixed(2)]),
    );
    expect(new Map(outside.map((one) => [keyOf(one), one.timesNearestEnd.toFixed(2)]))).toEqual(
      new Map(listed.map(([key = '', times]) => [key, times])),
    );
    expect(listed).toHaveLength(outside.length);
  });

  it('each have a range or a reason for having none, never both', () => {
    const ids = libraryFilmIds();
    expect(ids.length).toBeGreaterThan(0);
    for (const id of [...Object.keys(publishedRanges), ...Object.keys(withoutRange)])
      expect(ids).toContain(id);
    for (const film of ids) {
      const withRange = quantitiesWithRange(film);
      for (const quantity of QUANTITIES) {
        const reason = withoutRange[film]?.[quantity];
        expect({ film, quantity, isExplained: reason !== undefined }).toEqual({
          film,
          quantity,
          isExplained: !withRange.includes(quantity),
        });
      }
    }
  });

  it('come with a reason wherever they are listed', () => {
    for (const { film, reason } of outsideRanges) expect(reason.length, film).toBeGreaterThan(30);
    for (const [film, reasons] of Object.entries(withoutRange))
      for (const reason of Object.values(reasons)) expect(reason.length, film).toBeGreaterThan(30);
  });

  it('are counted in the README as they are', () => {
    const own = held.filter(({ isOwnSource }) => isOwnSource);
    const others = held.filter(({ isOwnSource }) => !isOwnSource);
    const insideOthers = others.filter(({ isInside }) => isInside);
    const uncovered = libraryFilmIds().filter((film) => quantitiesWithRange(film).length === 0);
    const text = readTrustSection().replace(/\s+/g, ' ');
    expect(own.filter(({ isInside }) => !isInside)).toEqual([]);
    expect(text).toContain(
      `${libraryFilmIds().length} films give ${held.length} comparisons, ${held.length - outside.length} inside. ` +
        `${own.length} of them are with the source the value was taken from and cannot fail; of the other ` +
        `${others.length}, ${insideOthers.length} lie inside.`,
    );
    const furthestBelow = Math.min(...outside.map(({ timesNearestEnd }) => timesNearestEnd));
    const furthestAbove = Math.max(...outside.map(({ timesNearestEnd }) => timesNearestEnd));
    expect(text).toContain(`nylon's (water ${furthestBelow.toFixed(2)},`);
    expect(text).toContain(`(oxygen ${furthestAbove.toFixed(1)} times`);
    expect(text).toContain(`The ${outside.length} outside`);
    expect(text).toContain(`${uncovered.length} films have no published range`);
  });
});
