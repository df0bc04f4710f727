import { materials } from '../../boilers/boiler.ts';
import { allowableStress, fireMarginK, metalTemperature } from '../../engineering/metal.ts';
import {
  rectangularPlatePressure,
  rodStayDiameter,
  stayEndings,
  stayLoad,
  stayPressure,
  threadCore,
} from '../../engineering/plates.ts';
import { isRefusal, valueOf } from '../../engineering/working.ts';
import { pressureText } from '../../surveys/words.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import { choice, figure, labelsOf, unknownFigure } from '../field.ts';
import { wallRange, workingPressure } from '../ranges.ts';

/** A stayed flat plate and its stays. */
export const platesAndStaysCalculator = calculator({
  id: 'plates-and-stays',
  title: 'Flat plates and stays',
  about: 'What a stayed flat plate stands, the load on each stay, and the stay it needs.',
  group: 'strength',
  caution: 'One broken stay throws its load on its neighbours. Sound every stay before the water test.',
  fields: {
    workingPa: workingPressure(),
    material: choice('Metal', materials, 'copper'),
    plateMm: figure('Plate thickness', 'length', wallRange, 3.2, {
      slider: { from: 1, to: 8, step: 0.1 },
    }),
    lengthwiseMm: figure('Pitch one way', 'length', [2, 300], 22),
    crosswiseMm: figure('Pitch the other way', 'length', [2, 300], 22),
    ending: choice('How the stays end', labelsOf(stayEndings), 'headed'),
    stayMm: figure('Stay, outside diameter', 'length', [1, 40], 4.8),
    tpi: unknownFigure('Threads to the inch', 'threadsPerInch', [4, 80], 40, {
      hint: 'Leave out for plain or brazed stays',
    }),
  },
  check: ({ stayMm, lengthwiseMm, crosswiseMm, tpi }) => [
    ...(lengthwiseMm <= stayMm
      ? [{ field: 'lengthwiseMm', message: 'The pitch cannot be smaller than the stay: they would touch' }]
      : []),
    ...(crosswiseMm <= stayMm
      ? [{ field: 'crosswiseMm', message: 'The pitch cannot be smaller than the stay: they would touch' }]
      : []),
    ...(tpi !== null && threadCore({ outsideMm: stayMm, tpi }).result.value <= 0
      ? [{ field: 'tpi', message: 'So coarse a thread leaves no core in this stay' }]
      : []),
  ],
  work: (input) => {
    const temperature = metalTemperature(input.workingPa, fireMarginK);
    const stress = allowableStress(input.material, temperature.result.value);
    if (isRefusal(stress))
      return { answers: [], says: [stress.text], steps: [steps('Metal', temperature, stress)] };
    const stressPa = stress.result.value;
    const plate = rectangularPlatePressure({ ...input, thicknessMm: input.plateMm, stressPa });
    // Of two pitches, the square that holds the same plate.
    const pitchMm = Math.sqrt(input.lengthwiseMm * input.crosswiseMm);
    const load = stayLoad({ pressurePa: input.workingPa, pitchMm, diameterMm: input.stayMm });
    const stays = stayPressure({
      pitchMm,
      diameterMm: input.stayMm,
      tpi: input.tpi,
      stressPa,
      isCopper: input.material === 'copper' || input.material === 'copper-brass',
    });
    const needed = rodStayDiameter({ pressurePa: input.workingPa, areaMm2: pitchMm ** 2, stressPa });
    const stayAnswers = isRefusal(stays) ? [stays] : stays.lines;
    const least = Math.min(
      valueOf(plate) ?? Infinity,
      isRefusal(stays) ? Infinity : stays.least.result.value,
    );
    return {
      answers: resultsOf(plate, ...(isRefusal(stays) ? [] : [stays.least]), load, needed),
      says: Number.isFinite(least)
        ? [
            `The weaker of plate and stays comes to ${pressureText(least)}, for ${pressureText(input.workingPa)} asked. ${least < input.workingPa ? 'That is less than is asked.' : 'Nothing worked out here falls short of it.'}`,
          ]
        : [],
      steps: [
        steps('Metal', temperature, stress),
        steps('Plate', plate),
        steps('Stays', load, ...stayAnswers, needed),
      ],
    };
  },
  plot: (input) => {
    const stress = valueOf(
      allowableStress(input.material, metalTemperature(input.workingPa, fireMarginK).result.value),
    );
    if (stress === null) return null;
    const at = (thicknessMm: number) =>
      valueOf(rectangularPlatePressure({ ...input, thicknessMm, stressPa: stress }));
    const here = at(input.plateMm);
    const most = Math.min(input.lengthwiseMm, input.crosswiseMm) / 4;
    return {
      title: 'What the plate stands by its thickness',
      x: { label: 'Plate', quantity: 'length' },
      y: { label: 'Pressure', quantity: 'pressure' },
      series: [curve('Plate stands', spread(most / 20, most), at)],
      marks: here === null ? [] : [{ label: 'Yours', x: input.plateMm, y: here }],
      levels: [{ label: 'Working pressure', y: input.workingPa }],
    };
  },
});
