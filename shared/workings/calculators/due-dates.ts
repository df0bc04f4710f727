import { materials } from '../../boilers/boiler.ts';
import { nextTests } from '../../papers/due.ts';
import { calculator } from '../calculator.ts';
import { choice, unknownDay } from '../field.ts';

/** When tests are due again. */
export const dueDatesCalculator = calculator({
  id: 'due-dates',
  title: 'When tests are due',
  about: 'When a hydraulic and a steam test are due again by the dates on the papers.',
  group: 'papers',
  caution:
    'Due is not valid: a boiler changes between tests, and its inspector may ask for one at any time. Follow your local code.',
  fields: {
    material: choice('Metal', materials, 'copper'),
    hydraulicOn: unknownDay('Last hydraulic test', '2025-05-10'),
    hydraulicWas: choice(
      'It was',
      { first: 'The first since it was built', later: 'A later one', unknown: 'Not known' },
      'unknown',
    ),
    steamOn: unknownDay('Last steam test', '2026-04-18'),
    onDay: unknownDay('As on', null, { hint: 'Left out, dates alone are given' }),
  },
  work: ({ material, hydraulicOn, hydraulicWas, steamOn, onDay }) => ({
    answers: [],
    says: nextTests({
      material,
      hydraulicOn,
      wasFirst: hydraulicWas === 'unknown' ? null : hydraulicWas === 'first',
      steamOn,
      onDay,
    }).map(({ text }) => text),
    steps: [],
  }),
});
