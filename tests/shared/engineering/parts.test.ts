import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { pressureByParts, wallNeeded } from '#shared/engineering/parts.ts';
import type { PartsInput } from '#shared/engineering/parts.ts';
import { barrelPressure, seamEfficiencies } from '#shared/engineering/shell.ts';
import { valueOf } from '#shared/engineering/working.ts';

const bar = 100_000;
const whole: PartsInput = {
  material: 'copper',
  workingPa: 4 * bar,
  barrel: { outsideMm: 100, wallMm: 2, seam: 'brazed', isInFire: false },
  plates: { thicknessMm: 3, support: { by: 'stays', pitchMm: 18 } },
  flue: { outsideMm: 40, wallMm: 1.5, lengthMm: 150 },
  tubes: { outsideMm: 10, wallMm: 0.9, lengthMm: null, pressure: 'outside' },
  stays: { diameterMm: 5, pitchMm: 20, tpi: 40 },
};
const standsOf = (input: PartsInput, id: string): number | null =>
  pressureByParts(input).parts.find((part) => part.id === id)?.standsPa ?? null;

describe('pressure by parts', () => {
  test('works out every part that is there, and names the weakest', () => {
    const { parts, weakest } = pressureByParts(whole);
    expect(parts.map(({ id }) => id)).toEqual(['barrel', 'plates', 'flue', 'tubes', 'stays']);
    expect(parts.every(({ standsPa }) => standsPa !== null)).toBe(true);
    expect(weakest?.standsPa).toBe(Math.min(...parts.map(({ standsPa }) => standsPa ?? Infinity)));
  });

  test('a copper barrel is held to the trade’s older rule, factor 8, where that is lower', () => {
    // By hand: 2·25,000·0.8·2/(100·8) = 100 psi.
    expect((standsOf(whole, 'barrel') ?? 0) / 6_894.757).toBeCloseTo(100, 2);
    expect(pressureByParts(whole).parts[0]?.governing?.source).toBe('trade-barrel');
    expect(pressureByParts({ ...whole, material: 'steel' }).parts[0]?.governing?.source).toBe('shell-ug27');
  });

  test('metal in the fire is hotter, so weaker', () => {
    const cool = pressureByParts({ ...whole, marginK: 0 });
    const hot = pressureByParts({ ...whole, marginK: 40 });
    const lost = cool.parts.map(({ id, standsPa }, index) => {
      const hotter = hot.parts[index]?.standsPa ?? 0;
      return [id, Math.sign(hotter - (standsPa ?? 0))];
    });
    // The barrel is outside the fire.
    expect(lost).toEqual([
      ['barrel', 0],
      ['plates', -1],
      ['flue', -1],
      ['tubes', -1],
      ['stays', -1],
    ]);
  });

  test('brass ends, copper too hot for its table, and a size nobody knows: refused in words', () => {
    const refusals = (input: PartsInput) =>
      pressureByParts(input).parts.flatMap(({ id, refusal }) =>
        refusal ? [`${id}: ${refusal.refused}`] : [],
      );
    expect(refusals({ ...whole, material: 'copper-brass' })).toEqual(['plates: not-published']);
    expect(refusals({ ...whole, workingPa: 17 * bar })).toContain('barrel: not-published');
    expect(refusals({ ...whole, flue: { outsideMm: 40, wallMm: null, lengthMm: null } })).toEqual([
      'flue: measure-it',
    ]);
    expect(refusals({ ...whole, stays: { diameterMm: 20, pitchMm: 20, tpi: null } })).toEqual([
      'stays: out-of-range',
    ]);
  });

  test('a longer flue is never stronger, nor a wider pitch, nor a thinner stay', () => {
    const length = fc.double({ min: 20, max: 2_000, noNaN: true });
    const wall = fc.double({ min: 0.3, max: 3, noNaN: true });
    fc.assert(
      fc.property(length, length, wall, (a, b, wallMm) => {
        const [short, long] = [Math.min(a, b), Math.max(a, b)];
        const flue = (lengthMm: number) =>
          standsOf({ ...whole, flue: { outsideMm: 40, wallMm, lengthMm } }, 'flue') ?? 0;
        expect(flue(long)).toBeLessThanOrEqual(flue(short) * (1 + 1e-12));
      }),
      { numRuns: 1_000 },
    );
    const pitch = fc.double({ min: 13, max: 80, noNaN: true });
    const stay = fc.double({ min: 2, max: 12, noNaN: true });
    fc.assert(
      fc.property(pitch, pitch, stay, stay, (a, b, c, d) => {
        const stands = (pitchMm: number, diameterMm: number) =>
          standsOf({ ...whole, stays: { pitchMm, diameterMm, tpi: 40 } }, 'stays') ?? 0;
        const slack = 1 + 1e-12;
        expect(stands(Math.max(a, b), c)).toBeLessThanOrEqual(stands(Math.min(a, b), c) * slack);
        expect(stands(a, Math.min(c, d))).toBeLessThanOrEqual(stands(a, Math.max(c, d)) * slack);
      }),
      { numRuns: 1_000 },
    );
  });

  test('a higher working pressure, so hotter metal, never lends strength', () => {
    const pressure = fc.double({ min: bar / 10, max: 12 * bar, noNaN: true });
    fc.assert(
      fc.property(pressure, pressure, (a, b) => {
        const at = (workingPa: number) => pressureByParts({ ...whole, workingPa }).weakest?.standsPa ?? 0;
        expect(at(Math.max(a, b))).toBeLessThanOrEqual(at(Math.min(a, b)));
      }),
      { numRuns: 1_000 },
    );
  });

  test('the wall a barrel needs just stands, and a hair less does not', () => {
    const stands = (wallMm: number) =>
      valueOf(
        barrelPressure({
          insideRadiusMm: 50 - wallMm,
          thicknessMm: wallMm,
          stressPa: 30e6,
          joint: seamEfficiencies.brazed.efficiency,
        }),
      );
    const needed = wallNeeded(4 * bar, stands, 10)!;
    expect(stands(needed)!).toBeGreaterThanOrEqual(4 * bar);
    expect(stands(needed - 0.002)!).toBeLessThan(4 * bar);
    expect(wallNeeded(400 * bar, stands, 10)).toBeNull();
  });
});
