/** Mean radius of the earth, kilometres: 6 371.0, the value usual with this formula. */
export const earthRadiusKm = 6_371.0;

/** A place in degrees: north and east positive. */
export interface Position {
  readonly latitude: number;
  readonly longitude: number;
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/**
 * Great-circle distance by the haversine formula, kilometres, on a sphere of `earthRadiusKm`.
 *
 * The earth is not quite a sphere: up to 0.5 % out.
 * @throws RangeError if a latitude is beyond ±90° or a longitude beyond ±180°.
 */
export function haversineKm(from: Position, to: Position): number {
  for (const { latitude, longitude } of [from, to]) {
    if (!(Math.abs(latitude) <= 90 && Math.abs(longitude) <= 180))
      throw new RangeError('Not a place on this earth');
  }
  const latitudeHalf = radians(to.latitude - from.latitude) / 2;
  const longitudeHalf = radians(to.longitude - from.longitude) / 2;
  const h =
    Math.sin(latitudeHalf) ** 2 +
    Math.cos(radians(from.latitude)) * Math.cos(radians(to.latitude)) * Math.sin(longitudeHalf) ** 2;
  // Rounding may carry the sum a hair past one at the antipodes.
  return 2 * earthRadiusKm * Math.asin(Math.min(1, Math.sqrt(h)));
}
