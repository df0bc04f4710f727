import { mostWithValveLiftingPa } from '../engineering/safety-valve.ts';
import { check, figure, isAbove } from './check.ts';
import { valuesOf } from './examined.ts';
import type { Examined, SurveyInput } from './examined.ts';
import { limits } from './limits.ts';
import type { EngineeringCheck } from './result.ts';
import { pressureText } from './words.ts';

const working = (pa: number) => figure('Claimed working pressure', pa, 'Pa');

export function valveLift({ facts, record }: SurveyInput): EngineeringCheck {
  const make = check('valve-lift', 'Safety valve lifts in time', 'safety.valve');
  const { steam } = record;
  if (steam?.raisedSteam !== true) return make.cannotSay('It was not tried under steam.');
  const limit = mostWithValveLiftingPa(facts.workingPressurePa);
  const lifts = steam.valveLiftsAtPa;
  if (lifts === null) {
    const highest = steam.highestPressurePa;
    if (highest === null || highest < limit)
      return make.cannotSay(
        'The pressure at which it lifts is not recorded.',
        highest === null ? [] : [figure('Highest pressure', highest, 'Pa')],
      );
    return make.fail(
      `The safety valve had not lifted at ${pressureText(highest)}; it should by ${pressureText(limit)}.`,
      [figure('Highest pressure', highest, 'Pa'), working(facts.workingPressurePa)],
    );
  }
  const figures = [figure('Lifts at', lifts, 'Pa'), working(facts.workingPressurePa)];
  return isAbove(lifts, limit)
    ? make.fail(
        `The safety valve lifted at ${pressureText(lifts)}; it should by ${pressureText(limit)}.`,
        figures,
      )
    : make.pass(
        `It lifted at ${pressureText(lifts)}, for ${pressureText(facts.workingPressurePa)} claimed.`,
        figures,
      );
}

export function accumulation({ facts, record }: SurveyInput): EngineeringCheck {
  const make = check('accumulation', 'Pressure held by the safety valve', 'safety.capacity');
  const { steam } = record;
  if (steam?.raisedSteam !== true || steam.highestPressurePa === null)
    return make.cannotSay('It was not tried with full fire and everything shut.');
  const highest = steam.highestPressurePa;
  const limit = mostWithValveLiftingPa(facts.workingPressurePa);
  const figures = [figure('Highest pressure', highest, 'Pa'), working(facts.workingPressurePa)];
  if (isAbove(highest, limit))
    return make.fail(
      `Pressure rose to ${pressureText(highest)} with the fire full and everything shut; the most allowed is ${pressureText(limit)}.`,
      figures,
    );
  if (steam.valveLiftsAtPa === null)
    return make.cannotSay('The safety valve is not recorded as lifting, so this shows nothing.', figures);
  return make.pass(
    `Pressure settled at ${pressureText(highest)} with the fire full and everything shut.`,
    figures,
  );
}

export function valveReseat({ record }: SurveyInput): EngineeringCheck {
  const make = check('valve-reseat', 'Safety valve reseats', 'safety.valve');
  const lifts = record.steam?.valveLiftsAtPa ?? null;
  const reseats = record.steam?.valveReseatsAtPa ?? null;
  if (lifts === null || reseats === null) return make.cannotSay('Lift and reseat are not both recorded.');
  const figures = [figure('Lifts at', lifts, 'Pa'), figure('Reseats at', reseats, 'Pa')];
  // Not more than a tenth below the lift: Indian Boiler Regulations, regulation 295.
  return isAbove((lifts * 9) / 10, reseats)
    ? make.fail(
        `It lifts at ${pressureText(lifts)} and does not reseat until ${pressureText(reseats)}, more than a tenth below.`,
        figures,
      )
    : make.pass(`It lifts at ${pressureText(lifts)} and reseats at ${pressureText(reseats)}.`, figures);
}

export function gaugePassages({ record }: SurveyInput): EngineeringCheck {
  const make = check('gauge-passages', 'Water gauge passages', 'safety.glass');
  const clear = record.steam?.passagesClear ?? null;
  if (clear === null) return make.cannotSay('They were not tried under steam.');
  return clear
    ? make.pass('Both passages blew through clear.')
    : make.fail('A water gauge passage did not blow through clear.');
}

export function gasTightness({ facts, record }: SurveyInput): EngineeringCheck {
  const make = check('gas-tightness', 'Fuel tightness', 'firing.fuel');
  if (facts.firing !== 'gas') return make.pass('It is not fired by gas.');
  const tight = record.steam?.gasTight ?? null;
  if (tight === null) return make.cannotSay('The gas joints were not tried under fire.');
  return tight
    ? make.pass('No gas leak was left.')
    : make.fail('A gas leak was found and could not be made good.');
}

export function carbonMonoxide({ record }: SurveyInput): EngineeringCheck {
  const make = check('carbon-monoxide', 'Carbon monoxide at the operator', 'firing.draught');
  const ppm = record.steam?.coPpmAtOperator ?? null;
  if (ppm === null) return make.cannotSay('It was not measured.');
  const figures = [figure('Measured', ppm, 'ppm'), figure('Short-term limit', limits.coShortTermPpm, 'ppm')];
  return ppm >= limits.coShortTermPpm
    ? make.fail(
        `${String(ppm)} ppm of carbon monoxide where the operator stands; the short-term limit is ${String(limits.coShortTermPpm)} ppm.`,
        figures,
      )
    : make.pass(`${String(ppm)} ppm where the operator stands.`, figures);
}

const softJoints: ReadonlySet<unknown> = new Set(['soft-solder', 'rivets-soft']);

export function jointMaterial(items: readonly Examined[]): EngineeringCheck {
  const make = check('joint-material', 'What the joints are made with', 'shell.joints');
  const found = valuesOf(items, 'shell.joints', 'jointMaterial');
  if (found.every((value) => value === 'not-known'))
    return make.cannotSay('What the joints are made with is not recorded.');
  return found.some((value) => softJoints.has(value))
    ? make.fail('Soft solder was found in a pressure joint.')
    : make.pass('No soft solder was found in a pressure joint.');
}
