import { sharePercent } from '../../../../shared/charts/share-bars';
import { formatNumber } from '../../../../shared/units/format';

/** A share of the whole in percent, without the sign. */
export function shareFigures(share: number): string {
  return sharePercent(share, (value) => formatNumber(value));
}
