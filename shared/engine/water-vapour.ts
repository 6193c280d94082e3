import { ZERO_CELSIUS_K } from '../units';
import { InputError } from './description/input-error';
import { TEMPERATURE_C } from './description/ranges';

const CRITICAL_TEMPERATURE_K = 647.096;
const CRITICAL_PRESSURE_PA = 22.064e6;
const TRIPLE_POINT_K = 273.16;
const TRIPLE_POINT_PA = 611.657;

/**
 * Saturation pressure of water vapour [Pa] at a temperature [K].
 * Over liquid from 273.16 K: ln(p/pc) = (Tc/T)(a1τ + a2τ^1.5 + a3τ³ + a4τ^3.5 + a5τ⁴ + a6τ^7.5), τ = 1 − T/Tc.
 * Over ice below it: ln(p/pt) = (1/θ) Σ aᵢ θ^bᵢ, θ = T/273.16.
 * Range: 50 to 647 K by the formulas; callers hold it to −30…60 °C.
 * Source: IAPWS SR1-86 (Wagner & Pruss) and IAPWS R14-08. Cost: a few powers; kept out of inner loops.
 */
export function saturationPressureAtK(temperatureK: number): number {
  if (temperatureK < TRIPLE_POINT_K) {
    const theta = temperatureK / TRIPLE_POINT_K;
    const sum =
      -21.2144006 * theta ** 0.00333333333 +
      27.3203819 * theta ** 1.20666667 -
      6.1059813 * theta ** 1.70333333;
    return TRIPLE_POINT_PA * Math.exp(sum / theta);
  }
  const tau = 1 - temperatureK / CRITICAL_TEMPERATURE_K;
  const root = Math.sqrt(tau);
  const tau3 = tau * tau * tau;
  const sum =
    -7.85951783 * tau +
    1.84408259 * tau * root -
    11.7866497 * tau3 +
    22.6807411 * tau3 * root -
    15.9618719 * tau3 * tau +
    1.80122502 * tau3 * tau3 * tau * root;
  return CRITICAL_PRESSURE_PA * Math.exp((CRITICAL_TEMPERATURE_K / temperatureK) * sum);
}

/**
 * Saturation pressure of water vapour [Pa] at a temperature [°C]; below 0.01 °C over ice.
 * Equation and source: saturationPressureAtK. Range: −30 to 60 °C. Errors: InputError outside it.
 */
export function saturationPressurePa(temperatureC: number): number {
  if (!(temperatureC >= TEMPERATURE_C.min && temperatureC <= TEMPERATURE_C.max)) {
    throw new InputError(
      'temperature_C',
      temperatureC,
      `Temperature ${temperatureC} °C does not fit; use ${TEMPERATURE_C.min} to ${TEMPERATURE_C.max} °C.`,
    );
  }
  return saturationPressureAtK(temperatureC + ZERO_CELSIUS_K);
}
