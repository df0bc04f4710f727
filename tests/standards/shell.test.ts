import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { allowableStress, elasticity } from '#shared/engineering/metal.ts';
import { fluePressure, longFlueLine, shortFlueLine } from '#shared/engineering/flue.ts';
import {
  copperStayPressure,
  rectangularPlatePressure,
  rodStayDiameter,
  stayedPlatePressure,
  stayFactor,
  stayLoad,
  threadCore,
  unstayedPlatePressure,
} from '#shared/engineering/plates.ts';
import {
  barrelPressure,
  barrelThickness,
  tradeBarrelPressure,
  tubePressure,
} from '#shared/engineering/shell.ts';
import { jointMetals } from '#shared/engineering/joints.ts';
import { saturationTemperatureK } from '#shared/engineering/steam.ts';
import { isRefusal, valueOf } from '#shared/engineering/working.ts';
import { inch, near, nearly, psi, titled } from './check-case.ts';

const kelvin = (fahrenheit: number): number => (fahrenheit + 459.67) / 1.8;

describe('barrel, ASME VIII-1 UG-27(c)(1)', () => {
  const example = { insideRadiusMm: 48.125 * inch, stressPa: 17_500 * psi, joint: 0.85 };

  test(titled('SH-01'), () => {
    near(valueOf(barrelThickness({ ...example, pressurePa: 100 * psi }))! / inch, 0.324_84, 0.000_1);
  });

  test(titled('SH-02'), () => {
    near(valueOf(barrelPressure({ ...example, thicknessMm: 0.375 * inch }))! / psi, 115.37, 0.01);
  });

  test(titled('SH-14'), () => {
    const { value } = tradeBarrelPressure({ outsideMm: 4 * inch, thicknessMm: 0.08 * inch }).result;
    near(value / psi, 100, 0.01);
  });

  test('a wall past half the radius, and a pressure past 0.385 of the stress, are refused', () => {
    expect(isRefusal(barrelPressure({ insideRadiusMm: 10, thicknessMm: 6, stressPa: 3e7, joint: 1 }))).toBe(
      true,
    );
    expect(isRefusal(barrelThickness({ insideRadiusMm: 10, pressurePa: 2e7, stressPa: 3e7, joint: 1 }))).toBe(
      true,
    );
  });
});

describe('copper tube, Copper Development Association, rated pressures', () => {
  test.each([
    { id: 'SH-03', stress: 6_000, rated: 494, outside: 0.6275 },
    { id: 'SH-04', stress: 5_100, rated: 420, outside: 0.6275 },
    { id: 'SH-06', stress: 4_800, rated: 395, outside: 0.6275 },
    { id: 'SH-07', stress: 4_700, rated: 387, outside: 0.6275 },
    { id: 'SH-08', stress: 4_000, rated: 329, outside: 0.6275 },
    { id: 'SH-09', stress: 3_000, rated: 247, outside: 0.6275 },
    { id: 'SH-11', stress: 10_300, rated: 850, outside: 0.626 },
  ])('$id: $stress psi allowable → $rated psi', ({ stress, rated, outside }) => {
    const pa = valueOf(
      tubePressure({ outsideMm: outside * inch, thicknessMm: 0.025 * inch, stressPa: stress * psi }),
    );
    near(pa! / psi, rated, 1);
  });

  test(titled('SH-13'), () => {
    // The same form with D − t below the line; ours, with D − 0.8 t, is 0.9 % under it.
    const pa = valueOf(tubePressure({ outsideMm: 15.88, thicknessMm: 0.81, stressPa: 34e6 }));
    nearly(pa! / 1e5, 36.5, 0.012);
  });

  test.each([
    { fahrenheit: 100, stress: 6_000 },
    { fahrenheit: 150, stress: 5_100 },
    { fahrenheit: 300, stress: 4_700 },
    { fahrenheit: 350, stress: 4_000 },
    { fahrenheit: 400, stress: 3_000 },
  ])('allowable stress of annealed copper at $fahrenheit °F', ({ fahrenheit, stress }) => {
    near(valueOf(allowableStress('copper', kelvin(fahrenheit)))! / psi, stress, 0.001);
  });

  test(titled('SH-12'), () => {
    const stress = allowableStress('copper', saturationTemperatureK(80 * psi + 101_325));
    near(valueOf(stress)! / psi, 4_365, 2);
  });

  test('nothing is said of copper above 400 °F, nor of brass at any heat', () => {
    expect(allowableStress('copper', kelvin(401))).toMatchObject({ refused: 'not-published' });
    expect(allowableStress('brass', 300)).toMatchObject({ refused: 'not-published' });
  });
});

