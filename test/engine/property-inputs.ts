import * as fc from 'fast-check';
import type { FilmDescription, LayerDescription } from '../../shared/engine';
import { coatingOf } from './descriptions';

/** What the engine's properties are tried on. */
export const number = (min: number, max: number): fc.Arbitrary<number> =>
  fc.double({ min, max, noNaN: true });

/** Evenly spread over decades. */
export const decades = (min: number, max: number): fc.Arbitrary<number> =>
  number(min, max).map((power) => 10 ** power);

/** Humidities as people give them, to four digits. */
export const humidity = fc.integer({ min: 0, max: 10_000 }).map((step) => step / 10_000);

export const curve = fc.uniqueArray(humidity, { minLength: 1, maxLength: 6 }).chain((points) =>
  fc.array(decades(-2, 2), { minLength: points.length, maxLength: points.length }).map((factor) => ({
    relative_humidity: [...points].sort((a, b) => a - b),
    factor,
  })),
);

const gas = (low: number, high: number) =>
  fc.record({
    permeability_mol_m_per_m2_s_Pa: decades(low, high),
    activation_energy_J_per_mol: number(-20_000, 60_000),
    reference_relative_humidity: humidity,
    humidity_curve: fc.option(curve, { nil: undefined }),
  });

export const film: fc.Arbitrary<FilmDescription> = fc.record({
  kind: fc.constant('film' as const),
  name: fc.constant('film'),
  thickness_um: decades(-1, 3),
  oxygen: gas(-20, -15),
  water: gas(-15, -12),
});

export const layers = fc.array(film, { minLength: 1, maxLength: 6 });

export const conditions = fc.record({
  temperature_C: number(-30, 60),
  relative_humidity_outside: humidity,
  relative_humidity_inside: humidity,
  oxygen_pressure_outside_Pa: number(0, 21_000),
  oxygen_pressure_inside_Pa: number(0, 21_000),
});

const plainGas = (low: number, high: number) =>
  fc.record({
    permeability_mol_m_per_m2_s_Pa: decades(low, high),
    activation_energy_J_per_mol: number(0, 60_000),
  });

/** Layers that humidity leaves alone. */
export const plainLayers: fc.Arbitrary<LayerDescription[]> = fc.array(
  fc.oneof(
    fc.record({
      kind: fc.constant('film' as const),
      name: fc.constant('film'),
      thickness_um: decades(0, 2.5),
      oxygen: plainGas(-19, -16),
      water: plainGas(-15, -13),
    }),
    decades(-14, -12).map((permeance) => coatingOf(permeance) as LayerDescription),
  ),
  { minLength: 1, maxLength: 5 },
);

export const near = (a: number, b: number, tolerance: number): boolean =>
  Math.abs(a - b) <= tolerance * Math.max(Math.abs(a), Math.abs(b));
