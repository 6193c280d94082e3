/** What a transmission test is told apart by; humidities and oxygen as fractions. */
export type NamedTest =
  | {
      gas: 'oxygen';
      temperature_C: number;
      relative_humidity_outside: number;
      relative_humidity_inside: number;
      oxygen_mole_fraction_dry: number;
    }
  | {
      gas: 'water';
      temperature_C: number;
      relative_humidity_high: number;
      relative_humidity_low: number;
      moist_side?: 'outside' | 'inside';
    };

/** Figures and unit in the reader's units. */
export type ShowInName = (value: number, kind: 'temperature_C' | 'fraction_as_percent') => string;

/** 'OTR, 23 °C, dry both sides' or 'WVTR, 38 °C, 90 % to 0 %': a test by its own condition; pure oxygen goes unsaid. */
export function testName(test: NamedTest, show: ShowInName): string {
  const temperature = show(test.temperature_C, 'temperature_C');
  const percent = (fraction: number) => show(fraction, 'fraction_as_percent');
  if (test.gas === 'water') {
    const side = test.moist_side === 'inside' ? ', moist side inside' : '';
    return `WVTR, ${temperature}, ${percent(test.relative_humidity_high)} to ${percent(test.relative_humidity_low)}${side}`;
  }
  const gas =
    test.oxygen_mole_fraction_dry === 1 ? '' : `, in ${percent(test.oxygen_mole_fraction_dry)} oxygen`;
  return `OTR, ${temperature}, ${sides(test, percent)}${gas}`;
}

function sides(
  test: { relative_humidity_outside: number; relative_humidity_inside: number },
  percent: (fraction: number) => string,
): string {
  const { relative_humidity_outside: outside, relative_humidity_inside: inside } = test;
  if (outside !== inside) return `${percent(outside)} outside, ${percent(inside)} inside`;
  return outside === 0 ? 'dry both sides' : `${percent(outside)} both sides`;
}
