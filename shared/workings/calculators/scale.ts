import { acidForScale, gasFromScale, scaleLoss } from '../../engineering/scale.ts';
import { isRefusal, valueOf } from '../../engineering/working.ts';
import { trim } from '../../surveys/words.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import { figure } from '../field.ts';

/** What scale costs, and what takes it off. */
export const scaleCalculator = calculator({
  id: 'scale',
  title: 'Scale, fuel and acid',
  about: 'Fuel lost through scale, and the citric acid that takes it off.',
  group: 'papers',
  caution:
    'Acid into water, never water into acid. Goggles and gloves. Leave a vent: gas comes off, and with some metals hydrogen, so no flame near. Rinse well, and test with water before any fire.',
  fields: {
    thicknessMm: figure('Scale, thickness', 'length', [0, 5], 0.4, {
      slider: { from: 0, to: 1.5, step: 0.05 },
    }),
    scaleG: figure('Scale to dissolve', 'smallMass', [0.1, 10_000], 50),
  },
  work: ({ thicknessMm, scaleG }) => {
    const loss = scaleLoss(thicknessMm);
    const acid = acidForScale(scaleG);
    const gas = gasFromScale(scaleG);
    return {
      answers: resultsOf(loss, acid, gas),
      says: [
        isRefusal(loss)
          ? `${loss.text} This is thicker: have it off.`
          : `About ${trim(loss.result.value, 1)} % of the fuel goes to heating scale.`,
        `It takes ${trim(acid.result.value, 1)} g of dry citric acid, in plenty of warm water, and gives off ${trim(gas.result.value, 1)} g of carbon dioxide.`,
      ],
      steps: [steps('Fuel', loss), steps('Acid', acid, gas)],
    };
  },
  plot: ({ thicknessMm }) => {
    const here = valueOf(scaleLoss(thicknessMm));
    return {
      title: 'Fuel lost by scale',
      x: { label: 'Scale', quantity: 'length' },
      y: { label: 'Fuel lost', quantity: 'percent' },
      series: [curve('Ordinary scale', spread(0, 1.587), (mm) => valueOf(scaleLoss(mm)))],
      marks: here === null ? [] : [{ label: 'Yours', x: thicknessMm, y: here }],
      levels: [],
    };
  },
});
