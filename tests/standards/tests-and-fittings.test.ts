import { describe, expect, test } from 'vitest';
import { haversineKm } from '#shared/engineering/distance.ts';
import { gaugeWindowPa, mustGaugeComeOff, wantedTestPa } from '#shared/engineering/hydraulic-test.ts';
import { quadraticKappa } from '#shared/engineering/kappa.ts';
import { mostWithValveLiftingPa, napierKgPerH } from '#shared/engineering/safety-valve.ts';

const psi = 6_894.757_293_168;

describe('hydraulic test pressure: UK Boiler Test Code 2012, para 14.3, as quoted (found)', () => {
  test('60 psi working: 120 psi first, 90 psi repeat', () => {
    expect(wantedTestPa(60 * psi, 'first') / psi).toBeCloseTo(120, 9);
    expect(wantedTestPa(60 * psi, 'repeat') / psi).toBeCloseTo(90, 9);
  });
});

describe('test gauge: full scale 1.5 to 4 times the test pressure, ASME VIII-1 UG-102 practice (found)', () => {
  test('120 psi test: 180 to 480 psi', () => {
    const { least, most } = gaugeWindowPa(120 * psi);
    expect(least / psi).toBeCloseTo(180, 9);
    expect(most / psi).toBeCloseTo(480, 9);
  });

  test('the boiler’s own gauge of 0 to 100 psi comes off for 120 psi and may stay for 100', () => {
    expect(mustGaugeComeOff(120 * psi, 100 * psi)).toBe(true);
    expect(mustGaugeComeOff(100 * psi, 100 * psi)).toBe(false);
  });
});

describe('safety valve: Napier, API 520 Part I (found; numbers ours)', () => {
  test('7.917 mm² at 556.4 kPa absolute passes 23.12 kg/h', () => {
    expect(napierKgPerH({ areaMm2: 7.917, pressurePaAbs: 556_400 })).toBeCloseTo(23.12, 1);
  });

  test('a bore of 1/8 in at 60 psi and a tenth passes 51.0 lb/h', () => {
    const areaMm2 = (Math.PI / 4) * 3.175 ** 2;
    const kgPerH = napierKgPerH({ areaMm2, pressurePaAbs: 80.7 * psi });
    expect(kgPerH / 0.453_592_37).toBeCloseTo(51, 0);
  });

  test('accumulation: 60 psi working, 66 psi at most (UK code by its poster; 10 % in the Indian test under steam too)', () => {
    expect(mostWithValveLiftingPa(60 * psi) / psi).toBeCloseTo(66, 9);
  });

  test.each([0, -1, Number.NaN])('an area of %d is a mistake of the caller', (areaMm2) => {
    expect(() => napierKgPerH({ areaMm2, pressurePaAbs: 1e5 })).toThrow(RangeError);
  });
});

describe('distance: haversine', () => {
  test('36.12, −86.67 to 33.94, −118.40 on R 6,372.8 km: 2,887.2599506 km (public test value, found)', () => {
    const a = { latitude: 36.12, longitude: -86.67 };
    expect(haversineKm(a, { latitude: 33.94, longitude: -118.4 }, 6_372.8)).toBeCloseTo(2_887.2599506, 6);
  });

  test('York to London on R 6,371.0088 km: 279.840 km (computed), within 0.1 % of the WGS84 geodesic, 280.093 km', () => {
    const york = { latitude: 53.95763, longitude: -1.08271 };
    const london = { latitude: 51.50853, longitude: -0.12574 };
    expect(haversineKm(york, london, 6_371.0088)).toBeCloseTo(279.84, 2);
    expect(Math.abs(haversineKm(york, london) / 280.093 - 1)).toBeLessThan(0.001);
  });
});

test('weighted kappa, quadratic weights: Agresti 1990 table in the R package vcd, 0.3320 (derived)', () => {
  const table = [
    [7, 7, 2, 3],
    [2, 8, 3, 7],
    [1, 5, 4, 9],
    [2, 8, 9, 14],
  ];
  expect(quadraticKappa(table)).toBeCloseTo(0.332, 4);
});
