import type { BoilerFacts, ConstructionId } from '../boilers/boiler.ts';
import type { EngineFacts } from '../engines/engine.ts';
import type { JointMetalId } from '../engineering/joints.ts';
import type { PartsInput } from '../engineering/parts.ts';
import { liftShares } from '../engineering/safety-valve.ts';
import type { LiftId } from '../engineering/safety-valve.ts';
import { multipleOf, testProfileOf } from '../engineering/test-profiles.ts';
import { figureOf, valuesOf } from '../surveys/examined.ts';
import type { Examined } from '../surveys/examined.ts';
import { partsInputOf } from '../surveys/parts.ts';
import type { SurveyRecord } from '../surveys/record.ts';
import type { Inputs } from './calculator.ts';
import { calculatorOf } from './index.ts';

/** A boiler as far as it is known: what its seller says, and what a surveyor found if one has been. */
export interface KnownBoiler {
  facts: BoilerFacts;
  items: readonly Examined[];
  record: SurveyRecord | null;
}

/** A calculator with a boiler's figures filled in. What nobody knows is left open, never taken from the example. */
function filled(id: string, known: Inputs): Inputs {
  const calculator = calculatorOf(id);
  if (calculator === undefined) throw new RangeError(`No calculator ${id}`);
  return Object.fromEntries(
    Object.entries(calculator.fields).map(([name, { isOptional, initial }]) => [
      name,
      name in known ? known[name] : isOptional ? null : initial,
    ]),
  );
}

const jointOfConstruction: Readonly<Record<ConstructionId, JointMetalId>> = {
  'silver-brazed': 'silver-55',
  'soft-soldered': 'tin-lead',
  riveted: 'riveted',
  welded: 'welded',
  mixed: 'silver-55',
  unknown: 'silver-55',
};

const jointOfFound: Readonly<Record<string, JointMetalId>> = {
  'soft-solder': 'tin-lead',
  'rivets-soft': 'tin-lead',
  'silver-solder': 'silver-55',
  bronze: 'silver-55',
  weld: 'welded',
  rivets: 'riveted',
};

/** What its joints are made with: as a surveyor found it, else as the seller says. */
export function jointOfBoiler({ facts, items }: KnownBoiler): JointMetalId {
  const found = valuesOf(items, 'shell.joints', 'jointMaterial')[0];
  return jointOfFound[String(found)] ?? jointOfConstruction[facts.construction];
}

function supportInputs(support: NonNullable<PartsInput['plates']>['support']): Inputs {
  return support.by === 'stays'
    ? { plates: 'stays', pitchMm: support.pitchMm }
    : { plates: support.by, pitchMm: null };
}

/** What the parts stand, with this boiler's sizes. */
export function partsInputs(boiler: KnownBoiler): Inputs {
  const { facts, items } = boiler;
  const { barrel, plates, flue, tubes, stays, material, workingPa } = partsInputOf(facts, items);
  return filled('pressure-by-parts', {
    workingPa,
    material,
    barrelOutsideMm: barrel.outsideMm,
    barrelWallMm: barrel.wallMm,
    seam: barrel.seam,
    barrelPlace: barrel.isInFire ? 'in' : 'out',
    plateMm: plates?.thicknessMm ?? null,
    ...(plates && supportInputs(plates.support)),
    flue: flue ? 'fitted' : 'none',
    flueOutsideMm: flue?.outsideMm ?? null,
    flueWallMm: flue?.wallMm ?? null,
    flueLengthMm: flue?.lengthMm ?? null,
    tubes: tubes === undefined ? 'none' : tubes.pressure === 'outside' ? 'fire' : 'water',
    tubeOutsideMm: tubes?.outsideMm ?? null,
    tubeWallMm: tubes?.wallMm ?? null,
    stays: stays ? 'fitted' : 'none',
    stayMm: stays?.diameterMm ?? null,
    stayPitchMm: stays?.pitchMm ?? null,
    stayTpi: stays?.tpi ?? null,
    jointMetal: jointOfBoiler(boiler),
  });
}

/** What its joints are made with. */
export const jointsInputs = (boiler: KnownBoiler): Inputs =>
  filled('joints', {
    workingPa: boiler.facts.workingPressurePa,
    jointMetal: jointOfBoiler(boiler),
  });

/** Steam at its working pressure. */
export const steamInputs = ({ facts }: KnownBoiler): Inputs =>
  filled('saturated-steam', { pressurePa: facts.workingPressurePa });

/** Bar·litres. */
export const barLitresInputs = ({ facts }: KnownBoiler): Inputs =>
  filled('bar-litres', { workingPa: facts.workingPressurePa, volumeL: facts.waterCapacityL });

/** Percentage of working pressure that its next hydraulic test asks, by the profile of the last or the usual one. */
export const testPercent = ({ record }: KnownBoiler): number => {
  const test = record?.hydraulic ?? null;
  return multipleOf(testProfileOf(test?.profileId ?? 'hobby'), test?.firstTest ?? false);
};

