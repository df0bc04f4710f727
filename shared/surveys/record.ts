import { z } from 'zod';
import { day, instant } from '../time.ts';

/** Grades of one examined item. The order is from best to worst, then the two that are no grade. */
export const grades = {
  sound: 'Sound',
  serviceable: 'Serviceable',
  attention: 'Needs attention',
  unfit: 'Unfit',
  notExamined: 'Not examined',
  notFitted: 'Not fitted',
} as const;
export type Grade = keyof typeof grades;
export const grade = z.enum(Object.keys(grades) as [Grade, ...Grade[]], 'Choose a grade');

export const remedies = {
  none: 'Nothing to do',
  watch: 'Watch it',
  clean: 'Clean',
  adjust: 'Adjust',
  repair: 'Repair',
  replace: 'Replace',
  condemn: 'Condemn',
} as const;
export type Remedy = keyof typeof remedies;
export const remedy = z.enum(Object.keys(remedies) as [Remedy, ...Remedy[]]);

const shortText = (most: number) =>
  z
    .string()
    .trim()
    .max(most, `Keep it under ${String(most)} characters`);
const hours = z.number('Give the hours').min(0, 'Hours cannot be negative').max(500, 'At most 500 hours');
const partsMinor = z.int('Whole pence').min(0, 'A cost cannot be negative').max(5_000_000, 'At most 50,000');

/** The surveyor's own figure for putting a defect right; wins over the catalogue's band. */
export const allowanceOverride = z
  .strictObject({ hoursLow: hours, hoursHigh: hours, partsLowMinor: partsMinor, partsHighMinor: partsMinor })
  .refine((band) => band.hoursLow <= band.hoursHigh, {
    path: ['hoursHigh'],
    message: 'The high figure is below the low one',
  })
  .refine((band) => band.partsLowMinor <= band.partsHighMinor, {
    path: ['partsHighMinor'],
    message: 'The high figure is below the low one',
  });
export type AllowanceOverride = z.infer<typeof allowanceOverride>;

/** One defect of the catalogue, as found. */
export const foundDefect = z.strictObject({
  code: z.string().max(60),
  where: shortText(120).default(''),
  note: shortText(600).default(''),
  remedy: remedy.nullable().default(null),
  allowance: allowanceOverride.nullable().default(null),
});
export type FoundDefect = z.infer<typeof foundDefect>;

/** One figure taken; the quantity is named by the criterion, the value is in the quantity's own SI-based unit. */
export const measurement = z.strictObject({
  quantity: z.string().max(60),
  value: z.union([z.number().finite('Give a figure'), z.boolean(), shortText(200)]),
});
export type Measurement = z.infer<typeof measurement>;

/** What was found of one criterion. */
export const finding = z.strictObject({
  criterionId: z.string().max(60),
  grade,
  ways: z.array(z.string().max(40)).max(10),
  defects: z.array(foundDefect).max(20, 'At most 20 defects on one item').default([]),
  measurements: z.array(measurement).max(20).default([]),
  photoIds: z.array(z.uuid()).max(12, 'At most 12 photographs on one finding').default([]),
  note: shortText(2_000).default(''),
  /** Why it was not examined, or why Sound rests on the first way alone. */
  reason: shortText(400).default(''),
});
export type Finding = z.infer<typeof finding>;

export const instrumentKinds = {
  'test-gauge': 'Test pressure gauge',
  'thickness-meter': 'Wall-thickness meter',
  borescope: 'Borescope',
  'co-meter': 'Carbon monoxide meter',
  caliper: 'Caliper or micrometer',
  thermometer: 'Thermometer',
  scales: 'Scales or measuring jug',
} as const;
export type InstrumentKind = keyof typeof instrumentKinds;
export const instrument = z.strictObject({
  kind: z.enum(
    Object.keys(instrumentKinds) as [InstrumentKind, ...InstrumentKind[]],
    'Choose the kind of instrument',
  ),
  name: shortText(80).min(1, 'Name the instrument'),
  serial: shortText(60).default(''),
  calibratedOn: day.nullable().default(null),
  /** Gauges only. */
  fullScalePa: z.number().min(10_000).max(100_000_000).nullable().default(null),
});
export type Instrument = z.infer<typeof instrument>;

