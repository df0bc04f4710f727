import { distanceLine } from '../../engineering/distance.ts';
import { calculator, steps } from '../calculator.ts';
import { figure } from '../field.ts';

const north = [-90, 90] as const;
const east = [-180, 180] as const;

/** How far apart two places are. */
export const distanceCalculator = calculator({
  id: 'distance',
  title: 'Distance over the ground',
  about: 'The straight distance that travel in a quotation goes by.',
  group: 'papers',
  caution: null,
  fields: {
    firstNorth: figure('Degrees north, first place', 'degrees', north, 53.9576),
    firstEast: figure('Degrees east, first place', 'degrees', east, -1.0827),
    secondNorth: figure('Degrees north, second place', 'degrees', north, 51.5085),
    secondEast: figure('Degrees east, second place', 'degrees', east, -0.1257),
  },
  work: (input) => {
    const line = distanceLine(
      { latitude: input.firstNorth, longitude: input.firstEast },
      { latitude: input.secondNorth, longitude: input.secondEast },
    );
    return { answers: [line.result], says: [], steps: [steps('Distance', line)] };
  },
});
