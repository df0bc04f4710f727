import { materials } from '../../boilers/boiler.ts';
import { allowableStress, fireMarginK, metalTemperature } from '../../engineering/metal.ts';
import { valueOf } from '../../engineering/working.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import { choice, figure } from '../field.ts';
import { workingPressure } from '../ranges.ts';

/** What a metal may carry at the heat of the steam. */
export const metalStressCalculator = calculator({
  id: 'metal-stress',
  title: 'What the metal may carry',
  about: 'Allowable stress of annealed copper and the steels at the heat they work at.',
  group: 'strength',
  caution: 'Brazed copper is always annealed: the figures for hard-drawn tube must not be used for it.',
  fields: {
    workingPa: workingPressure(),
    material: choice('Metal', materials, 'copper'),
    marginK: figure(
      'Metal in the fire is hotter than the steam by',
      'temperatureRise',
      [0, 100],
      fireMarginK,
      { slider: { from: 0, to: 60, step: 1 } },
    ),
  },
  work: ({ workingPa, material, marginK }) => {
    const temperature = metalTemperature(workingPa, marginK);
    const stress = allowableStress(material, temperature.result.value);
    const isCopper = material === 'copper' || material === 'copper-brass';
    return {
      answers: resultsOf(stress, temperature),
      says: isCopper
        ? ['Copper falls away fast above 350 °F (177 °C): that matters from about 100 psi (7 bar) up.']
        : [],
      steps: [steps('Heat and stress', temperature, stress)],
    };
  },
  plot: ({ workingPa, material, marginK }) => {
    const at = metalTemperature(workingPa, marginK).result.value;
    const stressAt = (kelvin: number) => valueOf(allowableStress(material, kelvin));
    const here = stressAt(at);
    return {
      title: 'Allowable stress by temperature',
      x: { label: 'Temperature of the metal', quantity: 'temperature' },
      y: { label: 'Allowable stress', quantity: 'stress' },
      series: [curve('Allowable stress', spread(293.15, 477, 47), stressAt)],
      marks: here === null ? [] : [{ label: 'At this pressure', x: at, y: here }],
      levels: [],
    };
  },
});
