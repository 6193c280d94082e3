import type { FoodSpec } from '../../../shared/contract/foods';
import type { LaminateSpec } from '../../../shared/contract/laminates';
import type { MaterialSpec, StatedValue } from '../../../shared/contract/materials';
import type { PackSpec } from '../../../shared/contract/packs';
import type { RouteSpec } from '../../../shared/contract/routes';
import type { StudySpec } from '../../../shared/contract/studies';
import { gasFromStated } from '../../../shared/engine';

/** Specs with a default for everything; what a test is about it says itself. */

type FilmSpec = Extract<MaterialSpec, { kind: 'film' }>;

/** A polyethylene-like film, so that its numbers follow from what it states. */
export function aFilm(changes: Partial<FilmSpec> = {}): FilmSpec {
  const oxygen = { value: 177_165, unit: 'cm3(STP)*um/(m2*day*atm)', temperature_C: 23 } as StatedValue;
  const water = {
    value: 467,
    unit: 'g*um/(m2*day)',
    temperature_C: 38,
    relative_humidity_high: 0.9,
    relative_humidity_low: 0,
  } as StatedValue;
  return {
    name: 'A film',
    material_class: 'polyolefin',
    polymer_family: 'PE',
    typical_gauges_um: [50],
    density_kg_per_m3: 920,
    price_per_kg: 1.5,
    price_per_m2: null,
    notes: '',
    provenance: [],
    kind: 'film',
    oxygen: { stated: oxygen, gas: gasFromStated({ ...oxygen, gas: 'oxygen', kind: 'film' }) },
    water: { stated: water, gas: gasFromStated({ ...water, gas: 'water', kind: 'film' }) },
    ...changes,
  };
}

interface MaterialReference {
  id: string;
  revisionId: string;
}

export function aLaminate(
  materials: readonly MaterialReference[],
  { name = 'A wall', thicknessUm = 50 }: { name?: string; thicknessUm?: number } = {},
): LaminateSpec {
  return {
    name,
    layers: materials.map((material) => ({
      material_id: material.id,
      material_revision_id: material.revisionId,
      thickness_um: thicknessUm,
    })),
  };
}

export function aPack(changes: Partial<PackSpec> = {}): PackSpec {
  return {
    name: 'A pouch',
    form: {
      type: 'pouch',
      width_mm: 160,
      height_mm: 230,
      seal_left_mm: 8,
      seal_right_mm: 8,
      seal_top_mm: 12,
      seal_bottom_mm: 0,
      gusset_depth_mm: 40,
    },
    headspace_cm3: 120,
    starting_headspace_oxygen_percent: 0.5,
    has_seal_path: true,
    leaks: null,
    ...changes,
  };
}

export function aFood(changes: Partial<FoodSpec> = {}): FoodSpec {
  return {
    name: 'A dry food',
    food: {
      mass_kg: 0.2,
      oxygen_mode: 'at_once',
      isotherm: { type: 'GAB', Xm_g_per_g: 0.0275, C: 10, K: 0.918 },
      initial_moisture_g_per_g: 0.02,
    },
    limits: { oxygen_uptake_mg_per_kg: 40, moisture_max_g_per_g: 0.0371 },
    absorber_capacity_cm3_STP: 0,
    cautions: [],
    notes: '',
    provenance: [],
    ...changes,
  } as FoodSpec;
}

export function aRoute(changes: Partial<RouteSpec> = {}): RouteSpec {
  return {
    name: 'A shelf',
    route: {
      legs: [{ name: 'Shelf', temperature_C: 23, relative_humidity: 0.5, days: 365 }],
      after_last: 'hold',
    },
    horizon_days: 730,
    notes: '',
    provenance: [],
    ...changes,
  };
}

interface StudyParts {
  foodId: string;
  packId: string;
  routeId: string;
  laminateIds: string[];
}

export function aStudy(
  { foodId, packId, routeId, laminateIds }: StudyParts,
  { name = 'A study', targetDays = 180 }: { name?: string; targetDays?: number } = {},
): StudySpec {
  return {
    name,
    food_id: foodId,
    pack_id: packId,
    route_id: routeId,
    laminate_ids: laminateIds,
    target_days: targetDays,
    notes: '',
  };
}
