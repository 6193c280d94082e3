import { describe, expect, it } from 'vitest';
import { MATERIAL_CLASSES } from '../../shared/contract/materials';
import { HATCHES, hatchMarks, hatchOf } from '../../shared/charts/hatching';

const CARD_HEIGHT_PX = 12;

describe('hatching', () => {
  it('knows every class of the material library', () => {
    const unknown = MATERIAL_CLASSES.filter((materialClass) => hatchOf({ materialClass }) === 'other');
    expect(unknown).toEqual([]);
  });

  it('tells the polyolefins apart by family, or by name where the family is not known', () => {
    expect(hatchOf({ materialClass: 'polyolefin', polymerFamily: 'PP' })).toBe('polypropylene');
    expect(hatchOf({ materialClass: 'polyolefin', polymerFamily: 'PE', name: 'PE on BOPP' })).toBe(
      'polyethylene',
    );
    expect(hatchOf({ materialClass: 'polyolefin', name: 'BOPP film' })).toBe('polypropylene');
    expect(hatchOf({ materialClass: 'polyolefin', name: 'Cast polypropylene (CPP)' })).toBe('polypropylene');
    expect(hatchOf({ materialClass: 'polyolefin', name: 'LDPE film' })).toBe('polyethylene');
    expect(hatchOf({ materialClass: 'cellulose', name: 'Paper, uncoated' })).toBe('paper');
  });

  it('draws every hatch differently at 12 px high', () => {
    const rect = { x: 0, y: 0, width: 40, height: CARD_HEIGHT_PX };
    const drawn = HATCHES.map((hatch) => JSON.stringify(hatchMarks(hatch, rect, 0.7)));
    expect(new Set(drawn).size).toBe(HATCHES.length);
  });

  it('keeps every mark inside its layer', () => {
    const rect = { x: 100, y: 50, width: 17, height: 80 };
    for (const hatch of HATCHES) {
      const numbers =
        hatchMarks(hatch, rect)
          .lines.match(/-?[\d.]+/g)
          ?.map(Number) ?? [];
      numbers.forEach((value, index) => {
        const [from, to] = index % 2 === 0 ? [100, 117] : [50, 130];
        expect(value).toBeGreaterThanOrEqual(from - 0.01);
        expect(value).toBeLessThanOrEqual(to + 0.01);
      });
    }
  });
});
