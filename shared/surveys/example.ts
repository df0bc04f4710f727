import type { BoilerFacts } from '../boilers/boiler.ts';
import type { SurveyInput } from './examined.ts';
import { emptyRecord } from './record.ts';
import type { Finding, HydraulicTest, Instrument, SteamTest } from './record.ts';
import { criteriaFor, rubricOf, rubricVersion } from './rubric/index.ts';
import type { Criterion } from './rubric/types.ts';

const bar = 100_000;

/** An invented vertical multi-tube boiler, gas fired, 4 bar: what the Method page is tried out on. */
export const exampleFacts: BoilerFacts = {
  type: 'vertical-multi-tube',
  material: 'copper',
  construction: 'silver-brazed',
  builder: null,
  builtYear: 1998,
  builtYearSureness: 'known',
  dimensions: {
    barrelOutsideDiameterMm: 102,
    barrelLengthMm: 180,
    barrelThicknessMm: 2,
    endPlateThicknessMm: 3,
    flueDiameterMm: null,
    flueThicknessMm: null,
    tubeCount: 19,
    tubeDiameterMm: 10,
    tubeThicknessMm: 1,
    heatingSurfaceM2: 0.1,
    overallHeightMm: 320,
    weightKg: 4,
  },
  workingPressurePa: 4 * bar,
  pressureEvidence: 'stamped-plate',
  waterCapacityL: 0.7,
  fittings: [
    'safety-valve',
    'pressure-gauge',
    'siphon',
    'water-gauge',
    'blowdown-valve',
    'check-valve',
    'hand-pump',
    'engine-pump',
    'stop-valve',
    'feed-tank',
  ],
  firing: 'gas',
  papers: [],
};

/** A repeat test at one and a half times working pressure, held for ten minutes, dry. */
export const exampleHydraulic: HydraulicTest = {
  profileId: 'hobby',
  firstTest: false,
  wantedPa: 6 * bar,
  gaugeRemoved: true,
  valveGagged: true,
  filledAndVented: true,
  readings: [
    { minute: 0, pressurePa: 0 },
    { minute: 5, pressurePa: 6.1 * bar },
    { minute: 15, pressurePa: 6.08 * bar },
  ],
  holdStartMinute: 5,
  holdEndMinute: 15,
  leaks: [],
  permanentSetMm: 0,
  note: '',
};

/** A steam test in which everything did as it should. */
export const exampleSteam: SteamTest = {
  raisedSteam: true,
  minutesToWorkingPressure: 12,
  valveLiftsAtPa: 4 * bar,
  valveReseatsAtPa: 3.8 * bar,
  highestPressurePa: 4.2 * bar,
  gaugeBlownThrough: true,
  passagesClear: true,
  feedsDelivered: true,
  evaporationKgPerH: 2,
  flameSettled: true,
  gasTight: true,
  coPpmAtOperator: 6,
  readings: [],
  note: '',
};

export const exampleInstruments: Instrument[] = [
  {
    kind: 'test-gauge',
    name: 'Test gauge',
    serial: 'T 41',
    calibratedOn: '2026-01-10',
    fullScalePa: 16 * bar,
  },
  { kind: 'co-meter', name: 'Gas meter', serial: 'C 7', calibratedOn: '2026-02-01', fullScalePa: null },
];

/** An item found sound, examined in these ways. */
export const soundFinding = (criterionId: string, ways: readonly string[]): Finding => ({
  criterionId,
  grade: 'sound',
  ways: [...ways],
  defects: [],
  measurements: [],
  photoIds: [],
  note: '',
  reason: '',
});

const worn = (code: string): Pick<Finding, 'grade' | 'defects'> => ({
  grade: 'serviceable',
  defects: [{ code, where: '', note: '', remedy: null, allowance: null }],
});

/** What was measured on the example, and the little that has worn. */
const exampleFindings: Readonly<Record<string, Partial<Finding>>> = {
  'shell.barrel': { measurements: [{ quantity: 'thinnestMm', value: 1.94 }] },
  'shell.plates': {
    measurements: [
      { quantity: 'thinnestMm', value: 2.9 },
      { quantity: 'supportPitchMm', value: 18 },
    ],
  },
  'shell.tubes': { measurements: [{ quantity: 'thinnestMm', value: 0.95 }] },
  'shell.joints': { measurements: [{ quantity: 'jointMaterial', value: 'silver-solder' }] },
  'shell.fireside': worn('fireside-soot'),
  'safety.capacity': {
    measurements: [
      { quantity: 'valveBoreMm', value: 5 },
      { quantity: 'valveLift', value: 'high' },
      { quantity: 'valvesFitted', value: 1 },
    ],
  },
  'safety.gauge': {
    measurements: [
      { quantity: 'fullScalePa', value: 8 * bar },
      { quantity: 'zeroErrorPa', value: 0 },
      { quantity: 'midPointErrorPa', value: 4_000 },
      { quantity: 'workingPointErrorPa', value: 6_000 },
      { quantity: 'siphonFitted', value: true },
      { quantity: 'redLine', value: true },
    ],
  },
  'safety.glass': { measurements: [{ quantity: 'lowestLevelAboveCrownMm', value: 8 }] },
  'feed.first': {
    measurements: [
      { quantity: 'deliveryKgPerH', value: 5 },
      { quantity: 'deliveredAgainstPa', value: 4 * bar },
    ],
  },
  'feed.stop': worn('stop-gland'),
  'casing.finish': worn('finish-tarnished'),
};

/** One item as found: only what this version of the method measures. */
function findingOf({ id, ways, measurements }: Criterion): Finding {
  const found = exampleFindings[id];
  return {
    ...soundFinding(
      id,
      // No extras were commissioned: nobody looked inside with a borescope.
      ways.map((way) => way.id).filter((way) => way !== 'borescope'),
    ),
    ...found,
    measurements: (found?.measurements ?? []).filter(({ quantity }) =>
      measurements.some((spec) => spec.quantity === quantity),
    ),
  };
}

/** The example as it was surveyed, under a version of the method. @throws Problem if it was never published. */
export const exampleSurvey = (version: string = rubricVersion): SurveyInput => ({
  facts: exampleFacts,
  scope: 'full',
  record: {
    ...emptyRecord(version),
    examinedOn: '2026-05-16',
    findings: criteriaFor(exampleFacts, rubricOf(version)).map(findingOf),
    instruments: exampleInstruments,
    hydraulic: exampleHydraulic,
    steam: exampleSteam,
  },
});