/** Its hydraulic test, with the readings of the hold where it was made. */
export function hydraulicInputs({ facts, items, record }: KnownBoiler): Inputs {
  const test = record?.hydraulic ?? null;
  const { holdStartMinute: from = null, holdEndMinute: to = null } = test ?? {};
  const held =
    from === null || to === null
      ? []
      : (test?.readings ?? [])
          .filter(({ minute }) => minute >= from && minute <= to)
          .toSorted((a, b) => a.minute - b.minute);
  const [first, last] = [held[0], held.at(-1)];
  return filled('hydraulic-test', {
    workingPa: facts.workingPressurePa,
    profile: testProfileOf(test?.profileId ?? '') === testProfileOf('hobby') ? 'hobby' : test?.profileId,
    kind: test?.firstTest === true ? 'first' : 'repeat',
    volumeL: facts.waterCapacityL,
    ownGaugePa: figureOf(items, 'safety.gauge', 'fullScalePa'),
    testGaugePa: record?.instruments.find(({ kind }) => kind === 'test-gauge')?.fullScalePa ?? null,
    startPa: first?.pressurePa ?? null,
    endPa: last?.pressurePa ?? null,
    minutes: first && last && first !== last ? last.minute - first.minute : null,
  });
}

const made = ({ facts, record }: KnownBoiler): Inputs => ({
  firing: facts.firing,
  surfaceM2: facts.dimensions.heatingSurfaceM2,
  measuredKgPerH: record?.steam?.evaporationKgPerH ?? null,
});

/** Steam made. */
export const evaporationInputs = (known: KnownBoiler): Inputs =>
  filled('evaporation', {
    ...made(known),
    pressurePa: known.facts.workingPressurePa,
    // A timed feed is recorded as a rate: so much in an hour.
    fedL: known.record?.steam?.evaporationKgPerH ?? null,
    minutes: known.record?.steam?.evaporationKgPerH ? 60 : null,
  });

const isLift = (value: unknown): value is LiftId => typeof value === 'string' && value in liftShares;

/** Its safety valve; null where nobody has measured the bore. */
export function valveInputs(known: KnownBoiler): Inputs | null {
  const boreMm = figureOf(known.items, 'safety.capacity', 'valveBoreMm');
  if (boreMm === null) return null;
  return filled('safety-valve', {
    ...made(known),
    workingPa: known.facts.workingPressurePa,
    boreMm,
    lift: valuesOf(known.items, 'safety.capacity', 'valveLift').find(isLift) ?? 'ordinary',
    valves: figureOf(known.items, 'safety.capacity', 'valvesFitted') ?? 1,
  });
}

/** Its pressure gauge; null where nobody has read its scale. */
export function gaugeInputs({ facts, items }: KnownBoiler): Inputs | null {
  const fullScalePa = figureOf(items, 'safety.gauge', 'fullScalePa');
  if (fullScalePa === null) return null;
  return filled('pressure-gauge', {
    workingPa: facts.workingPressurePa,
    fullScalePa,
    zeroPa: figureOf(items, 'safety.gauge', 'zeroErrorPa'),
    lowPa: figureOf(items, 'safety.gauge', 'lowPointErrorPa'),
    middlePa: figureOf(items, 'safety.gauge', 'midPointErrorPa'),
    workingErrorPa: figureOf(items, 'safety.gauge', 'workingPointErrorPa'),
  });
}

/** Its gas jet; null where nobody has measured it. */
export function jetInputs({ items }: KnownBoiler): Inputs | null {
  const jetMm = figureOf(items, 'firing.fuel', 'jetMm');
  const pressurePa = figureOf(items, 'firing.fuel', 'fuelPressurePa');
  if (jetMm === null || pressurePa === null) return null;
  const gas = valuesOf(items, 'firing.fuel', 'gasKind').find((kind) => kind === 'butane');
  return filled('gas-jet', { gas: gas ?? 'propane', jetMm, pressurePa });
}

/** The whole balance. */
export const balanceInputs = (known: KnownBoiler): Inputs =>
  filled('steam-balance', {
    ...made(known),
    workingPa: known.facts.workingPressurePa,
    jetMm: figureOf(known.items, 'firing.fuel', 'jetMm'),
    jetPa: figureOf(known.items, 'firing.fuel', 'fuelPressurePa'),
    boreMm: figureOf(known.items, 'safety.capacity', 'valveBoreMm'),
    lift: valuesOf(known.items, 'safety.capacity', 'valveLift').find(isLift) ?? 'ordinary',
    valves: figureOf(known.items, 'safety.capacity', 'valvesFitted') ?? 1,
    waterL: figureOf(known.items, 'safety.glass', 'waterInGlassL'),
    feedKgPerH: figureOf(known.items, 'feed.first', 'deliveryKgPerH'),
  });

/** An engine on this boiler, at the engine's own pressure or the boiler's if that is less. */
export const engineInputs = (known: KnownBoiler, engine: EngineFacts): Inputs =>
  filled('engine', {
    ...made(known),
    ...engine,
    pressurePa: Math.min(engine.pressurePa, known.facts.workingPressurePa),
    workingPa: known.facts.workingPressurePa,
  });
