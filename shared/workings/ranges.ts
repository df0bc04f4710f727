import { paPerBar } from '../engineering/units.ts';
import { figure } from './field.ts';
import type { Field } from './field.ts';

/** Pressures a model boiler works at, Pa gauge: 0.1 to 20 bar. */
export const workingRange = [0.1 * paPerBar, 20 * paPerBar] as const;
/** Pressures of tests and gauges, Pa. */
export const gaugeRange = [0.1 * paPerBar, 100 * paPerBar] as const;
export const wallRange = [0.1, 25] as const;
export const acrossRange = [20, 1_000] as const;

/** Where sliders run: half a bar to ten, by a tenth. */
const pressureSlider = { from: 0.5 * paPerBar, to: 10 * paPerBar, step: 0.05 * paPerBar };

/** The pressure that most calculators begin with. */
export const workingPressure = (initial = 4 * paPerBar): Field<number> =>
  figure('Working pressure', 'pressure', workingRange, initial, { slider: pressureSlider });
