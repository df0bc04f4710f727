import fc from 'fast-check';
import { constructions, firings, fittings, materials } from '#shared/boilers/boiler.ts';
import type { BoilerFacts, ConstructionId, FiringId, FittingId, MaterialId } from '#shared/boilers/boiler.ts';
import { boilerTypeIds } from '#shared/boilers/boiler-types.ts';
import { emptyRecord, instrumentKinds, remedies } from '#shared/surveys/record.ts';
import type {
  Finding,
  FoundDefect,
  Grade,
  HydraulicTest,
  Instrument,
  InstrumentKind,
  Measurement,
  Remedy,
  SteamTest,
  SurveyRecord,
} from '#shared/surveys/record.ts';
import { criteriaFor, rubricVersion } from '#shared/surveys/rubric/index.ts';
import type { Criterion, MeasurementSpec } from '#shared/surveys/rubric/types.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import type { ScopeId } from '#shared/surveys/scopes.ts';
import type { SurveyInput } from '#shared/surveys/examined.ts';

const keysOf = <T extends string>(table: Readonly<Record<T, unknown>>): T[] => Object.keys(table) as T[];

const mm = (min: number, max: number) =>
  fc.option(
    fc.integer({ min: min * 10, max: max * 10 }).map((tenths) => tenths / 10),
    { nil: null },
  );

/** Boilers of every type, metal and firing, within what a listing may hold. */
export const anyFacts: fc.Arbitrary<BoilerFacts> = fc.record({
  type: fc.constantFrom(...boilerTypeIds),
  material: fc.constantFrom<MaterialId[]>(...keysOf(materials)),
  construction: fc.constantFrom<ConstructionId[]>(...keysOf(constructions)),
  builder: fc.constant(null),
  builtYear: fc.option(fc.integer({ min: 1900, max: 2026 }), { nil: null }),
  builtYearSureness: fc.constant('guess' as const),
  dimensions: fc.record({
    barrelOutsideDiameterMm: fc.integer({ min: 60, max: 300 }),
    barrelLengthMm: fc.integer({ min: 80, max: 600 }),
    barrelThicknessMm: mm(1, 6),
    endPlateThicknessMm: mm(1, 8),
    flueDiameterMm: mm(20, 45),
    flueThicknessMm: mm(1, 5),
    tubeCount: fc.option(fc.integer({ min: 1, max: 60 }), { nil: null }),
    tubeDiameterMm: mm(5, 20),
    tubeThicknessMm: mm(1, 2),
    heatingSurfaceM2: fc.option(
      fc.integer({ min: 1, max: 200 }).map((parts) => parts / 100),
      { nil: null },
    ),
    overallHeightMm: mm(100, 900),
    weightKg: mm(1, 90),
  }),
  workingPressurePa: fc.integer({ min: 2, max: 80 }).map((tenths) => tenths * 10_000),
  pressureEvidence: fc.constantFrom('stamped-plate', 'certificate', 'drawing', 'seller-only' as const),
  waterCapacityL: fc.integer({ min: 2, max: 80 }).map((tenths) => tenths / 10),
  fittings: fc.uniqueArray(fc.constantFrom<FittingId[]>(...keysOf(fittings))),
  firing: fc.constantFrom<FiringId[]>(...keysOf(firings)),
  papers: fc.constant([]),
});

/** Grades of something that was looked at, best first. */
export const examinedGrades = ['sound', 'serviceable', 'attention', 'unfit'] as const satisfies Grade[];
export const anyGrade: fc.Arbitrary<Grade> = fc.oneof(
  { weight: 12, arbitrary: fc.constantFrom<Grade[]>(...examinedGrades) },
  { weight: 1, arbitrary: fc.constantFrom<Grade[]>('notExamined', 'notFitted') },
);

export const anyOverride = fc
  .tuple(
    fc.integer({ min: 0, max: 400 }),
    fc.integer({ min: 0, max: 400 }),
    fc.integer({ min: 0, max: 50_000 }),
    fc.integer({ min: 0, max: 50_000 }),
  )
  .map(([hours, moreHours, parts, moreParts]) => ({
    hoursLow: hours / 100,
    hoursHigh: (hours + moreHours) / 100,
    partsLowMinor: parts,
    partsHighMinor: parts + moreParts,
  }));

export const anyDefect = (criterion: Criterion): fc.Arbitrary<FoundDefect> =>
  fc.record({
    code: fc.constantFrom(...criterion.defects.map((spec) => spec.code)),
    where: fc.constantFrom('', 'left side', 'balloon 7'),
    note: fc.constant(''),
    remedy: fc.option(fc.constantFrom<Remedy[]>(...keysOf(remedies)), { nil: null }),
    allowance: fc.option(anyOverride, { nil: null, freq: 4 }),
  });

function anyValue(spec: MeasurementSpec): fc.Arbitrary<Measurement['value']> {
  if (spec.unit === 'text') return fc.constantFrom('as stamped', '12/98');
  if (spec.unit === 'yes-no') return fc.boolean();
  if (spec.unit === 'choice') return fc.constantFrom(...spec.choices.map((choice) => choice.id));
  const figure = fc.integer({ min: Math.ceil(spec.min ?? 0), max: Math.floor(spec.max ?? 1_000_000) });
  return spec.unit === 'mm' ? figure.map((value) => Math.max(spec.min ?? 0, value / 10)) : figure;
}

export const anyMeasurement = (criterion: Criterion): fc.Arbitrary<Measurement> | null => {
  const own = criterion.measurements.filter((spec) => spec.takenIn === 'finding');
  if (own.length === 0) return null;
  return fc
    .constantFrom(...own)
    .chain((spec) => anyValue(spec).map((value) => ({ quantity: spec.quantity, value })));
};

