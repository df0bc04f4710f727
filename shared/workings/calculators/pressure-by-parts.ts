import { materials } from '../../boilers/boiler.ts';
import { jointMetals } from '../../engineering/joints.ts';
import { fireMarginK } from '../../engineering/metal.ts';
import { partTitles, pressureByParts, wallNeeded } from '../../engineering/parts.ts';
import type { PartOutcome, PartsInput } from '../../engineering/parts.ts';
import { stayEndings } from '../../engineering/plates.ts';
import { barrelThickness, seamEfficiencies } from '../../engineering/shell.ts';
import { listText, pressureText } from '../../surveys/words.ts';
import { calculator, curve, spread, steps } from '../calculator.ts';
import type { Mistake, Plot, Steps } from '../calculator.ts';
import { choice, figure, labelsOf, unknownFigure } from '../field.ts';
import type { InputOf } from '../field.ts';
import { jointSays } from '../joint-words.ts';
import { acrossRange, wallRange, workingPressure } from '../ranges.ts';
import { lengthText } from '../say.ts';

const ifPlates = (...is: string[]) => ({ field: 'plates', is });
const ifFlue = { field: 'flue', is: ['fitted'] };
const ifTubes = { field: 'tubes', is: ['fire', 'water'] };
const ifStays = { field: 'stays', is: ['fitted'] };
const wallSlider = { from: 0.5, to: 6, step: 0.05 };

const fields = {
  workingPa: workingPressure(),
  material: choice('Metal', materials, 'copper'),
  marginK: figure('Metal in the fire is hotter than the steam by', 'temperatureRise', [0, 100], fireMarginK),
  barrelOutsideMm: figure('Outside diameter', 'length', acrossRange, 101.6, { part: 'Barrel' }),
  barrelWallMm: unknownFigure('Wall', 'length', wallRange, 2.5, {
    part: 'Barrel',
    hint: 'The thinnest you measured',
    slider: wallSlider,
  }),
  seam: choice('Lengthwise seam', labelsOf(seamEfficiencies), 'brazed', { part: 'Barrel' }),
  barrelPlace: choice(
    'Barrel stands',
    { out: 'Outside the fire', in: 'In the fire, as a pot boiler’s does' },
    'out',
    { part: 'Barrel' },
  ),
  plates: choice(
    'Flat ends held by',
    {
      stays: 'Stays or tubes at a pitch',
      ring: 'Barrel outside and flue inside',
      nothing: 'Nothing but the barrel',
    },
    'stays',
    { part: 'End plates' },
  ),
  plateMm: unknownFigure('Plate thickness', 'length', wallRange, 3.2, { part: 'End plates' }),
  pitchMm: unknownFigure('Widest flat between supports', 'length', [2, 600], 16, {
    part: 'End plates',
    when: ifPlates('stays'),
  }),
  ending: choice('How the stays end', labelsOf(stayEndings), 'headed', {
    part: 'End plates',
    when: ifPlates('stays'),
  }),
  flue: choice('Flue', { none: 'None', fitted: 'One flue' }, 'none', { part: 'Flue' }),
  flueOutsideMm: unknownFigure('Flue, outside diameter', 'length', [5, 650], 38, {
    part: 'Flue',
    when: ifFlue,
  }),
  flueWallMm: unknownFigure('Flue wall', 'length', wallRange, 1.6, { part: 'Flue', when: ifFlue }),
  flueLengthMm: unknownFigure('Flue length between plates', 'length', [10, 3_000], 180, {
    part: 'Flue',
    when: ifFlue,
    hint: 'Left out, the flue is taken as endless, which is the low side',
  }),
  tubes: choice(
    'Tubes',
    { none: 'None', fire: 'Fire tubes: pressure outside', water: 'Water tubes: pressure inside' },
    'fire',
    { part: 'Tubes' },
  ),
  tubeOutsideMm: unknownFigure('Tube, outside diameter', 'length', [2, 100], 9.5, {
    part: 'Tubes',
    when: ifTubes,
  }),
  tubeWallMm: unknownFigure('Tube wall', 'length', [0.1, 10], 0.9, { part: 'Tubes', when: ifTubes }),
  stays: choice('Stays', { none: 'None', fitted: 'Stays fitted' }, 'none', { part: 'Stays' }),
  stayMm: unknownFigure('Stay, outside diameter', 'length', [1, 40], 4.8, { part: 'Stays', when: ifStays }),
  stayPitchMm: unknownFigure('Widest pitch of the stays', 'length', [2, 200], 20, {
    part: 'Stays',
    when: ifStays,
  }),
  stayTpi: unknownFigure('Threads to the inch', 'threadsPerInch', [4, 80], null, {
    part: 'Stays',
    when: ifStays,
    hint: 'Leave out for plain or brazed stays',
  }),
  jointMetal: choice('Joints made with', labelsOf(jointMetals), 'silver-55', { part: 'Joints' }),
};
type Input = InputOf<typeof fields>;

