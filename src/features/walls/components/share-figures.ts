import { formatNumber } from '../../../../shared/units/format';

/** A share of the whole in percent, without the sign. */
export function shareFigures(share: number): string {
  if (share > 0 && share < 0.0005) return '< 0.05';
  return formatNumber(share * 100);
}
