import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  allowableStressPa,
  annealedCopperStressPa,
  barrelPressurePa,
  cylinderPressurePa,
  cylinderThickness,
  fluePressurePa,
  stayedPlatePressurePa,
  tubePressurePa,
} from '#shared/engineering/strength.ts';

const psi = 6_894.757_293_168;
const kelvin = (fahrenheit: number): number => (fahrenheit + 459.67) / 1.8;

describe('ASME VIII-1 UG-27(c)(1), published worked example: 100 psi, R 48.125 in, S 17,500 psi, E 0.85 (derived)', () => {
  test('thickness 0.32484 in before the corrosion allowance', () => {
    const inches = cylinderThickness({
      insideRadius: 48.125,
      pressurePa: 100 * psi,
      stressPa: 17_500 * psi,
      joint: 0.85,
    });
    expect(inches).toBeCloseTo(0.32484, 4);
  });

  test('the corroded plate of 0.375 in stands 115.37 psi', () => {
    const pa = cylinderPressurePa({
      insideRadius: 48.125,
      thickness: 0.375,
      stressPa: 17_500 * psi,
      joint: 0.85,
    });
    expect(pa / psi).toBeCloseTo(115.37, 1);
  });
});

describe('Copper Development Association, rated pressure of 1/2 in type M tube (found)', () => {
  test.each([
    { stress: 6_000, rated: 494, outside: 0.6275 },
    { stress: 5_100, rated: 420, outside: 0.6275 },
    { stress: 4_800, rated: 395, outside: 0.6275 },
    { stress: 4_700, rated: 387, outside: 0.6275 },
    { stress: 4_000, rated: 329, outside: 0.6275 },
    { stress: 3_000, rated: 247, outside: 0.6275 },
    { stress: 10_300, rated: 850, outside: 0.626 },
  ])('$stress psi allowable → $rated psi', ({ stress, rated, outside }) => {
    const pa = tubePressurePa({ outside, thickness: 0.025, stressPa: stress * psi });
    expect(Math.abs(pa / psi - rated)).toBeLessThan(1);
  });

  test.each([
    { fahrenheit: 100, stress: 6_000 },
    { fahrenheit: 300, stress: 4_700 },
    { fahrenheit: 350, stress: 4_000 },
    { fahrenheit: 400, stress: 3_000 },
  ])('allowable stress at $fahrenheit °F', ({ fahrenheit, stress }) => {
    expect(annealedCopperStressPa(kelvin(fahrenheit))! / psi).toBeCloseTo(stress, 3);
  });

  test('at the temperature of steam at 80 psi, 4,365 psi by straight line (derived)', () => {
    expect(Math.abs(allowableStressPa('copper', 80 * psi)! / psi - 4_365)).toBeLessThan(2);
  });

  test('hotter than 400 °F nothing is published, and nothing is said', () => {
    expect(annealedCopperStressPa(kelvin(401))).toBeNull();
  });
});

describe('ASME I PG-46 by the National Board’s table, NB-23 Part 2 S2.10.4: 13,800 psi, C 2.1 (found)', () => {
  test.each([
    { thickness: 0.25, pitch: 3.5, rated: 148 },
    { thickness: 0.19, pitch: 3.5, rated: 85 },
    { thickness: 0.19, pitch: 3.625, rated: 80 },
  ])('$thickness in plate, $pitch in pitch → $rated psi', ({ thickness, pitch, rated }) => {
    const pa = stayedPlatePressurePa({
      thicknessMm: thickness * 25.4,
      pitchMm: pitch * 25.4,
      stressPa: 13_800 * psi,
    });
    expect(Math.abs(pa / psi - rated)).toBeLessThan(0.5);
  });
});

describe('what physics asks of any boiler', () => {
  const outsideMm = fc.double({ min: 30, max: 400, noNaN: true });
  const share = fc.double({ min: 0.004, max: 0.2, noNaN: true });
  const stressPa = fc.double({ min: 1e7, max: 2e8, noNaN: true });

  test('a thicker wall is never weaker, inside pressure or outside', () => {
    fc.assert(
      fc.property(outsideMm, share, share, stressPa, (across, a, b, stress) => {
        const [thin, thick] = [Math.min(a, b) * across, Math.max(a, b) * across];
        expect(
          barrelPressurePa({ outsideMm: across, thicknessMm: thick, stressPa: stress }),
        ).toBeGreaterThanOrEqual(
          barrelPressurePa({ outsideMm: across, thicknessMm: thin, stressPa: stress }),
        );
        const flue = { insideMm: across, stressPa: stress, material: 'copper' } as const;
        expect(fluePressurePa({ ...flue, thicknessMm: thick })).toBeGreaterThanOrEqual(
          fluePressurePa({ ...flue, thicknessMm: thin }),
        );
      }),
      { numRuns: 1_000 },
    );
  });

  test('hotter copper is never stronger', () => {
    const at = fc.double({ min: 273, max: 477, noNaN: true });
    fc.assert(
      fc.property(at, at, (a, b) => {
        const [cool, hot] = [Math.min(a, b), Math.max(a, b)];
        expect(annealedCopperStressPa(hot)!).toBeLessThanOrEqual(annealedCopperStressPa(cool)!);
      }),
      { numRuns: 1_000 },
    );
  });
});
