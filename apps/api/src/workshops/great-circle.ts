export interface Place {
  latitude: number;
  longitude: number;
}

/** Mean radius of the earth, km (IUGG, R1 = 6 371.0088 km). */
const radiusKm = 6371.0088;
const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/**
 * Distance along the great circle in km, on a sphere; good to about 0.6 % of the true distance.
 * The arctangent of cross and dot product keeps its digits for near and for opposite places alike.
 */
export function greatCircleKm(from: Place, to: Place): number {
  const [a, b] = [radians(from.latitude), radians(to.latitude)];
  const dLon = radians(to.longitude - from.longitude);
  const cross = Math.hypot(
    Math.cos(b) * Math.sin(dLon),
    Math.cos(a) * Math.sin(b) - Math.sin(a) * Math.cos(b) * Math.cos(dLon),
  );
  const dot = Math.sin(a) * Math.sin(b) + Math.cos(a) * Math.cos(b) * Math.cos(dLon);
  return radiusKm * Math.atan2(cross, dot);
}
