import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  layerAt,
  timeLag,
  wallState,
  type FilmDescription,
  type LayerDescription,
} from '../../shared/engine';
import { relativeFlux } from '../../shared/engine/transient';
import { polyester, polyethylene, vinylAlcohol } from './descriptions';
import { conditions, decades, film, humidity, layers, near, number, plainLayers } from './property-inputs';

const RUNS = { numRuns: 1000 };

const thicker = (layer: LayerDescription, factor: number): LayerDescription =>
  layer.kind === 'film' ? { ...layer, thickness_um: layer.thickness_um * factor } : layer;

describe('more of a layer', () => {
  it('never lowers a resistance, to either gas, where nothing feels humidity', () => {
    fc.assert(
      fc.property(plainLayers, fc.nat(4), number(1, 50), conditions, (wall, which, factor, at) => {
        const index = which % wall.length;
        const before = wallState(wall, at);
        const after = wallState(
          wall.map((layer, i) => (i === index ? thicker(layer, factor) : layer)),
          at,
        );
        for (const gas of ['oxygen', 'water'] as const) {
          expect(after[gas].permeance_mol_per_m2_s_Pa).toBeLessThanOrEqual(
            before[gas].permeance_mol_per_m2_s_Pa * (1 + 1e-12),
          );
        }
      }),
      RUNS,
    );
  });

  it('can make a humidity-sensitive wall worse: sealant behind a barrier that moist air outside softens', () => {
    // With moist air outside and dry food inside, more sealant keeps the water in the barrier, and oxygen passes more
    // easily. The sealant's own resistance to oxygen is small beside the barrier's.
    fc.assert(
      fc.property(
        number(0.8, 1),
        number(0, 0.3),
        number(5, 40),
        number(1.5, 10),
        (out, inside, um, factor) => {
          const at = {
            temperature_C: 23,
            relative_humidity_outside: out,
            relative_humidity_inside: inside,
            oxygen_pressure_outside_Pa: 21_000,
            oxygen_pressure_inside_Pa: 0,
          };
          const wall = (sealant: number): LayerDescription[] => [
            { ...polyester, thickness_um: 12 },
            vinylAlcohol,
            { ...polyethylene, thickness_um: sealant },
          ];
          expect(wallState(wall(um * factor), at).oxygen.permeance_mol_per_m2_s_Pa).toBeGreaterThan(
            wallState(wall(um), at).oxygen.permeance_mol_per_m2_s_Pa,
          );
        },
      ),
      RUNS,
    );
  });
});

