import type { BoilerFacts } from '../boilers/boiler.ts';
import type { BoilerTypeId } from '../boilers/boiler-types.ts';
import { currentRubric, criteriaFor } from '../surveys/rubric/index.ts';
import type { Criterion, Rubric } from '../surveys/rubric/types.ts';
import { openSheet } from './drawing.ts';
import type { Balloon, Drawing, Sheet, Spot } from './drawing.ts';
import { drawCentreFlue, drawLocomotive, drawPot, drawReturnFlue } from './horizontal.ts';
import { drawVertical } from './vertical.ts';
import { drawWaterTube } from './water-tube.ts';

const width = 700;
const height = 560;
export const balloonRadius = 13;
const columnLeft = 24;
const columnRight = width - 24;
const columnTop = 26;
const columnBottom = 470;

const draw: Readonly<Record<BoilerTypeId, (sheet: Sheet, facts: BoilerFacts) => void>> = {
  'vertical-multi-tube': drawVertical,
  'vertical-centre-flue': drawVertical,
  'vertical-cross-tube': drawVertical,
  locomotive: drawLocomotive,
  'return-flue': drawReturnFlue,
  'horizontal-centre-flue': drawCentreFlue,
  'water-tube': drawWaterTube,
  pot: drawPot,
};

interface Placed {
  criterion: Criterion;
  spot: Spot;
}

/** Whether the leaders of two balloons, one above the other, cross on the way to their spots. */
function cross(x: number, upper: number, [ax, ay]: Spot, lower: number, [bx, by]: Spot): boolean {
  const reach = Math.min(Math.abs(ax - x), Math.abs(bx - x));
  const at = (from: number, sx: number, sy: number): number =>
    from + ((sy - from) * reach) / Math.abs(sx - x);
  // Leaders that end on one spot meet there; the margin keeps rounding from calling that a crossing.
  return at(upper, ax, ay) > at(lower, bx, by) + 0.01;
}

/** Exchanges whichever two leaders cross until none do; each exchange shortens the leaders, so it comes to an end. */
function uncrossed(items: readonly Placed[], x: number, yOf: (index: number) => number): Placed[] {
  const order = [...items];
  for (let isTangled = true; isTangled;) {
    isTangled = false;
    for (let upper = 0; upper < order.length; upper += 1)
      for (let lower = upper + 1; lower < order.length; lower += 1) {
        const [a, b] = [order[upper], order[lower]];
        if (!a || !b || !cross(x, yOf(upper), a.spot, yOf(lower), b.spot)) continue;
        [order[upper], order[lower]] = [b, a];
        isTangled = true;
      }
  }
  return order;
}

/** One column of balloons, so ordered that their leaders do not cross. */
function column(items: readonly Placed[], x: number): Balloon[] {
  const sorted = items.toSorted((a, b) => a.spot[1] - b.spot[1] || a.criterion.number - b.criterion.number);
  const step = sorted.length < 2 ? 0 : Math.min(48, (columnBottom - columnTop) / (sorted.length - 1));
  const start = (columnTop + columnBottom - step * (sorted.length - 1)) / 2;
  const yOf = (index: number): number => Math.round(start + index * step);
  return uncrossed(sorted, x, yOf).map(({ criterion, spot }, index) => ({
    criterionId: criterion.id,
    number: criterion.number,
    x,
    y: yOf(index),
    to: spot,
  }));
}

/** What has no place on the boiler stands in a row at the foot. */
function footRow(items: readonly Criterion[]): Balloon[] {
  const step = Math.min(36, (columnRight - columnLeft) / Math.max(1, items.length - 1));
  const start = width / 2 - (step * (items.length - 1)) / 2;
  return items.map(({ id, number }, index) => ({
    criterionId: id,
    number,
    x: Math.round(start + index * step),
    y: height - 30,
    to: null,
  }));
}

/**
 * The general arrangement of a boiler of this type, in proportion to its sizes where it can be, with a balloon for every
 * item of the method that applies to it.
 */
export function drawingOf(facts: BoilerFacts, rubric: Rubric = currentRubric): Drawing {
  const sheet = openSheet();
  draw[facts.type](sheet, facts);
  const criteria = criteriaFor(facts, rubric);
  const placed = criteria
    .flatMap((criterion): Placed[] => {
      const spot = sheet.spots.get(criterion.id);
      return spot === undefined ? [] : [{ criterion, spot }];
    })
    .toSorted((a, b) => a.spot[0] - b.spot[0] || a.criterion.number - b.criterion.number);
  const half = Math.ceil(placed.length / 2);
  return {
    width,
    height,
    strokes: sheet.strokes,
    balloons: [
      ...column(placed.slice(0, half), columnLeft),
      ...column(placed.slice(half), columnRight),
      ...footRow(criteria.filter(({ id }) => !sheet.spots.has(id))),
    ],
  };
}
