import { channelConductance, diffusivityInAir, OXYGEN_IN_AIR_20C, WATER_IN_AIR_20C } from './hole';
import type { Layer } from './layer';
import { WallAtTemperature } from './wall-at-temperature';

export interface Wall {
  name: string;
  areaM2: number;
  layers: Layer[];
}

/** A seal is one film as thick as the seal is wide, its area the sealant's thickness times the seal's length. */
export interface Seal {
  areaM2: number;
  film: Layer;
}

export interface Leaks {
  count: number;
  lengthM: number;
  diameterM: number;
}

export interface Pack {
  walls: Wall[];
  seal: Seal | null;
  leaks: Leaks | null;
  headspaceM3: number;
  startingOxygenFraction: number;
  /** On every wall's permeance to that gas, not on seal and leaks; 1 but in a search for a specification. */
  oxygenFactor: number;
  waterFactor: number;
}

/**
 * A pack's conductances at one temperature [mol/(s·Pa)]: K = Σ Q·A + K_seal + K_leak, for each gas.
 * Cost: that of its walls; constant conductances are worked out once.
 */
export class PackAtTemperature {
  readonly walls: WallAtTemperature[];
  readonly areas: Float64Array;
  readonly seal: WallAtTemperature | null;
  readonly sealAreaM2: number;
  readonly leaksOxygen: number;
  readonly leaksWater: number;
  /** Whether the conductance to that gas depends on the humidities. */
  readonly isWaterHumid: boolean;
  readonly isOxygenHumid: boolean;
  /** Results of the last `conduct`. */
  water = 0;
  oxygen = 0;
  private isConstantKnown = false;
  private readonly oxygenFactor: number;
  private readonly waterFactor: number;

  constructor(pack: Pack, temperatureK: number, fluxTolerance = 0) {
    this.walls = pack.walls.map((wall) => new WallAtTemperature(wall.layers, temperatureK, fluxTolerance));
    this.areas = Float64Array.from(pack.walls, (wall) => wall.areaM2);
    this.oxygenFactor = pack.oxygenFactor;
    this.waterFactor = pack.waterFactor;
    this.seal = pack.seal ? new WallAtTemperature([pack.seal.film], temperatureK, fluxTolerance) : null;
    this.sealAreaM2 = pack.seal ? pack.seal.areaM2 : 0;
    const leaks = pack.leaks ?? { count: 0, lengthM: 1, diameterM: 1 };
    this.leaksOxygen = channelConductance(
      leaks,
      diffusivityInAir(OXYGEN_IN_AIR_20C, temperatureK),
      temperatureK,
    );
    this.leaksWater = channelConductance(
      leaks,
      diffusivityInAir(WATER_IN_AIR_20C, temperatureK),
      temperatureK,
    );
    const all = this.seal ? [...this.walls, this.seal] : this.walls;
    this.isWaterHumid = all.some((wall) => wall.isWaterHumid);
    this.isOxygenHumid = all.some((wall) => wall.isOxygenHumid);
  }

  /** Conductances between two humidities; `difference` as in WallAtTemperature.solve. */
  conduct(outside: number, inside: number, difference: number = outside - inside): void {
    if (this.isConstantKnown) return;
    let water = 0;
    let oxygen = 0;
    for (let i = 0; i < this.walls.length; i++) {
      const wall = this.walls[i];
      wall.solve(outside, inside, difference);
      water += wall.waterPermeance * this.areas[i];
      oxygen += wall.oxygenPermeance * this.areas[i];
    }
    water = water * this.waterFactor + this.leaksWater;
    oxygen = oxygen * this.oxygenFactor + this.leaksOxygen;
    if (this.seal) {
      this.seal.solve(outside, inside, difference);
      water += this.seal.waterPermeance * this.sealAreaM2;
      oxygen += this.seal.oxygenPermeance * this.sealAreaM2;
    }
    this.water = water;
    this.oxygen = oxygen;
    this.isConstantKnown = !this.isWaterHumid && !this.isOxygenHumid;
  }

  /** Wall problems solved so far, over all walls. */
  solutions(): number {
    return this.walls.reduce((sum, wall) => sum + wall.solutions, this.seal ? this.seal.solutions : 0);
  }
}
