import { iceConstants, type EquilibriumSeries } from './equilibrium-constants';

export const ZERO_C_IN_K = 273.15;

/** log10 of an equilibrium constant at a temperature in kelvin; the series and its source stand with the constants. */
export function log10EquilibriumConstant(series: EquilibriumSeries, tempK: number): number {
  const [a1, a2, a3, a4, a5, a6] = series;
  return a1 + a2 * tempK + a3 / tempK + a4 * Math.log10(tempK) + a5 / (tempK * tempK) + a6 * tempK * tempK;
}

/**
 * Natural logarithm of the activity of ice against liquid water at the same temperature, no unit.
 * `ln a_ice = ln 10 · log10 K_ice(T)` (Toner and Catling 2017), in kelvin, about 200 to 298 K.
 * −0.097458 at 263.15 K; +6e-8 at 273.15 K, where it would be nought if the fit were exact.
 */
export function lnIceActivity(tempK: number): number {
  return Math.LN10 * log10EquilibriumConstant(iceConstants, tempK);
}
