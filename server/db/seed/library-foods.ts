import type { FoodSpec } from '../../../shared/contract/foods';
import library from './library/foods.json';
import { provenanceOf, type LibraryProvenance } from './library-provenance';

interface LibraryFood {
  id: string;
  name: string;
  oxygen: {
    mode: string;
    limitMgPerKg: { default: number } | null;
    headspaceLimitPercent: { default: number } | null;
    rate: { constantMolPerKgSPa: number; temperatureC: number; activationEnergyKjPerMol: number } | null;
  };
  moisture: {
    isotherm: { XmGPerG: number; C: number; K: number } | null;
    initialGPerG: number | null;
    maxGPerG: number | null;
    minGPerG: number | null;
    insideRelativeHumidity: number | null;
  };
  cautions: { lowOxygenPackNeedsFoodSafetyPlan: boolean; texts: string[] };
  notes: string;
  provenance: LibraryProvenance;
}

const OXYGEN_MODES = ['at_once', 'none', 'rate'] as const;
const USUAL_MASS_KG = 0.2;
const LIMITS_CAUTION =
  'The limits are a place to start, not yours: many are recalled or worked back from how long packs are sold. Set your own.';
const SAFETY_CAUTION =
  'Do not design a low-oxygen pack for this food without a food-safety plan by a qualified process authority.';

/** The starting library of foods; their masses are those that the demo packs hold. */
export function libraryFoods(
  massesKg: Readonly<Record<string, number>>,
): { libraryId: string; spec: FoodSpec }[] {
  const foods: LibraryFood[] = library.foods;
  return foods.map((food) => ({
    libraryId: food.id,
    spec: specOf(food, massesKg[food.id] ?? USUAL_MASS_KG),
  }));
}

function specOf(food: LibraryFood, massKg: number): FoodSpec {
  const { texts, lowOxygenPackNeedsFoodSafetyPlan } = food.cautions;
  return {
    name: food.name,
    food: describe(food, massKg),
    limits: limitsOf(food),
    absorber_capacity_cm3_STP: 0,
    cautions: [...(lowOxygenPackNeedsFoodSafetyPlan ? [SAFETY_CAUTION] : []), ...texts, LIMITS_CAUTION],
    notes: food.notes,
    provenance: provenanceOf(food.provenance, library.sources),
  } as FoodSpec;
}

function describe({ id, oxygen, moisture }: LibraryFood, massKg: number) {
  const mode = OXYGEN_MODES.find((one) => one === oxygen.mode);
  if (!mode) throw new Error(`${id}: "${oxygen.mode}" is no oxygen mode.`);
  const { isotherm, initialGPerG, insideRelativeHumidity } = moisture;
  return {
    mass_kg: massKg,
    oxygen_mode: mode,
    ...(mode === 'rate' &&
      oxygen.rate && {
        rate_constant_mol_per_kg_s_Pa: oxygen.rate.constantMolPerKgSPa,
        rate_activation_energy_J_per_mol: oxygen.rate.activationEnergyKjPerMol * 1000,
        rate_reference_temperature_C: oxygen.rate.temperatureC,
      }),
    ...(isotherm && {
      isotherm: { type: 'GAB' as const, Xm_g_per_g: isotherm.XmGPerG, C: isotherm.C, K: isotherm.K },
    }),
    ...(isotherm && initialGPerG !== null && { initial_moisture_g_per_g: initialGPerG }),
    ...(insideRelativeHumidity !== null && { inside_relative_humidity: insideRelativeHumidity }),
  };
}

/** A food that takes up all oxygen at once never has any in its headspace: that limit would say nothing. */
function limitsOf({ oxygen, moisture }: LibraryFood): FoodSpec['limits'] {
  const headspaceLimit = oxygen.mode === 'at_once' ? null : oxygen.headspaceLimitPercent;
  return {
    ...(oxygen.limitMgPerKg && { oxygen_uptake_mg_per_kg: oxygen.limitMgPerKg.default }),
    ...(headspaceLimit && { headspace_oxygen_percent: headspaceLimit.default }),
    ...(moisture.isotherm && moisture.maxGPerG !== null && { moisture_max_g_per_g: moisture.maxGPerG }),
    ...(moisture.isotherm && moisture.minGPerG !== null && { moisture_min_g_per_g: moisture.minGPerG }),
  };
}
