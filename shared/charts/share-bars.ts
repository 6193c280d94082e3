/** Pixels of a bar for a share of 0 to 1; what is above nothing stays visible as a sliver. */
export function shareBarWidth(share: number, fullWidth: number): number {
  if (!(share > 0)) return 0;
  return Math.max(1.5, Math.min(1, share) * fullWidth);
}

/** '98.5', '15', '<0.1', '0': percent figures of a share. */
export function sharePercent(share: number, formatNumber: (value: number) => string): string {
  const percent = share * 100;
  if (percent === 0) return '0';
  if (percent < 0.1) return '<0.1';
  if (percent > 99.9 && percent < 100) return '>99.9';
  return formatNumber(percent);
}
