import type { TransmissionTest } from './description/evaluation';

/** The tests most data sheets state. */
export const standardTests: TransmissionTest[] = [
  {
    gas: 'oxygen',
    name: 'OTR 23 °C, dry',
    temperature_C: 23,
    relative_humidity_outside: 0,
    relative_humidity_inside: 0,
    oxygen_mole_fraction_dry: 1,
  },
  {
    gas: 'oxygen',
    name: 'OTR 23 °C, 50 %',
    temperature_C: 23,
    relative_humidity_outside: 0.5,
    relative_humidity_inside: 0.5,
    oxygen_mole_fraction_dry: 1,
  },
  {
    gas: 'oxygen',
    name: 'OTR 23 °C, 80 %',
    temperature_C: 23,
    relative_humidity_outside: 0.8,
    relative_humidity_inside: 0.8,
    oxygen_mole_fraction_dry: 1,
  },
  {
    gas: 'water',
    name: 'WVTR 38 °C, 90 % to 0 %',
    temperature_C: 38,
    relative_humidity_high: 0.9,
    relative_humidity_low: 0,
    moist_side: 'outside',
  },
  {
    gas: 'water',
    name: 'WVTR 23 °C, 85 % to 0 %',
    temperature_C: 23,
    relative_humidity_high: 0.85,
    relative_humidity_low: 0,
    moist_side: 'outside',
  },
];
