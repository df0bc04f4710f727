import { echoThickness, trueThickness, waveSpeeds } from '../../engineering/thickness.ts';
import { trim } from '../../surveys/words.ts';
import { calculator, resultsOf, steps } from '../calculator.ts';
import { choice, figure, labelsOf, unknownFigure } from '../field.ts';
import { lengthText } from '../say.ts';

/** What a wall-thickness meter really read. */
export const wallMeterCalculator = calculator({
  id: 'wall-meter',
  title: 'Wall-thickness meter',
  about: 'The true wall where the meter was set for another metal, and thickness from the time of an echo.',
  group: 'tests',
  caution: 'Set the meter for the metal and check it on a piece of known thickness before you believe it.',
  fields: {
    readMm: figure('The meter reads', 'length', [0.1, 50], 2.03),
    setTo: choice('It was set for', labelsOf(waveSpeeds), 'steel'),
    metal: choice('The wall is', labelsOf(waveSpeeds), 'copper'),
    echo: unknownFigure('Time of the echo, if the meter shows it', 'microseconds', [0.01, 50], null),
  },
  work: ({ readMm, setTo, metal, echo }) => {
    const wall = trueThickness(readMm, setTo, metal);
    const timed = echo === null ? null : echoThickness(waveSpeeds[metal].metresPerSecond, echo);
    const over = (readMm / wall.result.value - 1) * 100;
    return {
      answers: resultsOf(wall, ...(timed === null ? [] : [timed])),
      says: [
        Math.abs(over) < 0.5
          ? `The meter was set for this metal: the wall is ${lengthText(wall.result.value)}.`
          : `The wall is ${lengthText(wall.result.value)}: the reading is ${trim(Math.abs(over), 0)} % ${over > 0 ? 'over' : 'under'}.`,
      ],
      steps: [steps('Thickness', wall, ...(timed === null ? [] : [timed]))],
    };
  },
});
