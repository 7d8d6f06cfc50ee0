/**
 * Pressure of the standard atmosphere at a geopotential height, kPa (ISO 2533). NaN outside -5 to 11 km, where its
 * lowest layer says nothing.
 */
export function patmAtHeightKPa(heightM: number): number {
  if (!(heightM >= -5000 && heightM <= 11000)) return NaN;
  const [t0, lapse, p0] = [288.15, 0.0065, 101.325];
  // g0 M / (R L) with the constants of ISO 2533.
  const exponent = (9.80665 * 28.9644) / (8314.32 * lapse);
  return p0 * (1 - (lapse * heightM) / t0) ** exponent;
}

/**
 * Geopotential height of a height on a map (above the sea, in metres): r z / (r + z), with the earth's radius of the
 * standard atmosphere; 0.6 m less at 2,000 m.
 */
export const geopotentialM = (mapHeightM: number): number =>
  (6_356_766 * mapHeightM) / (6_356_766 + mapHeightM);

/** Absolute pressure of a sealed fill at another temperature, constant height. Temperatures in kelvin, above 0. */
export const fillAtTemperatureKPa = (absKPa: number, filledAtK: number, nowK: number): number =>
  filledAtK > 0 && filledAtK < Infinity && nowK > 0 ? (absKPa * nowK) / filledAtK : NaN;
