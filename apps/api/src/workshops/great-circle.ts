export interface Place {
  latitude: number;
  longitude: number;
}

/** Mean radius of the earth, km (IUGG, R1 = 6 371.0088 km). */
const radiusKm = 6371.0088;
const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/** Distance along the great circle in km, on a sphere (haversine); good to about 0.6 % of the true distance. */
export function greatCircleKm(from: Place, to: Place): number {
  const dLat = radians(to.latitude - from.latitude);
  const dLon = radians(to.longitude - from.longitude);
  const h =
    Math.sin(dLat / 2) ** 2 +
    Math.cos(radians(from.latitude)) * Math.cos(radians(to.latitude)) * Math.sin(dLon / 2) ** 2;
  return 2 * radiusKm * Math.asin(Math.min(1, Math.sqrt(h)));
}
