import { DIFFUSIVITY_M2_PER_S, REPORT_DAY_COUNT, THICKNESS_UM } from './description/ranges';
import { readList, readNumber, readObject } from './description/read-number';

export interface TransientDescription {
  thickness_um: number;
  diffusivity_m2_per_s: number;
  times_s: number[];
}

export interface TransientAnswer {
  /** J/J∞ at each time. */
  relative_flux: number[];
  half_time_s: number;
  time_lag_s: number;
}

/** Below this D·t/ℓ² the small-time series is the shorter one. */
const SMALL_TIME = 0.15;
const TIME_S = { min: 0, max: 1e15 };

/**
 * Flux through a film that begins empty, over its steady value, at τ = D·t/ℓ².
 * 1 + 2 Σ (−1)ⁿ exp(−n²π²τ), and below τ = 0.15 the same function by images, 2/√(πτ) Σ exp(−(2m+1)²/(4τ)).
 * Source: Crank, The Mathematics of Diffusion, 2nd ed. (1975), chapter 4. Range: τ ≥ 0. Cost: a few exponentials.
 */
export function relativeFlux(tau: number): number {
  if (tau < SMALL_TIME) {
    if (tau <= 0) return 0;
    let sum = 0;
    for (let m = 0; m < 4; m++) sum += Math.exp(-((2 * m + 1) ** 2) / (4 * tau));
    return (2 / Math.sqrt(Math.PI * tau)) * sum;
  }
  let sum = 1;
  for (let n = 1; n < 12; n++) {
    const term = 2 * Math.exp(-n * n * Math.PI * Math.PI * tau);
    sum += n % 2 === 0 ? term : -term;
    if (term < 1e-17) break;
  }
  return sum;
}

/** D·t½/ℓ², the root of relativeFlux = ½ by halving, once; 1/7.20537. Older papers print 1/7.199. */
const HALF_TIME_TAU = ((): number => {
  let low = 0.1;
  let high = 0.2;
  for (let halving = 0; halving < 60; halving++) {
    const middle = (low + high) / 2;
    if (relativeFlux(middle) < 0.5) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
})();

/**
 * Build-up of the flux through one film after a step of pressure on one face: J/J∞ at times [s], half-time [s] and
 * time lag [s], ℓ²/(6D). Fick's second law, constant D; equations at relativeFlux. Range: description/ranges.ts.
 * Errors: InputError. Cost: a few exponentials per time.
 */
export function transient(description: TransientDescription): TransientAnswer {
  const given = readObject<TransientDescription>(description, '', 'Description');
  const thicknessM =
    readNumber(given.thickness_um, 'thickness_um', { range: THICKNESS_UM, label: 'Thickness', unit: 'µm' }) *
    1e-6;
  const diffusivity = readNumber(given.diffusivity_m2_per_s, 'diffusivity_m2_per_s', {
    range: DIFFUSIVITY_M2_PER_S,
    label: 'Diffusivity',
    unit: 'm²/s',
  });
  const times = readList<number>(given.times_s, 'times_s', { range: REPORT_DAY_COUNT, label: 'Times' });
  const squareOverD = (thicknessM * thicknessM) / diffusivity;
  return {
    relative_flux: times.map((time, i) =>
      relativeFlux(
        readNumber(time, `times_s[${i}]`, { range: TIME_S, label: 'Time', unit: 's' }) / squareOverD,
      ),
    ),
    half_time_s: HALF_TIME_TAU * squareOverD,
    time_lag_s: squareOverD / 6,
  };
}