/** What cannot be of two sizes together. */
function check(input: Input): Mistake[] {
  const across = input.barrelOutsideMm;
  const mistakes: Mistake[] = [];
  const refuse = (isWrong: boolean, field: keyof Input, message: string) => {
    if (isWrong) mistakes.push({ field, message });
  };
  refuse(
    (input.barrelWallMm ?? 0) * 2 >= across,
    'barrelWallMm',
    'The wall cannot be half the barrel or more: it would leave no inside',
  );
  if (input.flue === 'fitted') {
    refuse((input.flueOutsideMm ?? 0) >= across, 'flueOutsideMm', 'The flue cannot be as wide as the barrel');
    refuse(
      input.flueOutsideMm !== null && (input.flueWallMm ?? 0) * 2 >= input.flueOutsideMm,
      'flueWallMm',
      'The wall leaves no bore in the flue',
    );
  }
  if (input.tubes !== 'none') {
    refuse((input.tubeOutsideMm ?? 0) >= across, 'tubeOutsideMm', 'A tube cannot be as wide as the barrel');
    refuse(
      input.tubeOutsideMm !== null && (input.tubeWallMm ?? 0) * 2 >= input.tubeOutsideMm,
      'tubeWallMm',
      'The wall leaves no bore in the tube',
    );
  }
  refuse(
    input.stays === 'fitted' &&
      input.stayMm !== null &&
      input.stayPitchMm !== null &&
      input.stayPitchMm <= input.stayMm,
    'stayPitchMm',
    'The pitch cannot be smaller than the stay: they would touch',
  );
  refuse(
    input.plates === 'stays' && (input.pitchMm ?? 0) >= across,
    'pitchMm',
    'The flat between supports cannot be wider than the barrel',
  );
  refuse(
    input.plates === 'ring' && input.flue === 'none',
    'plates',
    'Ends held between barrel and flue need a flue: give its size below',
  );
  return mistakes;
}

function ringWidth(input: Input): number | null {
  return input.flueOutsideMm === null
    ? null
    : (input.barrelOutsideMm - input.flueOutsideMm) / 2 - (input.barrelWallMm ?? 0);
}

function supportOf(input: Input): NonNullable<PartsInput['plates']>['support'] {
  if (input.plates === 'stays') return { by: 'stays', pitchMm: input.pitchMm, ending: input.ending };
  return input.plates === 'ring' ? { by: 'ring', widthMm: ringWidth(input) } : { by: 'nothing' };
}

const partsInput = (input: Input, barrelWallMm = input.barrelWallMm): PartsInput => ({
  material: input.material,
  workingPa: input.workingPa,
  marginK: input.marginK,
  barrel: {
    outsideMm: input.barrelOutsideMm,
    wallMm: barrelWallMm,
    seam: input.seam,
    isInFire: input.barrelPlace === 'in',
  },
  plates: { thicknessMm: input.plateMm, support: supportOf(input) },
  ...(input.flue === 'fitted' && {
    flue: { outsideMm: input.flueOutsideMm, wallMm: input.flueWallMm, lengthMm: input.flueLengthMm },
  }),
  ...(input.tubes !== 'none' && {
    tubes: {
      outsideMm: input.tubeOutsideMm,
      wallMm: input.tubeWallMm,
      lengthMm: null,
      pressure: input.tubes === 'fire' ? ('outside' as const) : ('inside' as const),
    },
  }),
  ...(input.stays === 'fitted' && {
    stays: { diameterMm: input.stayMm, pitchMm: input.stayPitchMm, tpi: input.stayTpi },
  }),
});

const barrelStandsAt = (input: Input, wallMm: number): number | null =>
  wallMm * 2 >= input.barrelOutsideMm || wallMm <= 0
    ? null
    : (pressureByParts(partsInput(input, wallMm)).parts[0]?.standsPa ?? null);