/** A finding on one criterion, with ways, defects and measurements of its own vocabulary. */
export function anyFinding(
  criterion: Criterion,
  grade: fc.Arbitrary<Grade> = anyGrade,
): fc.Arbitrary<Finding> {
  const measurement = anyMeasurement(criterion);
  return fc.record({
    criterionId: fc.constant(criterion.id),
    grade,
    ways: fc.subarray(criterion.ways.map((way) => way.id as string)),
    defects: fc.oneof(
      { weight: 3, arbitrary: fc.constant<FoundDefect[]>([]) },
      { weight: 1, arbitrary: fc.array(anyDefect(criterion), { maxLength: 3 }) },
    ),
    measurements:
      measurement === null
        ? fc.constant<Measurement[]>([])
        : fc.oneof(
            { weight: 3, arbitrary: fc.constant<Measurement[]>([]) },
            { weight: 1, arbitrary: fc.array(measurement, { maxLength: 2 }) },
          ),
    photoIds: fc.array(fc.uuid(), { maxLength: 2 }),
    note: fc.constantFrom('', 'see photograph'),
    reason: fc.constantFrom('', 'could not be reached'),
  });
}

const anyDay = fc
  .tuple(
    fc.integer({ min: 2024, max: 2026 }),
    fc.integer({ min: 1, max: 12 }),
    fc.integer({ min: 1, max: 28 }),
  )
  .map(([year, month, day]) => `${String(year)}-${pad(month)}-${pad(day)}`);
const pad = (value: number) => String(value).padStart(2, '0');

const anyPressure = fc.integer({ min: 0, max: 200 }).map((tenths) => tenths * 10_000);
const maybePressure = fc.option(anyPressure, { nil: null });
const maybe = fc.option(fc.boolean(), { nil: null });

const anyInstrument: fc.Arbitrary<Instrument> = fc.record({
  kind: fc.constantFrom<InstrumentKind[]>(...keysOf(instrumentKinds)),
  name: fc.constantFrom('Workshop gauge', 'Club gauge'),
  serial: fc.constant(''),
  calibratedOn: fc.option(anyDay, { nil: null }),
  fullScalePa: fc.option(
    fc.integer({ min: 5, max: 60 }).map((bars) => bars * 100_000),
    { nil: null },
  ),
});

const anyReadings = fc.uniqueArray(
  fc.record({ minute: fc.integer({ min: 0, max: 60 }), pressurePa: anyPressure }),
  { maxLength: 8, selector: (reading) => reading.minute },
);

export const anyHydraulic: fc.Arbitrary<HydraulicTest> = fc.record({
  profileId: fc.constantFrom('repeat', 'first'),
  firstTest: fc.boolean(),
  wantedPa: anyPressure,
  gaugeRemoved: fc.boolean(),
  valveGagged: fc.boolean(),
  filledAndVented: fc.boolean(),
  readings: anyReadings,
  holdStartMinute: fc.option(fc.integer({ min: 0, max: 20 }), { nil: null }),
  holdEndMinute: fc.option(fc.integer({ min: 21, max: 60 }), { nil: null }),
  leaks: fc.array(
    fc.record({
      place: fc.constantFrom('shell', 'seam', 'stay', 'tube', 'bush', 'gland' as const),
      leakClass: fc.integer({ min: 0, max: 4 }),
      where: fc.constant(''),
      cured: fc.boolean(),
    }),
    { maxLength: 3 },
  ),
  permanentSetMm: fc.option(fc.constantFrom(0, 0, 0.2), { nil: null }),
  note: fc.constant(''),
});

export const anySteam: fc.Arbitrary<SteamTest> = fc.record({
  raisedSteam: fc.boolean(),
  minutesToWorkingPressure: fc.constant(null),
  valveLiftsAtPa: maybePressure,
  valveReseatsAtPa: maybePressure,
  highestPressurePa: maybePressure,
  gaugeBlownThrough: fc.boolean(),
  passagesClear: maybe,
  feedsDelivered: maybe,
  evaporationKgPerH: fc.option(fc.integer({ min: 1, max: 30 }), { nil: null }),
  flameSettled: maybe,
  gasTight: maybe,
  coPpmAtOperator: fc.option(fc.integer({ min: 0, max: 150 }), { nil: null }),
  readings: fc.constant([]),
  note: fc.constant(''),
});

/** A record on a given boiler, with some criteria left out. */
export const anyRecordOn = (facts: BoilerFacts): fc.Arbitrary<SurveyRecord> =>
  fc
    .record({
      examinedOn: fc.option(anyDay, { nil: null, freq: 10 }),
      findings: fc
        .tuple(
          ...criteriaFor(facts).map((criterion) => fc.option(anyFinding(criterion), { nil: null, freq: 12 })),
        )
        .map((findings) => findings.filter((finding) => finding !== null)),
      instruments: fc.array(anyInstrument, { maxLength: 4 }),
      hydraulic: fc.option(anyHydraulic, { nil: null }),
      steam: fc.option(anySteam, { nil: null }),
    })
    .map((parts) => ({ ...emptyRecord(rubricVersion), ...parts }));

export const anyScope: fc.Arbitrary<ScopeId> = fc.constantFrom<ScopeId[]>(...keysOf(scopes));

/** A boiler and what a survey of it recorded. */
export const anySurvey: fc.Arbitrary<SurveyInput> = anyFacts.chain((facts) =>
  fc.record({ facts: fc.constant(facts), record: anyRecordOn(facts), scope: anyScope }),
);
