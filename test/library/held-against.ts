import library from '../../server/db/seed/library/materials.json';
import { layerAt, standardTests, wallInTest, type TransmissionTest } from '../../shared/engine';
import { fromSi, toSi } from '../../shared/units';
import { libraryLayer, librarySpec } from './library-layers';
import { publishedRanges, QUANTITIES, type PublishedRange, type Quantity } from './published-ranges';

const GAUGE_UM = 25;

/** The library rounds to three digits; a range's own end, so rounded, still counts as inside. */
const ROUNDING = 0.005;

const TEST_NAMES: Record<Quantity, string> = {
  'oxygen 0 %': 'OTR 23 °C, dry',
  'oxygen 50 %': 'OTR 23 °C, 50 %',
  water: 'WVTR 38 °C, 90 % to 0 %',
};

function testOf(quantity: Quantity): TransmissionTest {
  const test = standardTests.find(({ name }) => name === TEST_NAMES[quantity]);
  if (!test) throw new Error(`The engine has no standard test "${TEST_NAMES[quantity]}".`);
  return test;
}

/**
 * What the product's own tables say of a film at 25 µm: cm³(STP)/(m²·day·atm of oxygen) or g/(m²·day). Oxygen is taken
 * per atmosphere of oxygen, as the sources state it, and not per test in moist oxygen (1.4 % less at 50 %).
 */
function rateThrough25Um(filmId: string, quantity: Quantity): number {
  const answer = wallInTest([libraryLayer(filmId, GAUGE_UM)], testOf(quantity));
  if (quantity !== 'water') return fromSi(answer.permeance_mol_per_m2_s_Pa, 'cm3(STP)/(m2*day*atm)');
  if (answer.rate_g_per_m2_day === undefined) throw new Error('A water test gives a water rate.');
  return answer.rate_g_per_m2_day;
}

export interface Held {
  film: string;
  quantity: Quantity;
  source: PublishedRange['source'];
  rate: number;
  /** In the unit of the rate, at the temperature of the test. */
  low: number;
  high: number;
  /** True where the library took its value from this very source: then inside by construction. */
  isOwnSource: boolean;
  /** Rate over the nearest end where outside, else 1. */
  timesNearestEnd: number;
  isInside: boolean;
}

/** Every film against every published range of its own. */
export function heldAgainstPublished(): Held[] {
  return Object.entries(publishedRanges).flatMap(([film, ranges]) =>
    ranges.flatMap((range) => range.quantities.map((quantity) => hold(film, quantity, range))),
  );
}

function hold(film: string, quantity: Quantity, range: PublishedRange): Held {
  const rate = rateThrough25Um(film, quantity);
  const low = inRateOfTest(range.low, { film, quantity, range });
  const high = inRateOfTest(range.high, { film, quantity, range });
  const timesNearestEnd = rate < low ? rate / low : rate > high ? rate / high : 1;
  const allowed = range.low === range.high ? twoSpreads(film, quantity) : 1 + ROUNDING;
  return {
    film,
    quantity,
    source: range.source,
    rate,
    low,
    high,
    isOwnSource: ownSource(film, quantity) === range.source,
    timesNearestEnd,
    isInside: timesNearestEnd <= allowed && timesNearestEnd >= 1 / allowed,
  };
}

/** A single published value is no range: it is held within two of the spreads the library itself states. */
function twoSpreads(film: string, quantity: Quantity): number {
  const spec = librarySpec(film);
  if (spec.kind !== 'film') throw new Error(`${film} is no film.`);
  const { geometric_sd } = quantity === 'water' ? spec.water : spec.oxygen;
  if (geometric_sd === undefined) throw new Error(`${film}: the library states no spread.`);
  return geometric_sd ** 2;
}

/**
 * A published value as the rate through 25 µm at the test's temperature. Oxygen published at 25 °C is brought to 23 °C by
 * the film's own activation energy, as the library brings its values: the ratio of the film's permeances at the two.
 */
function inRateOfTest(
  value: number,
  { film, quantity, range }: { film: string; quantity: Quantity; range: PublishedRange },
): number {
  const si = toSi(value, range.unit);
  if (quantity === 'water') {
    return fromSi(si / (GAUGE_UM * 1e-6), 'g/(m2*day)');
  }
  const test = testOf(quantity);
  const humidity = quantity === 'oxygen 50 %' ? 0.5 : 0;
  const permeanceAt = (temperatureC: number) =>
    layerAt(libraryLayer(film, GAUGE_UM), { temperature_C: temperatureC, relative_humidity: humidity }).oxygen
      .permeance_mol_per_m2_s_Pa;
  const toTest = permeanceAt(test.temperature_C) / permeanceAt(range.temperatureC ?? test.temperature_C);
  return fromSi((si * toTest) / (GAUGE_UM * 1e-6), 'cm3(STP)/(m2*day*atm)');
}

function ownSource(film: string, quantity: Quantity): string | undefined {
  const material = library.materials.find(({ id }) => id === film);
  const provenance: Record<string, { source: string } | undefined> = material?.provenance ?? {};
  return provenance[quantity === 'water' ? 'water.value' : 'oxygen.value']?.source;
}

/** Quantities of a film for which some range is published. */
export function quantitiesWithRange(film: string): Quantity[] {
  const ranges = publishedRanges[film] ?? [];
  return QUANTITIES.filter((quantity) => ranges.some(({ quantities }) => quantities.includes(quantity)));
}
