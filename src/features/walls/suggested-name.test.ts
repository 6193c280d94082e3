import { describe, expect, it } from 'vitest';
import { shortMaterialName, suggestedName } from './suggested-name';

const film = (name: string, polymer_family = '') => ({ name, kind: 'film' as const, polymer_family });

describe('suggestedName', () => {
  const layers = [
    { material: film('PET'), thicknessUm: 12 },
    { material: film('EVOH 32 mol% ethylene', 'EVOH'), thicknessUm: 5 },
    { material: film('LDPE film', 'PE'), thicknessUm: 50 },
  ];

  it('names materials and gauges, outside first', () => {
    expect(suggestedName(layers, 'metric')).toBe('PET 12 / EVOH 5 / LDPE 50');
    expect(suggestedName(layers, 'us_customary')).toBe('PET 0.472 / EVOH 0.197 / LDPE 1.97');
  });

  it('leaves out a coating’s thickness and a gauge that is no number', () => {
    const coating = { name: 'Metallisation on BOPET', kind: 'coating' as const, polymer_family: 'aluminium' };
    expect(
      suggestedName(
        [
          { material: coating, thicknessUm: 0.03 },
          { material: film('LDPE film'), thicknessUm: NaN },
        ],
        'metric',
      ),
    ).toBe('Metallisation / LDPE');
  });

  it('stays within what a name may hold', () => {
    const many = Array.from({ length: 50 }, () => layers[0]!);
    expect(suggestedName(many, 'metric')).toBe('PET 12 / … 48 more / PET 12');
  });
});

describe('shortMaterialName', () => {
  it('drops the gauge that a foil carries in its name', () => {
    expect(shortMaterialName({ name: 'Aluminium foil 7 µm', kind: 'foil', polymer_family: '' })).toBe(
      'Aluminium foil',
    );
  });
});
