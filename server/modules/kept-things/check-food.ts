import type { FoodSpec } from '../../../shared/contract/foods';
import { evaluate, InputError, type EvaluationDescription } from '../../../shared/engine';
import { inputInvalid } from '../../http/app-error';

/** Lets the engine read the food in a plain pack for a day, so that what it would refuse is refused here, by field. */
export function checkFood(spec: FoodSpec): void {
  try {
    evaluate(inPlainPack(spec));
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    throw inputInvalid([{ path: `spec.${error.path}`, value: shown(error.value), message: error.message }]);
  }
}

function inPlainPack({ food, limits, absorber_capacity_cm3_STP }: FoodSpec): EvaluationDescription {
  const gas = { permeability_mol_m_per_m2_s_Pa: 1e-18 };
  return {
    pack: {
      walls: [
        {
          name: 'wall',
          area_m2: 0.1,
          layers: [{ kind: 'film', name: 'film', thickness_um: 50, oxygen: gas, water: gas }],
        },
      ],
      headspace_cm3: 100,
      starting_headspace_oxygen_percent: 1,
    },
    food: food as EvaluationDescription['food'],
    limits,
    absorber_capacity_cm3_STP,
    route: { legs: [{ temperature_C: 23, relative_humidity: 0.5, days: 1 }], after_last: 'hold' },
    horizon_days: 1,
    tests: [],
  };
}

function shown(value: unknown): unknown {
  return typeof value === 'object' ? undefined : value;
}
