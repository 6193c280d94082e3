import { daysToLimit, onlyLimit } from './days-to-limit';
import { readList } from './description/read-number';
import { readStorage } from './description/read-storage';
import type { LimitName, StorageDescription } from './description/storage-description';
import { readInput, readLimit, VariableSystem, type Input, type InputName } from './variable-system';

export interface ElasticityRequest {
  storage: StorageDescription;
  limit: LimitName;
  /** Names of inputs; see InputName. */
  of: InputName[];
}

export interface ElasticityAnswer {
  /** Days to the limit as described; null where it is not reached by the horizon. */
  days: number | null;
  /** d ln days / d ln x for each name; null where days or x are 0, or the limit is not reached. */
  elasticity: (number | null)[];
}

const INPUT_COUNT = { min: 1, max: 500 };
/** Half the width of the difference, in ln x. */
const HALF_WIDTH = 2e-3;
/** Of the days, so that a difference over HALF_WIDTH keeps five digits. */
const TOLERANCE = 1e-9;
/** A limit reached just before the horizon must still be reached a little later. */
const BEYOND_HORIZON = 1.05;

/**
 * Elasticities d ln days / d ln x of the days to a limit, one for each input named: by how many per cent the days
 * change when the input changes by one. Central differences in ln x at two widths, extrapolated (Richardson), so that
 * what is left is of fourth order; a humidity or fraction of 1 cannot grow and is differenced downwards.
 * Range: as storage. Errors: InputError for an unknown input. Accuracy: about 1e-5. Cost: four runs per input.
 */
export function elasticities(request: ElasticityRequest): ElasticityAnswer {
  const base = readStorage(request.storage);
  const limit = readLimit(request.limit, 'limit', base);
  const names = readList<InputName>(request.of, 'of', { range: INPUT_COUNT, label: 'Inputs' });
  const inputs = names.map((name, i) => readInput(name, `of[${i}]`, base));
  const days = daysToLimit(onlyLimit(base, limit, base.horizonS), limit, TOLERANCE);
  if (!Number.isFinite(days)) return { days: null, elasticity: inputs.map(() => null) };
  if (days === 0) return { days, elasticity: inputs.map(() => null) };
  const variable = new VariableSystem(onlyLimit(base, limit, base.horizonS * BEYOND_HORIZON));
  return { days, elasticity: inputs.map((input) => elasticityOf(variable, input, limit)) };
}

function elasticityOf(variable: VariableSystem, input: Input, limit: LimitName): number | null {
  if (!(variable.valueOf(input) > 0)) return null;
  if (input.kind === 'limit' && input.limit !== limit) return 0;
  const lnDaysAt = (lnFactor: number): { x: number; y: number } => {
    variable.reset();
    const x = Math.log(variable.scale(input, Math.exp(lnFactor)));
    const y = Math.log(daysToLimit(variable.system, limit, TOLERANCE));
    variable.reset();
    return { x, y };
  };
  const slope = (width: number): number => {
    const high = lnDaysAt(width);
    const low = lnDaysAt(-width);
    return (high.y - low.y) / (high.x - low.x);
  };
  const wide = slope(HALF_WIDTH);
  const narrow = slope(HALF_WIDTH / 2);
  const best = narrow + (narrow - wide) / 3;
  if (Number.isFinite(best)) return best;
  return Number.isFinite(narrow) ? narrow : null;
}
