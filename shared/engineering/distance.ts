/** Mean radius of the earth, km, as the haversine formula is usually given it. */
export const earthRadiusKm = 6_371;

interface Place {
  /** Degrees north. */
  latitude: number;
  /** Degrees east. */
  longitude: number;
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/**
 * Great-circle distance, km, by the haversine formula on a sphere; within about 0.5 % of the earth's true shape.
 * @throws RangeError if a latitude or longitude is not on the globe.
 */
export function haversineKm(a: Place, b: Place, radiusKm: number = earthRadiusKm): number {
  for (const { latitude, longitude } of [a, b]) {
    if (!(Math.abs(latitude) <= 90 && Math.abs(longitude) <= 360))
      throw new RangeError('Not a place on the globe');
  }
  const north = Math.sin(radians(b.latitude - a.latitude) / 2) ** 2;
  const east = Math.sin(radians(b.longitude - a.longitude) / 2) ** 2;
  const chord = north + Math.cos(radians(a.latitude)) * Math.cos(radians(b.latitude)) * east;
  return 2 * radiusKm * Math.asin(Math.min(1, Math.sqrt(chord)));
}
