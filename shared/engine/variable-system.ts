import { InputError } from './description/input-error';
import { LIMIT_NAMES } from './description/read-storage';
import type { LimitName } from './description/storage-description';
import type { Layer } from './layer';
import type { StorageSystem } from './storage-system';

/**
 * One input of a study by its name: wall_area:W, layer_thickness:W:L, layer_oxygen:W:L, layer_water:W:L (the layer's
 * permeability or permeance), food_mass (initial moisture kept), limit:NAME, leg_relative_humidity:I,
 * starting_headspace_oxygen; W, L and I count from 0.
 */
export type InputName = string;

/** An input that has been found in a system. */
export type Input =
  | { kind: 'wall_area'; wall: number }
  | { kind: 'layer_thickness' | 'layer_oxygen' | 'layer_water'; wall: number; layer: number }
  | { kind: 'food_mass' | 'starting_headspace_oxygen' }
  | { kind: 'limit'; limit: LimitName }
  | { kind: 'leg_relative_humidity'; leg: number };

const INPUT_KINDS =
  'wall_area:W, layer_thickness:W:L, layer_oxygen:W:L, layer_water:W:L, food_mass, limit:NAME, ' +
  'leg_relative_humidity:I and starting_headspace_oxygen';

/** Finds an input in a system. Errors: InputError where there is none of that name. */
export function readInput(name: unknown, path: string, system: StorageSystem): Input {
  const refuse = (why: string): InputError => new InputError(path, name ?? null, why);
  if (typeof name !== 'string') throw refuse(`Name an input: ${INPUT_KINDS}.`);
  const [kind, ...places] = name.split(':');
  const place = (at: number, count: number, label: string): number => {
    const text = places[at] ?? '';
    const index = /^\d+$/.test(text) ? Number(text) : -1;
    if (index < 0 || index >= count) {
      throw refuse(`"${name}": ${label} "${text}" is not there; they count from 0 to ${count - 1}.`);
    }
    return index;
  };
  const wants = (count: number): void => {
    if (places.length !== count) throw refuse(`"${name}" is no input; use ${INPUT_KINDS}.`);
  };
  const { walls } = system.pack;
  switch (kind) {
    case 'wall_area':
      wants(1);
      return { kind, wall: place(0, walls.length, 'wall') };
    case 'layer_thickness':
    case 'layer_oxygen':
    case 'layer_water': {
      wants(2);
      const wall = place(0, walls.length, 'wall');
      const layer = place(1, walls[wall].layers.length, 'layer');
      if (kind !== 'layer_thickness' && walls[wall].layers[layer].kind === 'foil') {
        throw refuse(`"${name}": nothing passes the metal of a foil; vary its thickness or its neighbours.`);
      }
      return { kind, wall, layer };
    }
    case 'food_mass':
    case 'starting_headspace_oxygen':
      wants(0);
      return { kind };
    case 'limit': {
      wants(1);
      return { kind, limit: readLimit(places[0], path, system) };
    }
    case 'leg_relative_humidity':
      wants(1);
      return { kind, leg: place(0, system.legs.length, 'leg') };
    default:
      throw refuse(`"${name}" is no input; use ${INPUT_KINDS}.`);
  }
}

/** A limit the system has. Errors: InputError. */
export function readLimit(name: unknown, path: string, system: StorageSystem): LimitName {
  const given = LIMIT_NAMES.filter((limit) => system.limits[limit] !== undefined);
  const found = given.find((limit) => limit === name);
  if (found === undefined) {
    throw new InputError(
      path,
      name ?? null,
      given.length > 0
        ? `"${String(name)}" is not among the limits given; use ${given.join(', ')}.`
        : 'The description sets no limit; give one.',
    );
  }
  return found;
}

/**
 * A system whose inputs can be moved about and put back, without reading its description again. `system` is always
 * the present state; what hangs on it (conditions, walls) is made anew by each run.
 */
export class VariableSystem {
  readonly system: StorageSystem;
  private readonly base: StorageSystem;

  constructor(base: StorageSystem) {
    this.base = base;
    this.system = {
      ...base,
      pack: {
        ...base.pack,
        walls: base.pack.walls.map((wall) => ({ ...wall, layers: wall.layers.map(ownLayer) })),
      },
      food: { ...base.food },
      legs: base.legs.map((leg) => ({ ...leg })),
      limits: { ...base.limits },
    };
  }

