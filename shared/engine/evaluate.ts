import { DAY_S, ZERO_CELSIUS_K } from '../units';
import type {
  EvaluationAnswer,
  EvaluationDescription,
  WallAnswer,
  WallOnLeg,
} from './description/evaluation';
import { TARGET_DAYS } from './description/ranges';
import { readList, readNumber } from './description/read-number';
import { readStorage } from './description/read-storage';
import { warningsOf } from './evaluation-warnings';
import { describePack } from './pack-conductance';
import { standardTests } from './standard-tests';
import { answerOf } from './storage-answer';
import { runStorage, type StorageRun } from './storage-run';
import type { StorageSystem } from './storage-system';
import { ENGINE_VERSION } from './version';
import { testWall } from './wall-in-test';
import { describeWall } from './wall-profile';

/** Legs of the first pass that are shown one by one. */
const MOST_LEGS_SHOWN = 60;
/** Legs that are looked at for warnings: all that a request may hold. */
const MOST_LEGS_WATCHED = 400;
const TEST_COUNT = { min: 0, max: 50 };

/**
 * The whole answer to a whole description: days to each limit, the walls as each leg begins and in tests, the pack's
 * conductances, and what to be careful about.
 * Range: description/ranges.ts. Errors: InputError for a description that cannot be computed with. Every number in the
 * answer is finite. Cost: that of `storage`, and some 20 µs for each wall on each leg shown.
 */
export function evaluate(description: EvaluationDescription): EvaluationAnswer {
  const system = readStorage(description);
  const targetDays =
    description.target_days === undefined || description.target_days === null
      ? null
      : readNumber(description.target_days, 'target_days', {
          range: TARGET_DAYS,
          label: 'Target',
          unit: 'days',
        });
  const tests = description.tests ?? standardTests;
  readList(tests, 'tests', { range: TEST_COUNT, label: 'Tests' });
  const run = runStorage(system, MOST_LEGS_WATCHED);
  const answer = answerOf(description, system, run);
  const walls = system.pack.walls.map((wall, i): WallAnswer => ({
    name: wall.name,
    area_m2: wall.areaM2,
    layers: wall.layers.map((layer) => ({
      name: layer.name,
      kind: layer.kind,
      thickness_um: Number((layer.thicknessM * 1e6).toPrecision(15)),
    })),
    legs: wallOnLegs(system, run, i),
    tests: tests.map((test, k) => testWall(wall.layers, test, `tests[${k}]`)),
  }));
  const pack = run.legStarts.slice(0, MOST_LEGS_SHOWN).map((start) => {
    const { pack: at, humidity } = run.conditions[start.leg];
    at.conduct(humidity, start.insideHumidity);
    return { leg: start.leg, starts_day: start.atS / DAY_S, ...describePack(at) };
  });
  return {
    engine_version: ENGINE_VERSION,
    ...answer,
    target:
      targetDays === null
        ? null
        : {
            days: targetDays,
            is_met: isMet(targetDays, answer.shelf_life_days, {
              horizonDays: description.horizon_days,
              isCutShort: run.counters.isStepLimitReached,
            }),
            margin_days: answer.shelf_life_days === null ? null : answer.shelf_life_days - targetDays,
          },
    walls,
    pack,
    warnings: warningsOf(system, run, walls),
  };
}

/** With no limit reached a target is met as far as the route was followed. */
function isMet(
  targetDays: number,
  shelfLifeDays: number | null,
  route: { horizonDays: number; isCutShort: boolean },
): boolean {
  if (shelfLifeDays !== null) return shelfLifeDays >= targetDays;
  return !route.isCutShort && route.horizonDays >= targetDays;
}

function wallOnLegs(system: StorageSystem, run: StorageRun, wallIndex: number): WallOnLeg[] {
  return run.legStarts.slice(0, MOST_LEGS_SHOWN).map((start) => {
    const conditions = run.conditions[start.leg];
    const state = describeWall(conditions.pack.walls[wallIndex], {
      humidityOutside: conditions.humidity,
      humidityInside: start.insideHumidity,
      oxygenOutsidePa: conditions.outsideOxygenPa,
      oxygenInsidePa: start.insideOxygenPa,
    });
    const { name } = system.legs[start.leg];
    return {
      ...state,
      temperature_C: Number((conditions.temperatureK - ZERO_CELSIUS_K).toFixed(9)),
      leg: start.leg,
      ...(name === undefined ? {} : { leg_name: name }),
      starts_day: start.atS / DAY_S,
    };
  });
}
