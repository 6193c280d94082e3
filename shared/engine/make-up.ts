import { light, type Transmission } from './light';
import type { DefectsDescription } from './description/storage-description';
import { pouchArea, type PouchDescription } from './pouch';

/** A layer as the shop and the scales see it. Null: not known. */
export interface MakeUpLayer {
  material_name: string;
  polymer_family: string;
  kind: 'film' | 'coating' | 'foil';
  thickness_um: number;
  density_kg_per_m3: number | null;
  price_per_kg: number | null;
  price_per_m2: number | null;
  transmission_per_um?: Transmission;
  transmission?: Transmission;
  defects?: DefectsDescription;
}

export interface MakeUpWall {
  /** Film cut for one pack, seals and all. */
  cut_area_m2: number;
  layers: MakeUpLayer[];
}

export interface PackMakeUp {
  /** Of the first wall. */
  mass_g_per_m2: number | null;
  cut_area_m2: number;
  /** Of all walls. */
  mass_g_per_pack: number | null;
  mass_missing: string[];
  price_per_pack: number | null;
  price_missing: string[];
  /** Of the mass of all walls, the largest first. */
  family_shares: { family: string; share: number }[];
  /** Through the first wall. */
  light: Transmission | null;
  light_missing: string[];
}

/**
 * What one pack is made of: mass, price, families and light, plain sums over layers and walls.
 *
 * - Mass of a layer [g/m²]: density [kg/m³] · thickness [µm] · 10⁻³; of a coating with its own thickness.
 * - Price of a layer [per m²]: its price per m² where it has one (coatings); else price per kg · mass · 10⁻³.
 * - A pack's mass and price: the layers' times the area cut, over all walls. Waste beyond the cut is left out.
 * - Light: shared/engine/light.ts, through the first wall alone.
 *
 * What lacks a number makes the sum null and is named. Range: as the readers of the contract. Errors: InputError by
 * light. Cost: none to speak of.
 */
export function packMakeUp(walls: readonly [MakeUpWall, ...MakeUpWall[]]): PackMakeUp {
  const [own] = walls;
  const all = walls.flatMap(({ layers }) => layers);
  const massMissing = namesOf(all.filter((layer) => massGPerM2(layer) === null));
  const priceMissing = namesOf(all.filter((layer) => pricePerM2(layer) === null));
  const lightMissing = namesOf(own.layers.filter((layer) => !isLightKnown(layer)));
  return {
    mass_g_per_m2: own.layers.some((layer) => massGPerM2(layer) === null)
      ? null
      : sum(own.layers.map((layer) => massGPerM2(layer) ?? 0)),
    cut_area_m2: own.cut_area_m2,
    mass_g_per_pack: massMissing.length > 0 ? null : overPack(walls, massGPerM2),
    mass_missing: massMissing,
    price_per_pack: priceMissing.length > 0 ? null : overPack(walls, pricePerM2),
    price_missing: priceMissing,
    family_shares: massMissing.length > 0 ? [] : familyShares(walls),
    light: lightMissing.length > 0 ? null : light(own.layers),
    light_missing: lightMissing,
  };
}

/**
 * Film cut for a pouch [m²]: two faces of full width and height and the gusset's fold, seals included:
 * 2·W·H + 2·g·W. Trimmings are left out.
 */
export function pouchCutArea(pouch: PouchDescription): number {
  // Without its seals a pouch's area is the film it is cut from.
  const { width_mm, height_mm, gusset_depth_mm } = pouch;
  return pouchArea({ width_mm, height_mm, gusset_depth_mm }).area_m2;
}

function massGPerM2({ density_kg_per_m3, thickness_um }: MakeUpLayer): number | null {
  return density_kg_per_m3 === null ? null : density_kg_per_m3 * thickness_um * 1e-3;
}

function pricePerM2(layer: MakeUpLayer): number | null {
  if (layer.price_per_m2 !== null) return layer.price_per_m2;
  const massG = massGPerM2(layer);
  return layer.price_per_kg === null || massG === null ? null : layer.price_per_kg * massG * 1e-3;
}

function isLightKnown({ kind, transmission, transmission_per_um }: MakeUpLayer): boolean {
  return kind === 'foil' || transmission !== undefined || transmission_per_um !== undefined;
}

function overPack(walls: readonly MakeUpWall[], perM2: (layer: MakeUpLayer) => number | null): number {
  return sum(
    walls.map(({ cut_area_m2, layers }) => cut_area_m2 * sum(layers.map((layer) => perM2(layer) ?? 0))),
  );
}

function familyShares(walls: readonly MakeUpWall[]): PackMakeUp['family_shares'] {
  const masses = new Map<string, number>();
  for (const { cut_area_m2, layers } of walls) {
    for (const layer of layers) {
      const mass = (massGPerM2(layer) ?? 0) * cut_area_m2;
      masses.set(layer.polymer_family, (masses.get(layer.polymer_family) ?? 0) + mass);
    }
  }
  const total = sum([...masses.values()]);
  if (!(total > 0)) return [];
  return [...masses]
    .map(([family, mass]) => ({ family, share: mass / total }))
    .sort((one, other) => other.share - one.share);
}

function namesOf(layers: readonly MakeUpLayer[]): string[] {
  return [...new Set(layers.map((layer) => layer.material_name))];
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
