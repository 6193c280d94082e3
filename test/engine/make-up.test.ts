import { describe, expect, it } from 'vitest';
import { packMakeUp, pouchCutArea, type MakeUpLayer } from '../../shared/engine';

const PET: MakeUpLayer = {
  material_name: 'PET',
  polymer_family: 'PET',
  kind: 'film',
  thickness_um: 12,
  density_kg_per_m3: 1395,
  price_per_kg: 2.3,
  price_per_m2: null,
  transmission_per_um: { uv_350nm: 0.986, visible_550nm: 0.999 },
};
const METAL: MakeUpLayer = {
  material_name: 'Metallisation',
  polymer_family: 'aluminium',
  kind: 'coating',
  thickness_um: 0.04,
  density_kg_per_m3: 2700,
  price_per_kg: null,
  price_per_m2: 0.018,
  transmission: { uv_350nm: 0.005, visible_550nm: 0.005 },
};
const GLUE: MakeUpLayer = {
  material_name: 'Adhesive',
  polymer_family: 'PU',
  kind: 'film',
  thickness_um: 2.5,
  density_kg_per_m3: 1150,
  price_per_kg: 4.8,
  price_per_m2: null,
  transmission_per_um: { uv_350nm: 0.97, visible_550nm: 0.995 },
};
const PE: MakeUpLayer = {
  material_name: 'PE',
  polymer_family: 'PE',
  kind: 'film',
  thickness_um: 60,
  density_kg_per_m3: 918,
  price_per_kg: 1.75,
  price_per_m2: null,
  transmission_per_um: { uv_350nm: 0.9985, visible_550nm: 0.999 },
};
const POUCH = {
  width_mm: 160,
  height_mm: 230,
  seal_left_mm: 8,
  seal_right_mm: 8,
  seal_top_mm: 12,
  gusset_depth_mm: 40,
};

describe('what a pack is made of', () => {
  it('is the film cut for it, seals and all', () => {
    // By hand: two faces 2 · 0.160 · 0.230 = 0.0736 m²; gusset 2 · 0.040 · 0.160 = 0.0128 m².
    expect(pouchCutArea(POUCH)).toBeCloseTo(0.0864, 12);
  });

  it('agrees with a hand calculation of a metallised pouch', () => {
    // Mass per m², by hand: PET 12 µm · 1395 kg/m³ = 16.74 g; metal 0.04 µm · 2700 = 0.108 g;
    // adhesive 2.5 µm · 1150 = 2.875 g; PE 60 µm · 918 = 55.08 g. Together 74.803 g/m².
    // Of one pouch of 0.0864 m²: 74.803 · 0.0864 = 6.4629792 g.
    // Price per m², by hand: PET 0.01674 kg · 2.30 = 0.038502; metal 0.018 as priced by area;
    // adhesive 0.002875 kg · 4.80 = 0.0138; PE 0.05508 kg · 1.75 = 0.09639. Together 0.166692 per m².
    // Of one pouch: 0.166692 · 0.0864 = 0.0144021888.
    // Shares of mass: PE 55.08 / 74.803 = 0.736334; PET 16.74 / 74.803 = 0.223788;
    // PU 2.875 / 74.803 = 0.038434; aluminium 0.108 / 74.803 = 0.001444.
    // Light, visible: 0.999^12 · 0.005 · 0.995^2.5 · 0.999^60 = 0.988066 · 0.005 · 0.987547 · 0.941736 = 0.00459455;
    // ultraviolet: 0.986^12 · 0.005 · 0.97^2.5 · 0.9985^60
    // 0.844351 · 0.005 · 0.926679 · 0.913869 = 0.00357525.
    const made = packMakeUp([{ cut_area_m2: 0.0864, layers: [PET, METAL, GLUE, PE] }]);
    expect(made.mass_g_per_m2).toBeCloseTo(74.803, 9);
    expect(made.mass_g_per_pack).toBeCloseTo(6.4629792, 9);
    expect(made.price_per_pack).toBeCloseTo(0.0144021888, 12);
    expect(made.family_shares.map(({ family }) => family)).toEqual(['PE', 'PET', 'PU', 'aluminium']);
    const shares = [0.736334, 0.223788, 0.038434, 0.001444];
    made.family_shares.forEach(({ share }, i) => expect(share).toBeCloseTo(shares[i] ?? NaN, 6));
    expect(made.light?.visible_550nm).toBeCloseTo(0.00459455, 7);
    expect(made.light?.uv_350nm).toBeCloseTo(0.00357525, 7);
    expect([made.mass_missing, made.price_missing, made.light_missing]).toEqual([[], [], []]);
  });

  it('adds lid and tray of a tray, and shows the lid’s own wall', () => {
    // By hand: lid 0.02 m² of PE 60 (55.08 g/m²) is 1.1016 g; tray 0.05 m² of PET 300 µm · 1395 (418.5 g/m²) is
    // 20.925 g; together 22.0266 g. Price: 1.1016 g · 1.75/kg = 0.0019278; 20.925 g · 2.30/kg = 0.0481275.
    const made = packMakeUp([
      { cut_area_m2: 0.02, layers: [PE] },
      { cut_area_m2: 0.05, layers: [{ ...PET, thickness_um: 300 }] },
    ]);
    expect(made.mass_g_per_m2).toBeCloseTo(55.08, 9);
    expect(made.cut_area_m2).toBe(0.02);
    expect(made.mass_g_per_pack).toBeCloseTo(22.0266, 9);
    expect(made.price_per_pack).toBeCloseTo(0.0500553, 12);
    expect(made.family_shares[0]?.share).toBeCloseTo(20.925 / 22.0266, 12);
    expect(made.light?.visible_550nm).toBeCloseTo(0.999 ** 60, 12);
  });

  it('lets light through a foil by its pinholes alone', () => {
    const foil: MakeUpLayer = {
      ...METAL,
      kind: 'foil',
      thickness_um: 7,
      transmission: undefined,
      defects: { density_per_m2: 100, diameter_um: 25 },
    };
    // By hand: 100 · π · (12.5·10⁻⁶)² = 4.9087·10⁻⁸.
    const made = packMakeUp([{ cut_area_m2: 1, layers: [foil] }]);
    expect(made.light?.visible_550nm).toBeCloseTo(4.9087e-8, 11);
    expect(made.light?.visible_550nm).toBeGreaterThan(4.9e-8);
  });

  it('names what is missing instead of counting it as nothing', () => {
    const unknown: MakeUpLayer = {
      ...PE,
      material_name: 'New film',
      density_kg_per_m3: null,
      transmission_per_um: undefined,
    };
    const made = packMakeUp([{ cut_area_m2: 0.1, layers: [PET, unknown, unknown] }]);
    expect(made).toMatchObject({
      mass_g_per_m2: null,
      mass_g_per_pack: null,
      mass_missing: ['New film'],
      price_per_pack: null,
      price_missing: ['New film'],
      family_shares: [],
      light: null,
      light_missing: ['New film'],
    });
    const priceless = packMakeUp([{ cut_area_m2: 0.1, layers: [{ ...PET, price_per_kg: null }] }]);
    expect(priceless).toMatchObject({ price_per_pack: null, price_missing: ['PET'], mass_missing: [] });
  });
});