describe('a wall', () => {
  it('dry on both sides sees its curves only through f(0)/f(h_ref)', () => {
    fc.assert(
      fc.property(layers, number(-30, 60), (wall, temperature) => {
        const at = {
          temperature_C: temperature,
          relative_humidity_outside: 0,
          relative_humidity_inside: 0,
          oxygen_pressure_outside_Pa: 21_000,
          oxygen_pressure_inside_Pa: 0,
        };
        const flat = wall.map((layer): FilmDescription => {
          const dry = layerAt(layer, { temperature_C: temperature, relative_humidity: 0 });
          const gas = (key: 'oxygen' | 'water'): FilmDescription['oxygen'] => ({
            permeability_mol_m_per_m2_s_Pa: dry[key].permeability_mol_m_per_m2_s_Pa ?? Number.NaN,
            reference_temperature_C: temperature,
          });
          return { ...layer, oxygen: gas('oxygen'), water: gas('water') };
        });
        const curved = wallState(wall, at);
        const straight = wallState(flat, at);
        for (const gas of ['oxygen', 'water'] as const) {
          expect(
            near(curved[gas].permeance_mol_per_m2_s_Pa, straight[gas].permeance_mol_per_m2_s_Pa, 1e-12),
          ).toBe(true);
        }
      }),
      RUNS,
    );
  });

  it('turned round twice is what it was', () => {
    fc.assert(
      fc.property(layers, conditions, (wall, at) => {
        expect(wallState([...[...wall].reverse()].reverse(), at)).toEqual(wallState(wall, at));
      }),
      RUNS,
    );
  });

  it('passes as many times more as its permeabilities are multiplied', () => {
    fc.assert(
      fc.property(layers, conditions, decades(-2, 2), (wall, at, factor) => {
        const scaled = wall.map((layer) => ({
          ...layer,
          oxygen: {
            ...layer.oxygen,
            permeability_mol_m_per_m2_s_Pa: layer.oxygen.permeability_mol_m_per_m2_s_Pa * factor,
          },
          water: {
            ...layer.water,
            permeability_mol_m_per_m2_s_Pa: layer.water.permeability_mol_m_per_m2_s_Pa * factor,
          },
        }));
        const one = wallState(wall, at);
        const other = wallState(scaled, at);
        for (const gas of ['oxygen', 'water'] as const) {
          expect(
            near(
              other[gas].permeance_mol_per_m2_s_Pa,
              one[gas].permeance_mol_per_m2_s_Pa * factor,
              gas === 'water' ? 1e-10 : 1e-8,
            ),
          ).toBe(true);
        }
      }),
      RUNS,
    );
  });

  it('read a second time after it was changed in place is read anew', () => {
    fc.assert(
      fc.property(film, conditions, humidity, number(1.1, 9), (layer, at, point, factor) => {
        const own = structuredClone(layer);
        wallState([own], at);
        own.thickness_um *= factor;
        own.oxygen.humidity_curve = { relative_humidity: [point], factor: [2] };
        expect(wallState([own], at)).toEqual(wallState([structuredClone(own)], at));
      }),
      RUNS,
    );
  });
});

describe('diffusion', () => {
  const lagLayer = fc.oneof(
    fc.record({
      thickness_um: decades(-1, 3),
      permeability_mol_m_per_m2_s_Pa: decades(-20, -15),
      diffusivity_m2_per_s: decades(-16, -10),
    }),
    decades(-15, -11).map((permeance) => ({ permeance_mol_per_m2_s_Pa: permeance })),
  );

  it('lags as long either way round, layers and coatings', () => {
    fc.assert(
      fc.property(fc.array(lagLayer, { minLength: 1, maxLength: 8 }), (wall) => {
        const one = timeLag({ layers: wall });
        const turned = timeLag({ layers: [...wall].reverse() });
        expect(near(one.time_lag_s, turned.time_lag_s, 1e-12)).toBe(true);
        expect(one.layer_part_s.every((part) => part >= 0)).toBe(true);
      }),
      RUNS,
    );
  });

  it('does not lag otherwise when a film is cut in two', () => {
    fc.assert(
      fc.property(
        fc.array(lagLayer, { minLength: 1, maxLength: 6 }),
        decades(-1, 3),
        number(0.02, 0.98),
        (wall, um, part) => {
          const layer = { permeability_mol_m_per_m2_s_Pa: 3e-17, diffusivity_m2_per_s: 4e-13 };
          const whole = timeLag({ layers: [{ ...layer, thickness_um: um }, ...wall] });
          const cut = timeLag({
            layers: [
              { ...layer, thickness_um: um * part },
              { ...layer, thickness_um: um * (1 - part) },
              ...wall,
            ],
          });
          expect(near(whole.time_lag_s, cut.time_lag_s, 1e-11)).toBe(true);
        },
      ),
      RUNS,
    );
  });

  it('builds up one way, from nothing to the steady flux', () => {
    fc.assert(
      fc.property(decades(-4, 1), number(1, 2), (tau, factor) => {
        const [before, after] = [relativeFlux(tau), relativeFlux(tau * factor)];
        expect(before >= 0 && after <= 1 && after >= before - 1e-15).toBe(true);
      }),
      RUNS,
    );
  });
});