const stepsOf = ({ title, lines, refusal, governing }: PartOutcome): Steps => ({
  title: governing === null ? title : `${title}: ${pressureText(governing.result.value)}`,
  lines,
  refusals: refusal === null ? [] : [refusal],
});

/** Heat and stress of the metal, once for the parts in the fire and once for those outside it. */
function metalSteps(parts: readonly PartOutcome[]): Steps[] {
  const byHeat = new Map<string, PartOutcome[]>();
  for (const part of parts) {
    const heat = String(part.metal[0]?.result.value ?? '');
    if (heat !== '') byHeat.set(heat, [...(byHeat.get(heat) ?? []), part]);
  }
  return [...byHeat.values()].map((alike) => ({
    title: `Metal of ${listText(alike.map(({ id }) => partTitles[id].toLowerCase()))}`,
    lines: alike[0]?.metal ?? [],
    refusals: [],
  }));
}

/** The wall that the shell formula alone asks for; the older rule may ask for more. */
function wallStep(input: Input, [barrel]: readonly PartOutcome[]): Steps[] {
  const stress = barrel?.metal.at(-1);
  if (stress === undefined) return [];
  const needed = barrelThickness({
    insideRadiusMm: input.barrelOutsideMm / 2 - (input.barrelWallMm ?? 0),
    pressurePa: input.workingPa,
    stressPa: stress.result.value,
    joint: seamEfficiencies[input.seam].efficiency,
  });
  return [steps('Wall the barrel needs, by the shell formula', needed)];
}

/** What each pressure part stands, and which governs. */
export const pressureByPartsCalculator = calculator({
  id: 'pressure-by-parts',
  title: 'What pressure the parts stand',
  about:
    'Barrel, end plates, flue, tubes, stays and joints: what each stands by calculation, and which is weakest.',
  group: 'strength',
  caution:
    'A calculation is no test and no leave to steam. Metal thins, joints age and drawings lie: test with water under your local code, and let your boiler inspector decide.',
  fields,
  check,
  work: (input) => {
    const { parts, weakest } = pressureByParts(partsInput(input));
    const gaps = parts.filter(({ refusal }) => refusal !== null);
    // Past a sixth of the barrel the thin-shell formula no longer holds.
    const most = Math.min(wallRange[1], input.barrelOutsideMm / 6.01);
    const needed = wallNeeded(input.workingPa, (wall) => barrelStandsAt(input, wall), most);
    const says = [
      weakest === null || weakest.standsPa === null
        ? 'Cannot say: no part could be worked out.'
        : `The ${weakest.title.toLowerCase()} ${weakest.id === 'barrel' || weakest.id === 'flue' ? 'governs' : 'govern'}: ${pressureText(weakest.standsPa)}, for ${pressureText(input.workingPa)} claimed. ${weakest.standsPa >= input.workingPa ? 'Nothing worked out here falls short of it.' : 'That is less than is claimed.'}`,
      ...(gaps.length === 0
        ? []
        : [
            `Not worked out, so still unknown: ${listText(gaps.map(({ id }) => partTitles[id].toLowerCase()))}.`,
          ]),
      ...(needed === null
        ? []
        : [
            `A barrel of this size needs a wall of at least ${lengthText(needed)} for ${pressureText(input.workingPa)}, with nothing added for wear.`,
          ]),
      jointSays(input),
    ];
    return {
      answers: [
        ...(weakest?.governing
          ? [{ ...weakest.governing.result, label: `Weakest part: ${weakest.title.toLowerCase()}` }]
          : []),
        ...parts.flatMap(({ governing, title }) =>
          governing === null ? [] : [{ ...governing.result, label: title }],
        ),
      ],
      says,
      steps: [...metalSteps(parts), ...parts.map(stepsOf), ...wallStep(input, parts)],
    };
  },
  plot: (input): Plot => {
    const most = Math.max(3, (input.barrelWallMm ?? 2) * 2);
    const stands = input.barrelWallMm === null ? null : barrelStandsAt(input, input.barrelWallMm);
    return {
      title: 'What the barrel stands by its wall',
      x: { label: 'Wall', quantity: 'length' },
      y: { label: 'Pressure', quantity: 'pressure' },
      series: [curve('Barrel stands', spread(most / 40, most, 40), (wall) => barrelStandsAt(input, wall))],
      marks:
        stands === null || input.barrelWallMm === null
          ? []
          : [{ label: 'Yours', x: input.barrelWallMm, y: stands }],
      levels: [{ label: 'Claimed working pressure', y: input.workingPa }],
    };
  },
});
