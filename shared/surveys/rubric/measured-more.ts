import { choice, count, lengthMm, litres } from './build.ts';
import type { MeasurementSpec } from './types.ts';

/** What version 1.1.0 measures that 1.0.0 did not, by criterion: sizes that pressure by parts and running need. */
export const addedIn110: Readonly<Record<string, readonly MeasurementSpec[]>> = {
  'shell.plates': [lengthMm('supportPitchMm', 'Widest flat between supports', 3, 600)],
  'shell.flue': [lengthMm('lengthMm', 'Length of the flue between its ends', 10, 3_000)],
  'shell.tubes': [lengthMm('outsideDiameterMm', 'Outside diameter of a tube', 2, 100)],
  'shell.stays': [count('threadsPerInch', 'Threads to the inch, if screwed', 80)],
  'safety.glass': [litres('waterInGlassL', 'Water drawn from full glass to its lowest level', 50)],
  'firing.fuel': [
    choice('gasKind', 'Gas', { propane: 'Propane', butane: 'Butane', 'not-known': 'Not known' }),
  ],
};
