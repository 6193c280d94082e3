import {
  InputError,
  saturationPressurePa,
  standardTests,
  wallInTest,
  wallState,
  type LayerDescription,
  type WallInTest,
  type WallState,
} from '../../../shared/engine';

/** The air on both sides of a wall, as the person chose it. */
export interface SidesOfWall {
  temperature_C: number;
  relative_humidity_outside: number;
  relative_humidity_inside: number;
}

/** Data sheets state oxygen at 23 °C and 50 % on both sides: the product's usual condition too. */
export const USUAL_SIDES: SidesOfWall = {
  temperature_C: 23,
  relative_humidity_outside: 0.5,
  relative_humidity_inside: 0.5,
};

const OXYGEN_IN_DRY_AIR = 0.2095;
const ATMOSPHERE_PA = 101_325;

export interface WallPreview {
  /** At the standard test conditions, in their order. */
  tests: WallInTest[];
  /** Air outside, no oxygen inside. */
  chosen: WallState;
}

/** What a wall answers, by the engine that the server uses. Null where something in it cannot be computed with. */
export function wallPreview(layers: LayerDescription[], sides: SidesOfWall): WallPreview | null {
  if (layers.length === 0) return null;
  try {
    return {
      tests: standardTests.map((test) => wallInTest(layers, test)),
      chosen: stateBetween(layers, sides),
    };
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}

export function stateBetween(layers: LayerDescription[], sides: SidesOfWall): WallState {
  const vapourPa = sides.relative_humidity_outside * saturationPressurePa(sides.temperature_C);
  return wallState(layers, {
    ...sides,
    oxygen_pressure_outside_Pa: OXYGEN_IN_DRY_AIR * (ATMOSPHERE_PA - vapourPa),
    oxygen_pressure_inside_Pa: 0,
  });
}
