import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { boilerTypeIds } from '#shared/boilers/boiler-types.ts';
import { balloonRadius, drawingOf } from '#shared/drawings/index.ts';
import { criteriaFor } from '#shared/surveys/rubric/index.ts';
import { anyFacts } from '../surveys/arbitrary.ts';
import { goodFacts } from '../surveys/example.ts';

describe('the general arrangement of any boiler', () => {
  test('has one balloon for every item that applies, none over another, all in the frame, every figure a number', () => {
    fc.assert(
      fc.property(anyFacts, (facts) => {
        const { balloons, strokes, width, height } = drawingOf(facts);
        const numbers = balloons.map(({ criterionId }) => criterionId).toSorted();
        expect(numbers).toEqual(
          criteriaFor(facts)
            .map(({ id }) => id)
            .toSorted(),
        );
        for (const [index, one] of balloons.entries())
          for (const other of balloons.slice(index + 1))
            expect(Math.hypot(one.x - other.x, one.y - other.y)).toBeGreaterThanOrEqual(2 * balloonRadius);
        const spots = balloons.flatMap(({ x, y, to }) => [[x, y] as const, ...(to === null ? [] : [to])]);
        for (const [x, y] of spots) {
          expect(x >= 0 && x <= width).toBe(true);
          expect(y >= 0 && y <= height).toBe(true);
        }
        for (const { d } of strokes) expect(d).not.toMatch(/NaN|Infinity|undefined/);
      }),
      { numRuns: 400 },
    );
  });

  test('has no two leaders that cross', () => {
    type Point = readonly [number, number];
    // How far c lies from the line through a and b, to one hand or the other.
    const off = ([ax, ay]: Point, [bx, by]: Point, [cx, cy]: Point) =>
      ((bx - ax) * (cy - ay) - (by - ay) * (cx - ax)) / Math.hypot(bx - ax, by - ay);
    // By more than half a unit, so that leaders that meet on one spot do not count.
    const parts = (a: Point, b: Point, c: Point, d: Point) => {
      const [one, other] = [off(a, b, c), off(a, b, d)];
      return one * other < 0 && Math.min(Math.abs(one), Math.abs(other)) > 0.5;
    };
    fc.assert(
      fc.property(anyFacts, (facts) => {
        const leaders = drawingOf(facts).balloons.flatMap(({ x, y, to }) =>
          to === null ? [] : [{ from: [x, y] as const, to }],
        );
        for (const [index, one] of leaders.entries())
          for (const other of leaders.slice(index + 1))
            expect(
              parts(one.from, one.to, other.from, other.to) && parts(other.from, other.to, one.from, one.to),
            ).toBe(false);
      }),
      { numRuns: 150 },
    );
  });

  test('is drawn in proportion: a longer barrel is a slimmer one, and more tubes are more lines', () => {
    const of = (change: Partial<typeof goodFacts.dimensions>) =>
      JSON.stringify(drawingOf({ ...goodFacts, dimensions: { ...goodFacts.dimensions, ...change } }).strokes);
    expect(of({ barrelLengthMm: 240 })).not.toBe(of({ barrelLengthMm: 130 }));
    expect(of({ tubeCount: 30 }).length).toBeGreaterThan(of({ tubeCount: 6 }).length);
  });

  test('shows what is fitted and nothing else', () => {
    const bare = drawingOf({ ...goodFacts, fittings: [] });
    const full = drawingOf(goodFacts);
    const pointed = (drawing: typeof bare, id: string) =>
      drawing.balloons.find(({ criterionId }) => criterionId === id)?.to ?? null;
    expect(pointed(full, 'safety.valve')).not.toBeNull();
    expect(pointed(bare, 'safety.valve')).toBeNull();
    expect(full.strokes.length).toBeGreaterThan(bare.strokes.length);
  });

  test.each(boilerTypeIds)('%s is drawn the same each time', (type) => {
    expect(JSON.stringify(drawingOf({ ...goodFacts, type }))).toBe(
      JSON.stringify(drawingOf({ ...goodFacts, type })),
    );
  });
});