describe('outside pressure', () => {
  const plain = { lengthMm: null, stressPa: 1e9 };

  test(titled('EX-01'), () => {
    // The printed form is by mean radius, E/(4(1 − ν²))·(t/r)³; ours by diameter is the same with D = 2r, knocked down by 3.
    const line = longFlueLine({
      ...plain,
      outsideMm: 2 * 6.75,
      thicknessMm: 0.375,
      youngPa: 29e6 * psi,
      poisson: 0.29,
    });
    near((line.result.value * 3) / psi, 1_357, 1);
  });

  const sturm = { outsideMm: 60, thicknessMm: 0.375, youngPa: 29e6 * psi, poisson: 0.3, stressPa: 1e9 };

  test(titled('EX-03'), () => {
    near((shortFlueLine({ ...sturm, lengthMm: 120 }).result.value * 3) / psi, 118.4, 0.2);
  });

  test(titled('EX-02'), () => {
    nearly((shortFlueLine({ ...sturm, lengthMm: 120 }).result.value * 3) / psi, 113, 0.06);
  });

  test(titled('EX-05'), () => {
    const flue = { outsideMm: 50, thicknessMm: 1.6, stressPa: 30e6, ...elasticity.copper };
    nearly((shortFlueLine({ ...flue, lengthMm: 150 }).result.value * 3) / 1e6, 19.48, 0.002);
    nearly((longFlueLine({ ...flue, lengthMm: 150 }).result.value * 3) / 1e6, 8.67, 0.002);
    const governed = fluePressure({ ...flue, lengthMm: 150 });
    expect('least' in governed && governed.least.source).toBe('flue-yield');
  });
});

describe('flat plates and stays', () => {
  const plate = (thickness: number, pitch: number) =>
    valueOf(
      stayedPlatePressure({
        thicknessMm: thickness * inch,
        pitchMm: pitch * inch,
        stressPa: 13_800 * psi,
      }),
    )! / psi;

  test(titled('PL-01'), () => near(plate(0.25, 3.5), 148, 0.5));
  test(titled('PL-03'), () => near(plate(0.44, 3.5), 480, 0.5));
  test(titled('PL-04'), () => near(plate(0.19, 3.5), 85, 0.5));
  test(titled('PL-05'), () => near(plate(0.19, 3.625), 80, 0.5));

  test(titled('PL-07'), () => {
    expect(stayFactor('headed', 0.43 * inch)).toBe(2.1);
    expect(stayFactor('headed', 0.44 * inch)).toBe(2.2);
  });

  test('rows at one pitch both ways are a square', () => {
    const of = { thicknessMm: 3, stressPa: 3e7 };
    near(
      valueOf(rectangularPlatePressure({ ...of, lengthwiseMm: 20, crosswiseMm: 20 })),
      valueOf(stayedPlatePressure({ ...of, pitchMm: 20 }))!,
      1e-6,
    );
  });

  test(titled('PL-08'), () => {
    const { value } = copperStayPressure({ diameterMm: inch / 4, tpi: 40, areaMm2: inch ** 2 }).result;
    near(value / psi, 223.4, 0.1);
  });

  test(titled('PL-09'), () => {
    near(stayLoad({ pressurePa: 0.55e6, pitchMm: 25, diameterMm: 6 }).result.value, 328.2, 0.1);
  });

  test(titled('PL-10'), () => {
    near(rodStayDiameter({ pressurePa: 0.55e6, areaMm2: 625, stressPa: 26e6 }).result.value, 4.1, 0.01);
  });

  test(titled('SH-15'), () => near(26_000_000 / psi, 3_771, 1));

  test('an unstayed end lies between a plate clamped at its edge and one merely held (Timoshenko, Theory of Plates; from memory)', () => {
    const [t, r, stress] = [3, 50, 30e6];
    const is = valueOf(unstayedPlatePressure({ thicknessMm: t, diameterMm: 2 * r, stressPa: stress }))!;
    const clamped = stress / (0.75 * (r / t) ** 2);
    const held = stress / (1.24 * (r / t) ** 2);
    expect(is).toBeLessThan(clamped);
    expect(is).toBeGreaterThan(held * 0.9);
  });

  test(titled('TH-02'), () => {
    near(threadCore({ outsideMm: inch / 4, tpi: 40 }).result.value / inch, 0.218, 0.000_2);
    near(threadCore({ outsideMm: (3 * inch) / 16, tpi: 40 }).result.value / inch, 0.155_5, 0.000_2);
    near(threadCore({ outsideMm: (5 * inch) / 16, tpi: 32 }).result.value / inch, 0.272_5, 0.000_2);
  });
});

