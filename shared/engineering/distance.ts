import { work } from './working.ts';
import type { Line } from './working.ts';

/** Mean radius of the earth, km, as the haversine formula is usually given it. */
export const earthRadiusKm = 6_371;

export interface Place {
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

/** The same, with its working. */
export const distanceLine = (a: Place, b: Place): Line => {
  haversineKm(a, b);
  return work({
    result: ['s', 'Distance over the ground', 'distance'],
    formula: '2·{R}·asin((sin(({φ_2} − {φ_1}) / 2)² + cos({φ_1})·cos({φ_2})·sin(({λ_2} − {λ_1}) / 2)²)^0.5)',
    terms: {
      R: ['Radius of the earth', 'distance', earthRadiusKm],
      φ_1: ['North, first place', 'degrees', a.latitude],
      λ_1: ['East, first place', 'degrees', a.longitude],
      φ_2: ['North, second place', 'degrees', b.latitude],
      λ_2: ['East, second place', 'degrees', b.longitude],
    },
    compute: () => haversineKm(a, b),
    source: 'haversine',
    holds: 'Within half a per cent of the earth’s true shape; roads are longer',
  });
};
