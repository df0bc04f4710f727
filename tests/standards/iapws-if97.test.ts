import { readFileSync } from 'node:fs';
import path from 'node:path';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  saturatedAt,
  saturationPressurePaAbs,
  saturationTemperatureK,
  steamAt,
  waterAt,
} from '#shared/engineering/steam.ts';

/** Relative difference; the release prints nine digits. */
const off = (is: number, printed: number): number => Math.abs(is - printed) / Math.abs(printed);
const nineDigits = 1e-8;

describe('IAPWS R7-97(2012), table 35: saturation pressure', () => {
  test.each([
    { id: 'ST-01', kelvin: 300, mpa: 0.00353658941 },
    { id: 'ST-02', kelvin: 500, mpa: 2.63889776 },
    { id: 'ST-03', kelvin: 600, mpa: 12.3443146 },
  ])('$id: $kelvin K → $mpa MPa', ({ kelvin, mpa }) => {
    expect(off(saturationPressurePaAbs(kelvin) / 1e6, mpa)).toBeLessThan(nineDigits);
  });
});

describe('IAPWS R7-97(2012), table 36: saturation temperature', () => {
  test.each([
    { id: 'ST-04', mpa: 0.1, kelvin: 372.755919 },
    { id: 'ST-05', mpa: 1, kelvin: 453.035632 },
    { id: 'ST-06', mpa: 10, kelvin: 584.149488 },
  ])('$id: $mpa MPa → $kelvin K', ({ mpa, kelvin }) => {
    expect(off(saturationTemperatureK(mpa * 1e6), kelvin)).toBeLessThan(nineDigits);
  });

  test.each([600, 22.1e6, Number.NaN])('%d Pa is out of range', (pa) => {
    expect(() => saturationTemperatureK(pa)).toThrow(RangeError);
  });
});

describe('IAPWS R7-97(2012), table 5: water', () => {
  test.each([
    {
      id: 'ST-07',
      kelvin: 300,
      mpa: 3,
      v: 0.00100215168,
      h: 115.331273,
      u: 112.324818,
      s: 0.392294792,
      cp: 4.17301218,
    },
    {
      id: 'ST-09',
      kelvin: 500,
      mpa: 3,
      v: 0.001202418,
      h: 975.542239,
      u: 971.934985,
      s: 2.58041912,
      cp: 4.65580682,
    },
  ])('$id: $kelvin K, $mpa MPa', ({ kelvin, mpa, v, h, u, s, cp }) => {
    const is = waterAt(kelvin, mpa * 1e6);
    expect(off(is.specificVolume, v)).toBeLessThan(nineDigits);
    expect(off(is.enthalpy, h)).toBeLessThan(nineDigits);
    expect(off(is.internalEnergy, u)).toBeLessThan(nineDigits);
    expect(off(is.entropy, s)).toBeLessThan(nineDigits);
    expect(off(is.heatCapacity, cp)).toBeLessThan(nineDigits);
  });
});

describe('IAPWS R7-97(2012), table 15: steam', () => {
  test.each([
    {
      id: 'ST-10',
      kelvin: 300,
      mpa: 0.0035,
      v: 39.4913866,
      h: 2549.91145,
      u: 2411.6916,
      s: 8.52238967,
      cp: 1.91300162,
    },
    {
      id: 'ST-12',
      kelvin: 700,
      mpa: 30,
      v: 0.00542946619,
      h: 2631.49474,
      u: 2468.61076,
      s: 5.17540298,
      cp: 10.3505092,
    },
  ])('$id: $kelvin K, $mpa MPa', ({ kelvin, mpa, v, h, u, s, cp }) => {
    const is = steamAt(kelvin, mpa * 1e6);
    expect(off(is.specificVolume, v)).toBeLessThan(nineDigits);
    expect(off(is.enthalpy, h)).toBeLessThan(nineDigits);
    expect(off(is.internalEnergy, u)).toBeLessThan(nineDigits);
    expect(off(is.entropy, s)).toBeLessThan(nineDigits);
    expect(off(is.heatCapacity, cp)).toBeLessThan(nineDigits);
  });
});

test('the saturation table agrees with a general library of the same formulation, 0 to 20 bar gauge', () => {
  // Made by data/make-saturation.py with Debian's python3-iapws.
  const [, ...rows] = readFileSync(path.join(import.meta.dirname, 'data/saturation.csv'), 'utf8')
    .trim()
    .split('\n');
  expect(rows).toHaveLength(205);
  for (const row of rows) {
    const [gaugeBar, kelvin, vf, vg, hf, hg] = row.split(',').map(Number) as [
      number,
      number,
      number,
      number,
      number,
      number,
    ];
    const { temperatureK, water, steam } = saturatedAt(gaugeBar * 100_000);
    expect(off(temperatureK, kelvin)).toBeLessThan(1e-9);
    expect(off(water.specificVolume, vf)).toBeLessThan(1e-9);
    expect(off(steam.specificVolume, vg)).toBeLessThan(1e-9);
    expect(off(water.enthalpy, hf)).toBeLessThan(1e-9);
    expect(off(steam.enthalpy, hg)).toBeLessThan(1e-9);
  }
});

test('pressure to temperature and back loses nothing, and more pressure is never less temperature', () => {
  const pressure = fc.double({ min: 1_000, max: 16e6, noNaN: true });
  fc.assert(
    fc.property(pressure, pressure, (a, b) => {
      expect(off(saturationPressurePaAbs(saturationTemperatureK(a)), a)).toBeLessThan(1e-7);
      const [less, more] = [Math.min(a, b), Math.max(a, b)];
      // The last bits of two nearly equal pressures may cross.
      expect(saturationTemperatureK(less)).toBeLessThanOrEqual(saturationTemperatureK(more) * (1 + 1e-12));
    }),
    { numRuns: 1_000 },
  );
});