describe('joints', () => {
  test(titled('JO-01'), () => {
    expect(jointMetals['tin-lead'].ratedPa / psi).toBeCloseTo(15, 9);
    expect(jointMetals['tin-antimony'].ratedPa / psi).toBeCloseTo(15, 9);
    expect(jointMetals['silver-55'].ratedPa / psi).toBeCloseTo(120, 9);
  });

  test(titled('JO-02'), () => {
    expect(jointMetals['tin-lead'].meltsCelsius).toEqual([183, 183]);
    expect(jointMetals['silver-55'].meltsCelsius).toEqual([630, 660]);
    expect(jointMetals['silver-45'].meltsCelsius).toEqual([640, 680]);
    expect(jointMetals['silver-40'].meltsCelsius).toEqual([650, 710]);
    expect(jointMetals['silver-30'].meltsCelsius).toEqual([665, 755]);
  });
});

describe('what physics asks of any boiler', () => {
  const outsideMm = fc.double({ min: 30, max: 400, noNaN: true });
  const share = fc.double({ min: 0.004, max: 0.16, noNaN: true });
  const stressPa = fc.double({ min: 1e7, max: 2e8, noNaN: true });

  test('a thicker wall is never weaker: barrel, flue, tube, plate', () => {
    fc.assert(
      fc.property(outsideMm, share, share, stressPa, fc.option(outsideMm), (across, a, b, stress, long) => {
        const walls = [Math.min(a, b) * across, Math.max(a, b) * across] as const;
        const [thin, thick] = walls;
        const barrel = (t: number) =>
          valueOf(
            barrelPressure({ insideRadiusMm: across / 2 - t, thicknessMm: t, stressPa: stress, joint: 0.8 }),
          );
        const flue = (t: number) => {
          const of = fluePressure({
            outsideMm: across,
            thicknessMm: t,
            lengthMm: long,
            stressPa: stress,
            ...elasticity.copper,
          });
          return 'least' in of ? of.least.result.value : Number.NaN;
        };
        const tube = (t: number) =>
          valueOf(tubePressure({ outsideMm: across, thicknessMm: t, stressPa: stress }));
        const plate = (t: number) =>
          valueOf(stayedPlatePressure({ thicknessMm: t, pitchMm: across, stressPa: stress }));
        for (const stands of [barrel, flue, tube, plate]) {
          expect(stands(thick)!).toBeGreaterThanOrEqual(stands(thin)! * (1 - 1e-12));
        }
      }),
      { numRuns: 1_000 },
    );
  });

  test('hotter copper, and hotter stainless, is never stronger', () => {
    const at = fc.double({ min: 273, max: 477, noNaN: true });
    fc.assert(
      fc.property(at, at, fc.constantFrom('copper' as const, 'stainless' as const), (a, b, metal) => {
        const [cool, hot] = [Math.min(a, b), Math.max(a, b)];
        expect(valueOf(allowableStress(metal, hot))!).toBeLessThanOrEqual(
          valueOf(allowableStress(metal, cool))!,
        );
      }),
      { numRuns: 1_000 },
    );
  });
});
