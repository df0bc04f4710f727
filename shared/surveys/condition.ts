import { isExamined, isFitted } from './examined.ts';
import type { Examined } from './examined.ts';
import { limits } from './limits.ts';
import type { Grade } from './record.ts';

const pointsByGrade: Record<Grade, number> = { ...limits.gradePoints, notExamined: 0, notFitted: 0 };
const pointsOf = ({ finding }: Examined): number => pointsByGrade[finding.grade];

const weightOf = (items: readonly Examined[]): number =>
  items.reduce((sum, { criterion }) => sum + criterion.weight, 0);

/** Weighted mean of the grade points over what was examined, nearest whole number, halves up; null if nothing was. */
export function meanOf(items: readonly Examined[]): number | null {
  const examined = items.filter(isExamined);
  const weight = weightOf(examined);
  if (weight === 0) return null;
  const points = examined.reduce((sum, item) => sum + item.criterion.weight * pointsOf(item), 0);
  // Weights and points are whole numbers, so this is exact: no half is lost to binary fractions.
  return Math.floor((2 * points + weight) / (2 * weight));
}

/** Condition, 0–100; null where less than a third of the applicable weight was examined. */
export function conditionOf(items: readonly Examined[]): number | null {
  const examined = weightOf(items.filter(isExamined));
  const applicable = weightOf(items.filter(isFitted));
  return examined * limits.leastExaminedParts < applicable ? null : meanOf(items);
}
