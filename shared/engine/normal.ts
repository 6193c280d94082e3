/**
 * Probability Φ(x) that a standard normal number is below x: ½ + φ(x)·(x + x³/3 + x⁵/15 + …).
 * Source: Marsaglia, Evaluating the normal distribution, J. Stat. Softw. 11 (2004) 4. Range: −7 to 7, beyond it 0 or 1.
 * Error: 1e-15 absolute.
 */
export function normalProbability(x: number): number {
  if (x < -7) return 0;
  if (x > 7) return 1;
  let sum = x;
  let term = x;
  for (let n = 3; n < 400; n += 2) {
    term *= (x * x) / n;
    const next = sum + term;
    if (next === sum) break;
    sum = next;
  }
  return 0.5 + sum * Math.exp(-0.5 * x * x - 0.918_938_533_204_672_74);
}

function ratio(x: number, above: readonly number[], below: readonly number[]): number {
  let numerator = 0;
  let denominator = 0;
  for (let k = above.length - 1; k >= 0; k--) {
    numerator = numerator * x + above[k];
    denominator = denominator * x + below[k];
  }
  return numerator / denominator;
}

const CENTRE_ABOVE = [
  3.387_132_872_796_366_608, 133.141_667_891_784_377_45, 1971.590_950_306_551_442_7,
  13_731.693_765_509_461_125, 45_921.953_931_549_871_457, 67_265.770_927_008_700_853,
  33_430.575_583_588_128_105, 2509.080_928_730_122_672_7,
];
const CENTRE_BELOW = [
  1, 42.313_330_701_600_911_252, 687.187_007_492_057_908_3, 5394.196_021_424_751_107_7,
  21_213.794_301_586_595_867, 39_307.895_800_092_710_61, 28_729.085_735_721_942_674, 5226.495_278_852_854_561,
];
const MIDDLE_ABOVE = [
  1.423_437_110_749_683_577_34, 4.630_337_846_156_545_295_9, 5.769_497_221_460_691_405_5,
  3.647_848_324_763_204_605_04, 1.270_458_252_452_368_382_58, 0.241_780_725_177_450_611_77,
  2.272_384_498_926_918_458_33e-2, 7.745_450_142_783_414_076_4e-4,
];
const MIDDLE_BELOW = [
  1, 2.053_191_626_637_758_821_87, 1.676_384_830_183_803_849_4, 0.689_767_334_985_100_004_55,
  0.148_103_976_427_480_074_59, 1.519_866_656_361_645_719_66e-2, 5.475_938_084_995_344_946e-4,
  1.050_750_071_644_416_843_24e-9,
];
const FAR_ABOVE = [
  6.657_904_643_501_103_777_2, 5.463_784_911_164_114_369_9, 1.784_826_539_917_291_335_8,
  0.296_560_571_828_504_891_23, 2.653_218_952_657_612_309_3e-2, 1.242_660_947_388_078_438_6e-3,
  2.711_555_568_743_487_578_15e-5, 2.010_334_399_292_288_132_65e-7,
];
const FAR_BELOW = [
  1, 0.599_832_206_555_887_937_69, 0.136_929_880_922_735_805_31, 1.487_536_129_085_061_485_25e-2,
  7.868_691_311_456_132_591e-4, 1.846_318_317_510_054_681_8e-5, 1.421_511_758_316_445_888_7e-7,
  2.044_263_103_389_939_785_64e-15,
];

/**
 * x at which Φ(x) = p. Source: Wichura, algorithm AS 241 (PPND16), Appl. Stat. 37 (1988) 477. Range: 0 < p < 1.
 * Error: 1e-15 relative.
 */
export function normalQuantile(p: number): number {
  const q = p - 0.5;
  if (Math.abs(q) <= 0.425) return q * ratio(0.180_625 - q * q, CENTRE_ABOVE, CENTRE_BELOW);
  const tail = Math.sqrt(-Math.log(q < 0 ? p : 1 - p));
  const size =
    tail <= 5 ? ratio(tail - 1.6, MIDDLE_ABOVE, MIDDLE_BELOW) : ratio(tail - 5, FAR_ABOVE, FAR_BELOW);
  return q < 0 ? -size : size;
}
