import type { StatedValue } from '../../../shared/contract/materials';
import { formatExact, formatQuantity, type DisplayUnitSystem } from '../../../shared/units/format';
import type { Gas } from './unit-choice';

const percent = (fraction: number) => `${formatExact(Number((fraction * 100).toPrecision(4)))} %`;

/** 'at 23 °C, 50 % on both sides, pure oxygen' or 'on 12 µm at 38 °C between 90 % and 0 %'. */
export function conditionsInWords(gas: Gas, stated: StatedValue, unitSystem: DisplayUnitSystem): string {
  const at = formatQuantity(stated.temperature_C, 'temperature_C', { unitSystem, isExact: true }).text;
  const on =
    stated.thickness_um === undefined
      ? ''
      : `on ${formatQuantity(stated.thickness_um, 'thickness_um', { unitSystem, isExact: unitSystem === 'metric' }).text} `;
  if (
    gas === 'water' &&
    stated.relative_humidity_high !== undefined &&
    stated.relative_humidity_low !== undefined
  ) {
    return `${on}at ${at} between ${percent(stated.relative_humidity_high)} and ${percent(stated.relative_humidity_low)}`;
  }
  const humidity =
    stated.relative_humidity === undefined ? '' : `, ${percent(stated.relative_humidity)} on both sides`;
  const fraction = stated.oxygen_mole_fraction_dry;
  const testGas =
    fraction === undefined ? '' : fraction === 1 ? ', pure oxygen' : `, ${percent(fraction)} oxygen`;
  return `${on}at ${at}${humidity}${testGas}`;
}

/** The same in a list: '23 °C, 50 %' or '38 °C, 90 % to 0 %'. */
export function conditionsInShort(gas: Gas, stated: StatedValue, unitSystem: DisplayUnitSystem): string {
  const at = formatQuantity(stated.temperature_C, 'temperature_C', { unitSystem, isExact: true }).text;
  const { relative_humidity_high: high, relative_humidity_low: low, relative_humidity: both } = stated;
  if (gas === 'water' && high !== undefined && low !== undefined)
    return `${at}, ${percent(high)} to ${percent(low)}`;
  if (both !== undefined) return `${at}, ${percent(both)}`;
  return gas === 'oxygen' ? `${at}, humidity not stated` : at;
}
