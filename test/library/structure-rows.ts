import { convert } from '../../shared/units';
import { multilayers, predict, predictable, riseTo85Percent, VENDOR_RISE } from './published-structures';
import type { PublishedStructure } from './published-structures';

/** Predicted over measured up to which a prediction is called good, and fair. */
const GOOD_WITHIN = 1.5;
const FAIR_WITHIN = 3;

/** Two digits, as the README writes numbers. */
export const twoDigits = (value: number): string => String(Number(value.toPrecision(2)));

/** Predicted over measured, or over the nearest end of a range; 1 inside it. */
export function ratioTo({ low, high }: { low: number; high: number }, rate: number): number {
  return rate < low ? rate / low : rate > high ? rate / high : 1;
}

export function verdictOn(ratio: number): string {
  const factor = Math.max(ratio, 1 / ratio);
  return factor <= GOOD_WITHIN ? 'good' : factor <= FAIR_WITHIN ? 'fair' : 'bad';
}

function measuredWords({ low, high }: { low: number; high: number }): string {
  if (low === 0) return `< ${twoDigits(high)}`;
  return low === high ? twoDigits(low) : `${twoDigits(low)}–${twoDigits(high)}`;
}

function ratioWords({ low, high }: { low: number; high: number }, rate: number): string {
  if (low === high) return twoDigits(ratioTo({ low, high }, rate));
  if (ratioTo({ low, high }, rate) === 1) return low === 0 ? 'below' : 'inside';
  return `${low === 0 ? '> ' : ''}${twoDigits(ratioTo({ low, high }, rate))}`;
}

/** The README's table of measured structures. */
export function structureRows(): string[][] {
  return [...predictable.map(structureRow), riseRow('evoh-32', '32'), riseRow('evoh-44', '44')];
}

function structureRow(one: PublishedStructure): string[] {
  const { rate, isBelowMeasurable } = predict(one);
  return [
    one.basis === 'partly' ? `${one.name} *` : one.name,
    one.source,
    one.rateName,
    measuredWords(one),
    isBelowMeasurable ? '< 0.005' : twoDigits(rate),
    ratioWords(one, rate),
    verdictOn(ratioTo(one, rate)),
  ];
}

function riseRow(evohId: string, ethylene: string): string[] {
  const rise = riseTo85Percent(evohId);
  const ratio = rise / VENDOR_RISE;
  return [
    `EVOH laminate (5 µm of ${ethylene} mol% taken)`,
    'ukugi',
    'OTR at 85 % over OTR dry',
    twoDigits(VENDOR_RISE),
    twoDigits(rise),
    twoDigits(ratio),
    verdictOn(ratio),
  ];
}

const MIL_PER_UM = 1 / 25.4;

/** The README's table of multilayers without published gauges: read as a rate per 100 in², and as rate times gauge. */
export function multilayerRows(): string[][] {
  return multilayers.map((one) => {
    const perM2 = predict(one).rate;
    const rate =
      one.gas === 'oxygen'
        ? convert(perM2, 'cm3(STP)/(m2*day*atm)', 'cm3(STP)/(100in2*day*atm)')
        : convert(perM2, 'g/(m2*day)', 'g/(100in2*day)');
    const totalUm = one.layers.reduce((sum, [, gaugeUm = 0]) => sum + gaugeUm, 0);
    const timesGauge = rate * totalUm * MIL_PER_UM;
    return [
      `${one.name}, ${one.gauges} µm`,
      one.gas === 'oxygen' ? 'OTR' : 'WVTR',
      one.low === one.high ? String(one.low) : `${one.low}–${one.high}`,
      ...[rate, timesGauge].flatMap((value) => [twoDigits(value), twoDigits(ratioTo(one, value))]),
    ];
  });
}
