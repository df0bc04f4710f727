import { isExamined, isFitted } from './examined.ts';
import type { Examined } from './examined.ts';
import { hasInDate } from './instruments.ts';
import { limits } from './limits.ts';
import type { SurveyRecord } from './record.ts';
import type { Way } from './rubric/types.ts';

const half = (isGood: boolean): number => (isGood ? 1 : limits.outOfDateFactor);

/** What share of its strength a way keeps: nothing without its test, half with an instrument out of date. */
function factorOf(way: Way, record: SurveyRecord): number {
  if (way.id === 'hydraulic') return record.hydraulic === null ? 0 : half(hasInDate(record, 'test-gauge'));
  if (way.id === 'steam')
    return record.steam?.raisedSteam === true ? half(hasInDate(record, 'test-gauge')) : 0;
  if (way.id === 'comparison') return half(hasInDate(record, 'test-gauge'));
  if (way.id === 'co-meter')
    return (record.steam?.coPpmAtOperator ?? null) === null ? 0 : half(hasInDate(record, 'co-meter'));
  return 1;
}

/** How surely one criterion is known, 0–1: one less the product of what each way leaves unknown. */
export function strengthOf(item: Examined, record: SurveyRecord): number {
  if (!isExamined(item)) return 0;
  const { criterion, finding } = item;
  const used = criterion.ways
    .map((way, rank) => ({ way, rank, strength: way.strength * factorOf(way, record) }))
    .filter(({ way, strength }) => finding.ways.includes(way.id) && strength > 0);
  const strength = 1 - used.reduce((left, each) => left * (1 - each.strength), 1);
  // Serviceable is held to the same rule as Sound, or marking down a grade would raise Evidence.
  const isPassed = finding.grade === 'sound' || finding.grade === 'serviceable';
  const restsOnFirst = criterion.ways.length > 1 && used.every(({ rank }) => rank === 0);
  const isThin = criterion.safetyCritical && isPassed && restsOnFirst && finding.reason.trim() === '';
  return isThin ? strength * limits.oneWayFactor : strength;
}

/** Known and applicable weight; strengths are binary fractions, so the sums are exact in any order. */
export function evidenceSums(
  items: readonly Examined[],
  record: SurveyRecord,
): { known: number; of: number } {
  return items.filter(isFitted).reduce(
    (sum, item) => ({
      known: sum.known + item.criterion.weight * strengthOf(item, record),
      of: sum.of + item.criterion.weight,
    }),
    { known: 0, of: 0 },
  );
}

/** Evidence, whole per cent, rounded down so that nothing is said to be better known than it is; null over nothing. */
export function evidenceOf(items: readonly Examined[], record: SurveyRecord): number | null {
  const { known, of } = evidenceSums(items, record);
  return of === 0 ? null : Math.floor((known * 100) / of);
}
