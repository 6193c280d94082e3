import type { Pack, Seal, Leaks, Wall } from '../pack-at-temperature';
import { layerOf } from '../layer';
import { InputError } from './input-error';
import {
  AREA_M2,
  COATING_THICKNESS_UM,
  HEADSPACE_CM3,
  HOLE_DIAMETER_UM,
  LEAK_COUNT,
  LENGTH_MM,
  PERCENT,
  THICKNESS_UM,
  WALL_COUNT,
} from './ranges';
import { readGas, readLayers } from './read-layer';
import { readList, readNumber, readObject, readOptional } from './read-number';
import type {
  LeaksDescription,
  PackDescription,
  SealDescription,
  WallDescription,
} from './storage-description';

/** A pack in SI. Errors: InputError with the path in the description. */
export function readPack(value: unknown, path: string): Pack {
  const pack = readObject<PackDescription>(value, path, 'Pack');
  const walls = readList<WallDescription>(pack.walls, `${path}.walls`, {
    range: WALL_COUNT,
    label: 'Walls of a pack',
  });
  const headspaceCm3 = readOptional(pack.headspace_cm3, `${path}.headspace_cm3`, {
    range: HEADSPACE_CM3,
    label: 'Headspace',
    unit: 'cm³',
    otherwise: 0,
  });
  const startingPercent = readOptional(
    pack.starting_headspace_oxygen_percent,
    `${path}.starting_headspace_oxygen_percent`,
    { range: PERCENT, label: 'Oxygen in the headspace at packing', unit: '%', otherwise: 0 },
  );
  return {
    walls: walls.map((wall, i) => readWall(wall, `${path}.walls[${i}]`)),
    headspaceM3: headspaceCm3 * 1e-6,
    startingOxygenFraction: startingPercent / 100,
    oxygenFactor: 1,
    waterFactor: 1,
    seal: readSeal(pack.seal, `${path}.seal`),
    leaks: readLeaks(pack.leaks, `${path}.leaks`),
  };
}

function readWall(value: unknown, path: string): Wall {
  const wall = readObject<WallDescription>(value, path, 'Wall');
  return {
    name: typeof wall.name === 'string' && wall.name !== '' ? wall.name : 'wall',
    areaM2: readNumber(wall.area_m2, `${path}.area_m2`, { range: AREA_M2, label: 'Area', unit: 'm²' }),
    layers: readLayers(wall.layers, `${path}.layers`),
  };
}

function readSeal(value: unknown, path: string): Seal | null {
  if (value === undefined || value === null) return null;
  const seal = readObject<SealDescription>(value, path, 'Seal');
  const sealantUm = readNumber(seal.sealant_thickness_um, `${path}.sealant_thickness_um`, {
    range: COATING_THICKNESS_UM,
    label: 'Sealant thickness',
    unit: 'µm',
  });
  const lengthMm = readNumber(seal.length_mm, `${path}.length_mm`, {
    range: { ...LENGTH_MM, isMinExcluded: false },
    label: 'Seal length',
    unit: 'mm',
  });
  const widthMm = readNumber(seal.width_mm, `${path}.width_mm`, {
    range: LENGTH_MM,
    label: 'Seal width',
    unit: 'mm',
  });
  const thicknessM = widthMm * 1e-3;
  if (thicknessM * 1e6 < THICKNESS_UM.min) {
    throw new InputError(`${path}.width_mm`, widthMm, 'The seal is too narrow to compute with; widen it.');
  }
  return {
    areaM2: sealantUm * 1e-6 * lengthMm * 1e-3,
    film: layerOf({
      kind: 'film',
      name: 'seal',
      thicknessM,
      oxygen: readGas(seal.oxygen, `${path}.oxygen`, { isFilm: true, thicknessM }),
      water: readGas(seal.water, `${path}.water`, { isFilm: true, thicknessM }),
      defects: null,
    }),
  };
}

function readLeaks(value: unknown, path: string): Leaks | null {
  if (value === undefined || value === null) return null;
  const leaks = readObject<LeaksDescription>(value, path, 'Leaks');
  return {
    count: readNumber(leaks.count, `${path}.count`, { range: LEAK_COUNT, label: 'Leak channels' }),
    lengthM:
      readNumber(leaks.length_mm, `${path}.length_mm`, {
        range: LENGTH_MM,
        label: 'Length of a leak',
        unit: 'mm',
      }) * 1e-3,
    diameterM:
      readNumber(leaks.diameter_um, `${path}.diameter_um`, {
        range: HOLE_DIAMETER_UM,
        label: 'Diameter of a leak',
        unit: 'µm',
      }) * 1e-6,
  };
}
