import {
  barLitresLine,
  mainPartBarLitres,
  pressureLawClass,
  pressureLawClasses,
} from '../../engineering/papers.ts';
import { trim } from '../../surveys/words.ts';
import { calculator, steps } from '../calculator.ts';
import { figure } from '../field.ts';
import { workingPressure } from '../ranges.ts';

/** Which part of a code a boiler falls under. */
export const barLitresCalculator = calculator({
  id: 'bar-litres',
  title: 'Bar·litres and the codes',
  about:
    'Working pressure times volume, and which part of a hobby code or class of pressure law it falls under.',
  group: 'papers',
  caution: 'Your local code and your boiler inspector decide which rules apply.',
  fields: {
    workingPa: workingPressure(),
    volumeL: figure('Whole volume, steam space too', 'volume', [0.02, 500], 1, {
      slider: { from: 0.1, to: 10, step: 0.05 },
    }),
  },
  work: ({ workingPa, volumeL }) => {
    const product = barLitresLine(workingPa, volumeL);
    const lawClass = pressureLawClass(workingPa, volumeL);
    return {
      answers: [product.result],
      says: [
        product.result.value < mainPartBarLitres
          ? `Under 3 bar·litres: the small-boiler part of the UK hobby code usually applies.`
          : `${trim(product.result.value, 2)} bar·litres, 3 or more: the main part of the UK hobby code usually applies.`,
        `New to the market, a fired boiler like this would be: ${pressureLawClasses[lawClass]} (Directive 2014/68/EU, from memory).`,
      ],
      steps: [steps('Bar·litres', product)],
    };
  },
});
