import {
  MATERIAL_CLASSES,
  type CoatingLight,
  type CoatingMaterialSpec,
  type FilmLight,
  type FilmMaterialSpec,
  type MaterialSpec,
  type StatedValue,
} from '../../../shared/contract/materials';
import { gasFromStated, type HumidityCurveDescription, type StatedGas } from '../../../shared/engine';
import library from './library/materials.json';
import { provenanceOf, type LibraryProvenance } from './library-provenance';

interface LibraryGas {
  value: number;
  unit: string;
  temperatureC: number;
  relativeHumidity: number | null;
  rhHigh?: number;
  rhLow?: number;
  activationEnergyKjPerMol: number | null;
  measuredRangeC: number[] | null;
  humidityCurve: number[][] | null;
  geometricSd: number | null;
}

interface LibraryLight {
  uvPerUm?: number;
  visiblePerUm?: number;
  uv?: number;
  visible?: number;
}

interface LibraryMaterial {
  id: string;
  name: string;
  class: string;
  kind: string;
  polymerFamily: string;
  typicalGaugesUm: number[];
  densityKgPerM3: number | null;
  oxygen: LibraryGas | null;
  water: LibraryGas | null;
  pinholes?: { densityPerM2: number; diameterUm: number } | null;
  priceEurPerKg: number | null;
  priceEurPerM2: number | null;
  light: LibraryLight | null;
  notes: string;
  provenance: LibraryProvenance;
}

/** The starting library, by its own ids. Every number is typical, none a specification. */
export function libraryMaterials(): { libraryId: string; spec: MaterialSpec }[] {
  const materials: LibraryMaterial[] = library.materials;
  return materials.map((material) => ({ libraryId: material.id, spec: specOf(material) }));
}

function specOf(material: LibraryMaterial): MaterialSpec {
  const materialClass = MATERIAL_CLASSES.find((one) => one === material.class);
  if (!materialClass) throw new Error(`${material.id}: "${material.class}" is no class.`);
  const common = {
    name: material.name,
    material_class: materialClass,
    polymer_family: material.polymerFamily,
    typical_gauges_um: material.typicalGaugesUm,
    density_kg_per_m3: material.densityKgPerM3,
    price_per_kg: material.priceEurPerKg,
    price_per_m2: material.priceEurPerM2,
    notes: material.notes,
    provenance: provenanceOf(material.provenance, library.sources),
  };
  const { pinholes } = material;
  const hasHoles = (pinholes?.densityPerM2 ?? 0) > 0;
  const defects =
    pinholes && hasHoles ? { density_per_m2: pinholes.densityPerM2, diameter_um: pinholes.diameterUm } : null;
  if (material.kind === 'foil') return { ...common, kind: 'foil', defects };
  if (!material.oxygen || !material.water)
    throw new Error(`${material.id}: a ${material.kind} needs both gases.`);
  return material.kind === 'film'
    ? { ...common, kind: 'film', ...filmGases(material.oxygen, material.water), light: filmLight(material) }
    : {
        ...common,
        kind: 'coating',
        ...coatingGases(material.oxygen, material.water),
        defects,
        light: wholeLight(material),
      };
}

function filmLight(material: LibraryMaterial): FilmLight | null {
  const { uvPerUm, visiblePerUm } = material.light ?? {};
  if (uvPerUm === undefined || visiblePerUm === undefined) return wholeLight(material);
  return { per_um: { uv_350nm: uvPerUm, visible_550nm: visiblePerUm } };
}

function wholeLight({ light }: LibraryMaterial): CoatingLight | null {
  const { uv, visible } = light ?? {};
  if (uv === undefined || visible === undefined) return null;
  return { whole: { uv_350nm: uv, visible_550nm: visible } };
}

function filmGases(oxygen: LibraryGas, water: LibraryGas): Pick<FilmMaterialSpec, 'oxygen' | 'water'> {
  const gasOf = (gas: 'oxygen' | 'water', one: LibraryGas) => {
    const stated = statedOf(one);
    return { stated, gas: gasFromStated({ ...engineStated(stated), gas, kind: 'film' }), ...spread(one) };
  };
  return { oxygen: gasOf('oxygen', oxygen), water: gasOf('water', water) };
}

function coatingGases(oxygen: LibraryGas, water: LibraryGas): Pick<CoatingMaterialSpec, 'oxygen' | 'water'> {
  const gasOf = (gas: 'oxygen' | 'water', one: LibraryGas) => {
    const stated = statedOf(one);
    return { stated, gas: gasFromStated({ ...engineStated(stated), gas, kind: 'coating' }), ...spread(one) };
  };
  return { oxygen: gasOf('oxygen', oxygen), water: gasOf('water', water) };
}

function spread({ geometricSd }: LibraryGas): { geometric_sd?: number } {
  return geometricSd === null ? {} : { geometric_sd: geometricSd };
}

function statedOf(gas: LibraryGas): StatedValue {
  const { activationEnergyKjPerMol, measuredRangeC, relativeHumidity } = gas;
  return {
    value: gas.value,
    unit: gas.unit,
    temperature_C: gas.temperatureC,
    ...(relativeHumidity !== null && { relative_humidity: relativeHumidity }),
    ...(gas.rhHigh !== undefined && {
      relative_humidity_high: gas.rhHigh,
      relative_humidity_low: gas.rhLow ?? 0,
    }),
    ...(activationEnergyKjPerMol !== null && {
      activation_energy_J_per_mol: activationEnergyKjPerMol * 1000,
    }),
    ...(measuredRangeC && {
      measured_temperature_min_C: measuredRangeC[0],
      measured_temperature_max_C: measuredRangeC[1],
    }),
    ...(gas.humidityCurve && { humidity_curve: curveOf(gas.humidityCurve) }),
  } as StatedValue;
}

function curveOf(points: number[][]): HumidityCurveDescription {
  return {
    relative_humidity: points.map(([humidity = 0]) => humidity),
    factor: points.map(([, factor = 1]) => factor),
  };
}

function engineStated({ oxygen_mole_fraction_dry, ...rest }: StatedValue): Omit<StatedGas, 'gas' | 'kind'> {
  return { ...rest, gas_mole_fraction_dry: oxygen_mole_fraction_dry };
}
