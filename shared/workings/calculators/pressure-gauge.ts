import {
  gaugeClasses,
  gaugeErrorLimit,
  gaugeShare,
  gaugeSteadyPercent,
} from '../../engineering/pressure-gauge.ts';
import { paPerBar } from '../../engineering/units.ts';
import { pressureText, trim } from '../../surveys/words.ts';
import { calculator, resultsOf, steps } from '../calculator.ts';
import { choice, unknownFigure, figure } from '../field.ts';
import { gaugeRange, workingPressure } from '../ranges.ts';

const classes = Object.fromEntries(gaugeClasses.map((each) => [String(each), `Class ${String(each)}`]));
const errorRange = [-10 * paPerBar, 10 * paPerBar] as const;
const readAgainst = { part: 'Read against a test gauge' };

/** Range and error of the boiler's gauge. */
export const pressureGaugeCalculator = calculator({
  id: 'pressure-gauge',
  title: 'The pressure gauge',
  about: 'Whether its range suits the boiler, and how far out it may be.',
  group: 'tests',
  caution: 'A gauge on the boiler must have a siphon with water in it, and a red line at working pressure.',
  fields: {
    workingPa: workingPressure(),
    fullScalePa: figure('Full scale', 'pressure', gaugeRange, 6 * paPerBar),
    gaugeClass: choice('Class', classes, '2.5', { hint: 'On the dial; 2.5 where none is marked' }),
    zeroPa: unknownFigure('Reads at no pressure', 'pressure', errorRange, 0, readAgainst),
    lowPa: unknownFigure('Error at a third of working pressure', 'pressure', errorRange, null, readAgainst),
    middlePa: unknownFigure('Error at two thirds', 'pressure', errorRange, null, readAgainst),
    workingErrorPa: unknownFigure('Error at working pressure', 'pressure', errorRange, null, readAgainst),
  },
  check: ({ workingPa, fullScalePa }) =>
    fullScalePa < workingPa
      ? [
          {
            field: 'fullScalePa',
            message: 'This gauge ends below working pressure: it would be driven off its scale',
          },
        ]
      : [],
  work: ({ workingPa, fullScalePa, gaugeClass, zeroPa, lowPa, middlePa, workingErrorPa }) => {
    const share = gaugeShare(workingPa, fullScalePa);
    const limit = gaugeErrorLimit(fullScalePa, Number(gaugeClass));
    const errors = [zeroPa, lowPa, middlePa, workingErrorPa].filter((each) => each !== null);
    const worst = Math.max(...errors.map(Math.abs));
    const points = [lowPa, middlePa, workingErrorPa].filter((each) => each !== null).length;
    return {
      answers: resultsOf(share, limit),
      says: [
        share.result.value > gaugeSteadyPercent + 1e-9
          ? `Working pressure stands at ${trim(share.result.value, 0)} % of full scale, past the three quarters wanted: fit a gauge to ${pressureText(workingPa / 0.75)} or more.`
          : `Working pressure stands at ${trim(share.result.value, 0)} % of full scale, within the three quarters wanted.`,
        ...(errors.length === 0
          ? []
          : [
              worst > limit.result.value
                ? `It is out by ${pressureText(worst)}, more than its class allows.`
                : `Its largest error, ${pressureText(worst)}, is within its class.`,
            ]),
        ...(points < 3 ? ['Read it against the test gauge at three points at least.'] : []),
      ],
      steps: [steps('Range', share), steps('Error', limit)],
    };
  },
});
