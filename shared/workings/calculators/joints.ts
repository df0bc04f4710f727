import { isSoftJoint, jointMetals, jointOf } from '../../engineering/joints.ts';
import { saturatedLines } from '../../engineering/saturation.ts';
import { celsiusZeroK } from '../../engineering/units.ts';
import { isRefusal, work } from '../../engineering/working.ts';
import { pressureText } from '../../surveys/words.ts';
import { calculator, resultsOf, steps } from '../calculator.ts';
import { choice, labelsOf } from '../field.ts';
import { workingPressure } from '../ranges.ts';

/** What a joint is made with, against the heat of the steam. */
export const jointsCalculator = calculator({
  id: 'joints',
  title: 'What the joints are made with',
  about:
    'Where solder and brazing alloys melt, what their joints are rated for, and how near the steam comes.',
  group: 'strength',
  caution:
    'Old silver solder may hold cadmium: its fumes kill. Do not heat or file it without knowing, and work in moving air.',
  fields: {
    workingPa: workingPressure(),
    jointMetal: choice('Joints made with', labelsOf(jointMetals), 'tin-lead'),
  },
  work: ({ workingPa, jointMetal }) => {
    const { meltsCelsius, ratedPa } = jointOf(jointMetal);
    const steam = saturatedLines(workingPa);
    const temperature = isRefusal(steam) ? steam : steam.temperature;
    const left =
      meltsCelsius === null || isRefusal(steam)
        ? []
        : [
            work({
              result: ['ΔT', 'Between the steam and melting', 'temperatureRise'],
              formula: '{T_m} − {T_s}',
              terms: {
                T_m: ['Begins to melt', 'temperature', meltsCelsius[0] + celsiusZeroK],
                T_s: ['Temperature of the steam', 'temperature', steam.temperature.result.value],
              },
              compute: ({ T_m, T_s }) => T_m - T_s,
              source: 'solder-melting',
              holds: 'Metal no hotter than the steam; in the fire it is',
            }),
          ];
    const says = isSoftJoint(jointMetal)
      ? [
          `Soft-soldered tube joints are rated to ${pressureText(ratedPa ?? 0)} in saturated steam. Soft solder in a pressure joint is a stop: it creeps long before it melts.`,
        ]
      : [
          ratedPa === null
            ? 'Joints of this kind have no published rating here.'
            : `Brazed tube joints are rated to ${pressureText(ratedPa)} in saturated steam by a published table.${workingPa > ratedPa ? ' This pressure is above it: there is no figure here.' : ''}`,
        ];
    return {
      answers: resultsOf(temperature, ...left),
      says,
      steps: [steps('Heat', temperature, ...left)],
    };
  },
});
