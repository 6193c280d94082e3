import { DAY_S, MOL_PER_CM3_STP } from '../units';
import { secondsToLimit } from './days-to-limit';
import type { CoursesAnswer, LimitAnswer, SolverReport, StorageAnswer } from './description/evaluation';
import { LIMIT_NAMES, readReportDays, readStorage, uptakeMgPerKg } from './description/read-storage';
import type { LimitName, StorageDescription } from './description/storage-description';
import { RELATIVE_TOLERANCE, runStorage, type StorageRun } from './storage-run';
import type { StorageSystem } from './storage-system';
import { settledValues } from './settled-values';

/**
 * Days until each limit [days], what comes first, and the courses asked for.
 * Equations: methods of oxygen-store.ts and storage-run.ts. Range: description/ranges.ts. Errors: InputError for a
 * description that cannot be computed with; never for how a route ends: `solver` says when
 * work was cut short. Accuracy: 1e-6 relative in days.
 * Cost: some 0.1 ms per leg with an isotherm and humidity-dependent walls, microseconds else.
 */
export function storage(description: StorageDescription): StorageAnswer {
  const system = readStorage(description);
  return answerOf(description, system, runStorage(system, 0));
}

/** The answer of a run, in the units of the description. */
export function answerOf(
  description: StorageDescription,
  system: StorageSystem,
  run: StorageRun,
): StorageAnswer {
  const limits: StorageAnswer['limits'] = {};
  let first: LimitName | null = null;
  let firstDays = Infinity;
  const settled = system.isRepeated ? null : settledValues(system, run);
  for (const name of LIMIT_NAMES) {
    if (system.limits[name] === undefined) continue;
    const atS = secondsToLimit(run, name);
    let answer: LimitAnswer;
    if (atS !== null) {
      answer = { status: 'reached', days: atS / DAY_S };
      if (answer.days < firstDays) {
        first = name;
        firstDays = answer.days;
      }
    } else {
      answer = { status: 'not reached', value_at_horizon: valueNow(name, system, run) };
      if (settled) answer.settles_at = settled[name];
    }
    limits[name] = answer;
  }
  const answer: StorageAnswer = {
    limits,
    first_limit: first,
    shelf_life_days: first === null ? null : firstDays,
    solver: solverReport(run),
  };
  if (system.absorberMol > 0) {
    answer.absorber_exhausted_day = run.oxygen.exhaustedAtS === null ? null : run.oxygen.exhaustedAtS / DAY_S;
  }
  if (description.report_days) answer.courses = coursesOf(description, system, run);
  return answer;
}

function solverReport({ counters, wallSolutions }: StorageRun): SolverReport {
  return {
    method:
      counters.acceptedSteps > 0
        ? 'Clenshaw–Curtis quadrature and collocation of degree 8, adaptive'
        : 'closed form',
    status: counters.isStepLimitReached ? 'step limit reached' : 'finished',
    relative_tolerance: RELATIVE_TOLERANCE,
    accepted_steps: counters.acceptedSteps,
    rejected_steps: counters.rejectedSteps,
    rate_evaluations: counters.rateEvaluations,
    wall_solutions: wallSolutions,
  };
}

function valueNow(name: LimitName, system: StorageSystem, run: StorageRun): number {
  if (name === 'oxygen_uptake_mg_per_kg') return uptakeMgPerKg(run.oxygen.uptakeMol, system.food.massKg);
  if (name === 'headspace_oxygen_percent')
    return (100 * run.oxygen.headspacePressure()) / system.totalPressurePa;
  return run.moisture.moisture;
}

function coursesOf(description: StorageDescription, system: StorageSystem, run: StorageRun): CoursesAnswer {
  const days = readReportDays(description.report_days, description.horizon_days);
  // The run reports in ascending order; the answer keeps the order asked for.
  const order = days.map((_, i) => i).sort((a, b) => days[a] - days[b]);
  const place = new Array<number>(days.length);
  order.forEach((asked, reported) => {
    place[asked] = reported;
  });
  const { report } = run.oxygen;
  const courses: CoursesAnswer = {
    days,
    oxygen_uptake_mg_per_kg: place.map((i) => uptakeMgPerKg(report.uptakeMol[i], system.food.massKg)),
  };
  if (system.pack.headspaceM3 > 0) {
    courses.headspace_oxygen_percent = place.map(
      (i) => (100 * report.headspacePa[i]) / system.totalPressurePa,
    );
  }
  if (system.food.isotherm) courses.moisture_g_per_g = place.map((i) => run.moisture.report[i]);
  if (system.absorberMol > 0) {
    courses.absorber_left_cm3_STP = place.map((i) => report.absorberMol[i] / MOL_PER_CM3_STP);
  }
  return courses;
}
