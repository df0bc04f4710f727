import type { Sureness } from './sources.ts';

/** How a hydraulic test is to be made, and whose rule that is. */
export interface TestProfile {
  label: string;
  /** Test pressure as a percentage of working pressure: a first test, or after structural repair; and a repeat. */
  firstPercent: number;
  repeatPercent: number;
  /** Least time at test pressure, minutes, and the most that pressure may fall over it, per cent. */
  holdMinutes: number;
  fallPercent: number;
  source: string;
  sureness: Sureness;
}

/** The profiles a surveyor may pick from. The local code governs; the report says which was picked. */
export const testProfiles = {
  hobby: {
    label: 'Model-boiler code: twice, then one and a half times',
    firstPercent: 200,
    repeatPercent: 150,
    holdMinutes: 10,
    fallPercent: 1,
    source:
      'UK Boiler Test Code 2012, para 14.3, as quoted, for the multiples; ten minutes and 1 % are common practice',
    sureness: 'published',
  },
  'hobby-long': {
    label: 'The same multiples, held for half an hour',
    firstPercent: 200,
    repeatPercent: 150,
    holdMinutes: 30,
    fallPercent: 1,
    source:
      'UK Boiler Test Code 2012, para 14.3, as quoted, for the multiples; thirty minutes is marine practice',
    sureness: 'practice',
  },
  'power-boiler': {
    label: 'Power-boiler code: one and a half times',
    firstPercent: 150,
    repeatPercent: 150,
    holdMinutes: 10,
    fallPercent: 1,
    source: 'ASME I PG-99 for the multiple; ten minutes and 1 % are common practice',
    sureness: 'memory',
  },
  'pressure-law': {
    label: 'Pressure-equipment law: 1.43 times',
    firstPercent: 143,
    repeatPercent: 143,
    holdMinutes: 10,
    fallPercent: 1,
    source: 'Directive 2014/68/EU, annex I 7.4, for the multiple; ten minutes and 1 % are common practice',
    sureness: 'memory',
  },
} as const satisfies Record<string, TestProfile>;
export type TestProfileId = keyof typeof testProfiles;

export const testProfileIds = Object.keys(testProfiles) as [TestProfileId, ...TestProfileId[]];

/** The profile of that name; an older record that names none of these was tested to the model-boiler code. */
export const testProfileOf = (id: string): TestProfile =>
  testProfiles[testProfileIds.find((each) => each === id) ?? 'hobby'];

/** The multiple, per cent, that a profile asks of a first test or a repeat. */
export const multipleOf = (profile: TestProfile, isFirst: boolean): number =>
  isFirst ? profile.firstPercent : profile.repeatPercent;
