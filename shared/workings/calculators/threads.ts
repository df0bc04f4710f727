import { threadCore } from '../../engineering/plates.ts';
import { baDiameter, baPitch } from '../../engineering/threads.ts';
import { calculator, resultsOf, steps } from '../calculator.ts';
import { figure, whole } from '../field.ts';

/** Sizes of the threads found on small boilers. */
export const threadsCalculator = calculator({
  id: 'threads',
  title: 'Threads',
  about: 'Core of a Whitworth-form (ME) thread, and pitch and diameter of a BA one.',
  group: 'papers',
  caution: 'A worn or crossed thread under pressure lets go without warning. Gauge it before you trust it.',
  fields: {
    outsideMm: figure('Outside of the thread', 'length', [1, 50], 6.35, { part: 'ME and Whitworth' }),
    tpi: figure('Threads to the inch', 'threadsPerInch', [4, 80], 40, { part: 'ME and Whitworth' }),
    number: whole('BA number', [0, 16], 4, { part: 'BA' }),
  },
  check: ({ outsideMm, tpi }) =>
    threadCore({ outsideMm, tpi }).result.value <= 0
      ? [{ field: 'tpi', message: 'So coarse a thread leaves no core at this diameter' }]
      : [],
  work: ({ outsideMm, tpi, number }) => {
    const core = threadCore({ outsideMm, tpi });
    const pitch = baPitch(number);
    const outside = baDiameter(pitch.result.value);
    return {
      answers: resultsOf(core, pitch, outside),
      says: [],
      steps: [steps('ME and Whitworth', core), steps('BA', pitch, outside)],
    };
  },
});
