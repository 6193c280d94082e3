import { ZERO_CELSIUS_K } from '../../units';
import { HUMIDITY, TEMPERATURE_C } from './ranges';
import { readNumber } from './read-number';

/** Temperature [K] from °C. Range: −30 to 60 °C. */
export function readTemperatureK(value: unknown, path: string): number {
  return readNumber(value, path, { range: TEMPERATURE_C, label: 'Temperature', unit: '°C' }) + ZERO_CELSIUS_K;
}

/** Relative humidity or water activity, a fraction. Range: 0 to 1. */
export function readHumidity(value: unknown, path: string, label = 'Relative humidity'): number {
  return readNumber(value, path, { range: HUMIDITY, label });
}
