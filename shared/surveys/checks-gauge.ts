import { check, figure, isAbove } from './check.ts';
import { figureOf } from './examined.ts';
import type { Examined, SurveyInput } from './examined.ts';
import { limits } from './limits.ts';
import type { EngineeringCheck } from './result.ts';
import { pressureText } from './words.ts';

export function gaugeRange({ facts }: SurveyInput, items: readonly Examined[]): EngineeringCheck {
  const make = check('gauge-range', 'Pressure gauge range', 'safety.gauge');
  const scale = figureOf(items, 'safety.gauge', 'fullScalePa');
  if (scale === null) return make.cannotSay('The gauge’s full scale is not recorded.');
  const figures = [
    figure('Full scale', scale, 'Pa'),
    figure('Claimed working pressure', facts.workingPressurePa, 'Pa'),
  ];
  return isAbove(facts.workingPressurePa, (scale * limits.gaugeSteadyPercent) / 100)
    ? make.fail(
        `Full scale is ${pressureText(scale)}; working pressure, ${pressureText(facts.workingPressurePa)}, is beyond three quarters of it.`,
        figures,
      )
    : make.pass(
        `Full scale is ${pressureText(scale)}, for ${pressureText(facts.workingPressurePa)} working pressure.`,
        figures,
      );
}

const points = ['zeroErrorPa', 'lowPointErrorPa', 'midPointErrorPa', 'workingPointErrorPa'];

export function gaugeError(items: readonly Examined[]): EngineeringCheck {
  const make = check('gauge-error', 'Pressure gauge agreement', 'safety.gauge');
  const scale = figureOf(items, 'safety.gauge', 'fullScalePa');
  const errors = points.flatMap((point) =>
    (['least', 'most'] as const).flatMap((which) => figureOf(items, 'safety.gauge', point, which) ?? []),
  );
  if (scale === null || errors.length === 0)
    return make.cannotSay('Its full scale and its error against a test gauge are not both recorded.');
  const worst = Math.max(...errors.map(Math.abs));
  const allowed = (scale * limits.gaugeClassPercent) / 100;
  const figures = [figure('Largest error', worst, 'Pa'), figure('Allowed', allowed, 'Pa')];
  return isAbove(worst, allowed)
    ? make.fail(
        `It is out by ${pressureText(worst)}; ${pressureText(allowed)} is allowed on a gauge of class ${String(limits.gaugeClassPercent)}.`,
        figures,
      )
    : make.pass(`Within ${pressureText(worst)} of the test gauge.`, figures);
}