  /** Everything back to where it began. */
  reset(): void {
    const { system, base } = this;
    system.pack.startingOxygenFraction = base.pack.startingOxygenFraction;
    system.pack.walls.forEach((wall, w) => {
      const from = base.pack.walls[w];
      wall.areaM2 = from.areaM2;
      for (let l = 0; l < wall.layers.length; l++) {
        const layer = wall.layers[l];
        const before = from.layers[l];
        layer.thicknessM = before.thicknessM;
        if (layer.oxygen && before.oxygen) {
          layer.oxygen.permeanceSi = before.oxygen.permeanceSi;
          layer.oxygen.activationEnergyJPerMol = before.oxygen.activationEnergyJPerMol;
        }
        if (layer.water && before.water) {
          layer.water.permeanceSi = before.water.permeanceSi;
          layer.water.activationEnergyJPerMol = before.water.activationEnergyJPerMol;
        }
      }
    });
    system.food.massKg = base.food.massKg;
    system.legs.forEach((leg, i) => {
      leg.humidity = base.legs[i].humidity;
      leg.temperatureK = base.legs[i].temperatureK;
    });
    Object.assign(system.limits, base.limits);
  }

  /** The input's present value, in SI. */
  valueOf(input: Input): number {
    const { system } = this;
    switch (input.kind) {
      case 'wall_area':
        return system.pack.walls[input.wall].areaM2;
      case 'layer_thickness':
        return this.layerOf(input).thicknessM;
      case 'layer_oxygen':
        return this.layerOf(input).oxygen?.permeanceSi ?? 0;
      case 'layer_water':
        return this.layerOf(input).water?.permeanceSi ?? 0;
      case 'food_mass':
        return system.food.massKg;
      case 'starting_headspace_oxygen':
        return system.pack.startingOxygenFraction;
      case 'limit':
        return system.limits[input.limit] ?? 0;
      case 'leg_relative_humidity':
        return system.legs[input.leg].humidity;
    }
  }

  /** Multiplies an input; a humidity or a fraction of oxygen stays within 0 to 1. Gives the factor that came of it. */
  scale(input: Input, factor: number): number {
    const { system } = this;
    switch (input.kind) {
      case 'wall_area':
        system.pack.walls[input.wall].areaM2 *= factor;
        return factor;
      case 'layer_thickness':
        thicken(this.layerOf(input), factor);
        return factor;
      case 'layer_oxygen':
      case 'layer_water': {
        const layer = this.layerOf(input);
        const gas = input.kind === 'layer_oxygen' ? layer.oxygen : layer.water;
        if (gas) gas.permeanceSi *= factor;
        return factor;
      }
      case 'food_mass':
        system.food.massKg *= factor;
        // The limit is per mass of food.
        if (system.limits.oxygen_uptake_mg_per_kg !== undefined) {
          system.limits.oxygen_uptake_mg_per_kg *= factor;
        }
        return factor;
      case 'starting_headspace_oxygen': {
        const before = system.pack.startingOxygenFraction;
        system.pack.startingOxygenFraction = Math.min(1, before * factor);
        return before > 0 ? system.pack.startingOxygenFraction / before : 1;
      }
      case 'limit':
        system.limits[input.limit] = (system.limits[input.limit] ?? 0) * factor;
        return factor;
      case 'leg_relative_humidity': {
        const leg = system.legs[input.leg];
        const before = leg.humidity;
        leg.humidity = Math.min(1, before * factor);
        return before > 0 ? leg.humidity / before : 1;
      }
    }
  }

  layerOf(input: { wall: number; layer: number }): Layer {
    return this.system.pack.walls[input.wall].layers[input.layer];
  }
}

/** A film's permeance goes down with its thickness; a coating's and a foil's do not. */
export function thicken(layer: Layer, factor: number): void {
  layer.thicknessM *= factor;
  if (layer.kind !== 'film') return;
  if (layer.oxygen) layer.oxygen.permeanceSi /= factor;
  if (layer.water) layer.water.permeanceSi /= factor;
}

function ownLayer(layer: Layer): Layer {
  return {
    ...layer,
    oxygen: layer.oxygen ? { ...layer.oxygen } : null,
    water: layer.water ? { ...layer.water } : null,
  };
}