const gaugePa = z
  .number('Give a pressure')
  .min(0, 'A pressure cannot be negative')
  .max(6_000_000, 'More than 60 bar is outside this method');

export const leakPlaces = {
  shell: 'Shell plate',
  seam: 'Seam or joint',
  stay: 'Stay',
  tube: 'Tube or tube end',
  bush: 'Bush or thread',
  gland: 'Gland or fitting',
} as const;
export type LeakPlace = keyof typeof leakPlaces;
/** 0 dry, 1 damp, 2 weep, 3 drip, 4 run. */
export const leakClasses = ['Dry', 'Damp', 'Weep', 'Drip', 'Run'] as const;

export const hydraulicTest = z.strictObject({
  profileId: z.string().max(60),
  firstTest: z.boolean(),
  wantedPa: gaugePa,
  gaugeRemoved: z.boolean(),
  valveGagged: z.boolean(),
  filledAndVented: z.boolean(),
  /** Readings in order: minutes from the first stroke, and the test gauge. */
  readings: z.array(z.strictObject({ minute: z.number().min(0).max(600), pressurePa: gaugePa })).max(200),
  holdStartMinute: z.number().min(0).max(600).nullable(),
  holdEndMinute: z.number().min(0).max(600).nullable(),
  leaks: z
    .array(
      z.strictObject({
        place: z.enum(Object.keys(leakPlaces) as [LeakPlace, ...LeakPlace[]]),
        leakClass: z.int().min(0).max(4),
        where: shortText(120).default(''),
        cured: z.boolean().default(false),
      }),
    )
    .max(40),
  permanentSetMm: z.number().min(0).max(50).nullable(),
  note: shortText(1_000).default(''),
});
export type HydraulicTest = z.infer<typeof hydraulicTest>;

export const steamTest = z.strictObject({
  raisedSteam: z.boolean(),
  minutesToWorkingPressure: z.number().min(0).max(600).nullable(),
  valveLiftsAtPa: gaugePa.nullable(),
  valveReseatsAtPa: gaugePa.nullable(),
  /** Highest pressure with full fire, stop valve and feed shut. */
  highestPressurePa: gaugePa.nullable(),
  gaugeBlownThrough: z.boolean(),
  passagesClear: z.boolean().nullable(),
  feedsDelivered: z.boolean().nullable(),
  /** Measured evaporation from a timed feed. */
  evaporationKgPerH: z.number().min(0).max(500).nullable(),
  flameSettled: z.boolean().nullable(),
  gasTight: z.boolean().nullable(),
  coPpmAtOperator: z.number().min(0).max(5_000).nullable(),
  readings: z.array(z.strictObject({ minute: z.number().min(0).max(600), pressurePa: gaugePa })).max(200),
  note: shortText(1_000).default(''),
});
export type SteamTest = z.infer<typeof steamTest>;

export const signOff = z.strictObject({
  name: shortText(120).min(2, 'Type your full name as your signature'),
  signedAt: instant,
  independent: z.literal(true, 'Confirm that you are independent of both parties'),
  limitsUnderstood: z.literal(true, 'Confirm the limits of the report'),
});
export type SignOff = z.infer<typeof signOff>;

/** Everything a surveyor records. Saved as it grows; filed once it is signed. */
export const surveyRecord = z.strictObject({
  rubricVersion: z.string().max(20),
  examinedOn: day.nullable(),
  findings: z.array(finding).max(60),
  instruments: z.array(instrument).max(20, 'At most 20 instruments'),
  hydraulic: hydraulicTest.nullable(),
  steam: steamTest.nullable(),
  /** Why a test that the scope includes was not made. */
  noHydraulicReason: shortText(400).default(''),
  noSteamReason: shortText(400).default(''),
  /** What the surveyor wants to say to the buyer in their own words. */
  summary: shortText(3_000).default(''),
});
export type SurveyRecord = z.infer<typeof surveyRecord>;

export const emptyRecord = (rubricVersion: string): SurveyRecord => ({
  rubricVersion,
  examinedOn: null,
  findings: [],
  instruments: [],
  hydraulic: null,
  steam: null,
  noHydraulicReason: '',
  noSteamReason: '',
  summary: '',
});
