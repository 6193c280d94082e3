import { describe, expect, it } from 'vitest';
import { foodSpecSchema } from '../../../shared/contract/foods';
import { materialSpecSchema } from '../../../shared/contract/materials';
import { routeSpecSchema } from '../../../shared/contract/routes';
import { wallInTest, type LayerDescription, type TransmissionTest } from '../../../shared/engine';
import { fromSi } from '../../../shared/units';
import { demoAccount, demoLaminates, demoMassesKg, demoStudies } from './demo-account';
import { demoMaterialSpecs } from './demo-materials';
import { demoPeople } from './demo-people';
import { libraryFoods } from './library-foods';
import { libraryMaterials } from './library-materials';
import { libraryRoutes } from './library-routes';

const STRICT = { strict: true, abortEarly: false } as const;
const materials = libraryMaterials();

describe('the library', () => {
  it('knows the light of everything but foil, which passes it by its pinholes', () => {
    for (const { libraryId, spec } of materials) {
      if (spec.kind !== 'foil') expect(spec.light, libraryId).not.toBeNull();
    }
    const ofId = (id: string) => materials.find((material) => material.libraryId === id)?.spec;
    expect(ofId('bopet')).toMatchObject({ light: { per_um: { uv_350nm: 0.986, visible_550nm: 0.999 } } });
    expect(ofId('ink')).toMatchObject({ light: { whole: { uv_350nm: 0.4, visible_550nm: 0.55 } } });
    expect(ofId('siox-on-bopet')).toMatchObject({
      light: { whole: { uv_350nm: 0.75, visible_550nm: 0.96 } },
    });
  });

  it('fits the contract', () => {
    expect(materials).toHaveLength(49);
    for (const { spec } of materials) materialSpecSchema.validateSync(spec, STRICT);
    for (const { spec } of libraryFoods(demoMassesKg)) foodSpecSchema.validateSync(spec, STRICT);
    for (const { spec } of libraryRoutes()) routeSpecSchema.validateSync(spec, STRICT);
    expect(libraryRoutes().length).toBe(19);
  });

  it.each(
    materials
      .filter(({ spec }) => spec.kind !== 'foil')
      .map((material) => [material.libraryId, material.spec]),
  )('gives the stated rates of %s back when their tests are computed', (_id, spec) => {
    if (spec.kind === 'foil') throw new Error('A foil has no rates.');
    // A film of 1 µm, so that its rate is the stated rate times thickness.
    const layer: LayerDescription =
      spec.kind === 'film'
        ? { kind: 'film', name: 'it', thickness_um: 1, oxygen: spec.oxygen.gas, water: spec.water.gas }
        : { kind: 'coating', name: 'it', oxygen: spec.oxygen.gas, water: spec.water.gas };
    const oxygen = spec.oxygen.stated;
    const humidity = oxygen.relative_humidity ?? 0;
    const inOxygen = wallInTest([layer], {
      gas: 'oxygen',
      temperature_C: oxygen.temperature_C,
      relative_humidity_outside: humidity,
      relative_humidity_inside: humidity,
      oxygen_mole_fraction_dry: 1,
    } satisfies TransmissionTest);
    expect(fromSi(inOxygen.permeance_mol_per_m2_s_Pa, 'cm3(STP)/(m2*day*atm)') / oxygen.value).toBeCloseTo(
      1,
      6,
    );
    const water = spec.water.stated;
    const inWater = wallInTest([layer], {
      gas: 'water',
      temperature_C: water.temperature_C,
      relative_humidity_high: water.relative_humidity_high ?? NaN,
      relative_humidity_low: water.relative_humidity_low ?? NaN,
    } satisfies TransmissionTest);
    expect((inWater.rate_g_per_m2_day ?? NaN) / water.value).toBeCloseTo(1, 4);
  });
});

describe('the demo', () => {
  it('has people of every role, at example addresses, with passwords of 12 characters', () => {
    expect(demoPeople.map((person) => person.role)).toEqual([
      'engineer',
      'admin',
      'supplier',
      'client',
      'engineer and admin',
    ]);
    for (const { email, password } of demoPeople) {
      expect(email).toMatch(/\.example$/);
      expect(password.length).toBeGreaterThanOrEqual(12);
    }
    expect(demoAccount.companies).toHaveLength(3);
  });

  it('builds its walls from the library and its studies from its walls', () => {
    const ids = new Set([
      ...materials.map((material) => material.libraryId),
      ...demoMaterialSpecs().map(({ key }) => key),
    ]);
    for (const { layers } of demoLaminates) for (const [id] of layers) expect(ids).toContain(id);
    expect(demoStudies.length).toBeGreaterThanOrEqual(6);
    for (const { laminates } of demoStudies) {
      expect(laminates.length).toBeGreaterThanOrEqual(2);
      expect(laminates.length).toBeLessThanOrEqual(4);
    }
    for (const { spec } of demoMaterialSpecs()) materialSpecSchema.validateSync(spec, STRICT);
  });
});
