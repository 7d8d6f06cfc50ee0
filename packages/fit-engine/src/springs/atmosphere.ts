/** Pressure of the standard atmosphere at a geopotential height, kPa (ISO 2533, troposphere: -5 to 11 km). */
export function patmAtHeightKPa(heightM: number): number {
  const [t0, lapse, p0] = [288.15, 0.0065, 101.325];
  // g0 M / (R L) with the constants of ISO 2533.
  const exponent = (9.80665 * 28.9644) / (8314.32 * lapse);
  return p0 * (1 - (lapse * heightM) / t0) ** exponent;
}

/** Absolute pressure of a sealed fill at another temperature, constant height. Temperatures in kelvin. */
export const fillAtTemperatureKPa = (absKPa: number, filledAtK: number, nowK: number): number =>
  (absKPa * nowK) / filledAtK;
