import { barLitres } from '../boilers/boiler.ts';
import { boilerTypeOf } from '../boilers/boiler-types.ts';
import { check, figure } from './check.ts';
import { figureOf } from './examined.ts';
import type { Examined, SurveyInput } from './examined.ts';
import { limits } from './limits.ts';
import type { EngineeringCheck } from './result.ts';
import { lengthText, rateText, trim } from './words.ts';

export function barLitresCheck({ facts }: SurveyInput): EngineeringCheck {
  const make = check('bar-litres', 'Bar·litres', null);
  const product = Math.round(barLitres(facts) * 100) / 100;
  const part =
    product < limits.secondFeedBarLitres
      ? 'Under 3, the small-boiler part of a club code usually applies.'
      : 'At 3 or more, the main part of a club code usually applies.';
  return make.pass(`${trim(product, 2)} bar·litres. ${part} The local code governs.`, [
    figure('Working pressure times water capacity', product, 'bar·L'),
  ]);
}

export function waterLevel(items: readonly Examined[]): EngineeringCheck {
  const make = check('water-level', 'Lowest visible level', 'safety.glass');
  const above = figureOf(items, 'safety.glass', 'lowestLevelAboveCrownMm');
  if (above === null)
    return make.cannotSay('The lowest visible level was not measured against the crown or top tube.');
  const figures = [figure('Lowest visible level above the crown or top tube', above, 'mm')];
  return above < 0
    ? make.fail(
        `The water gauge still shows water ${lengthText(-above)} below the crown or top tube.`,
        figures,
      )
    : make.pass(`The lowest level to be seen is ${lengthText(above)} above the crown or top tube.`, figures);
}

export function secondFeed({ facts }: SurveyInput, items: readonly Examined[]): EngineeringCheck {
  const make = check('second-feed', 'Second means of feed', 'feed.second');
  const isFed = (boilerTypeOf(facts.type).traits as readonly string[]).includes('pressure-feed');
  const product = barLitres(facts);
  const isAsked = isFed && (facts.firing === 'coal' || product >= limits.secondFeedBarLitres);
  if (!isAsked)
    return make.pass('Not asked for on a boiler of this size and firing. The local code governs.');
  const grade = items.find(({ criterion }) => criterion.id === 'feed.second')?.finding.grade;
  const why =
    facts.firing === 'coal' ? 'a coal fire cannot be put out at once' : 'it holds 3 bar·litres or more';
  const figures = [figure('Working pressure times water capacity', Math.round(product * 100) / 100, 'bar·L')];
  if (grade === 'notFitted')
    return make.fail(`There is no second means of feed, and one is asked for because ${why}.`, figures);
  if (grade === 'unfit')
    return make.fail(`The second means of feed is Unfit, and one is asked for because ${why}.`, figures);
  if (grade === undefined || grade === 'notExamined')
    return make.cannotSay('The second means of feed was not examined.', figures);
  return make.pass('There is a second means of feed.', figures);
}

/** Delivery of the first means of feed against the steam made; both measured. */
export function feedRate({ record }: SurveyInput, items: readonly Examined[]): EngineeringCheck {
  const make = check('feed-rate', 'Feed against evaporation', 'feed.first');
  const delivered = figureOf(items, 'feed.first', 'deliveryKgPerH');
  const evaporated = record.steam?.evaporationKgPerH ?? null;
  if (delivered === null || evaporated === null)
    return make.cannotSay('Delivery and evaporation were not both measured.');
  const figures = [figure('Delivered', delivered, 'kg/h'), figure('Evaporated', evaporated, 'kg/h')];
  const told = `The first feed delivers ${rateText(delivered)} and the fire evaporates ${rateText(evaporated)}`;
  if (delivered < evaporated) return make.fail(`${told}: it cannot keep up.`, figures);
  return delivered * 10 < evaporated * 15
    ? make.pass(`${told}: it keeps up, with less than the half as much again usually wanted.`, figures)
    : make.pass(`${told}.`, figures);
}
