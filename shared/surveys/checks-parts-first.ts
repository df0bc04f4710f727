import type { BoilerFacts, MaterialId } from '../boilers/boiler.ts';
import { check, figure, isAbove } from './check.ts';
import { figureOf } from './examined.ts';
import type { Examined, SurveyInput } from './examined.ts';
import { longFlueLine } from '../engineering/flue.ts';
import { allowableStress, elasticity } from '../engineering/metal.ts';
import { atmospherePa, saturationTemperatureK } from '../engineering/steam.ts';
import { valueOf } from '../engineering/working.ts';
import type { EngineeringCheck } from './result.ts';
import { lengthText, pressureText } from './words.ts';

/** What version 1.0.0 took a brazed seam at, whatever the seam. */
const joint = 0.8;

/** What version 1.0.0 took type 304 at, whatever its temperature. */
const stainlessPa = 110_000_000;

function stressAt(material: MaterialId, workingPa: number): number | null {
  if (material === 'stainless') return stainlessPa;
  return valueOf(allowableStress(material, saturationTemperatureK(workingPa + atmospherePa)));
}

const barrelStands = (outsideMm: number, thicknessMm: number, stressPa: number): number =>
  (stressPa * joint * thicknessMm) / (outsideMm / 2 - thicknessMm + 0.6 * thicknessMm);

function flueStands(insideMm: number, thicknessMm: number, stressPa: number, material: MaterialId): number {
  const outsideMm = insideMm + 2 * thicknessMm;
  const flattening = longFlueLine({
    outsideMm,
    thicknessMm,
    lengthMm: null,
    stressPa,
    ...elasticity[material],
  });
  return Math.min((2 * stressPa * thicknessMm) / outsideMm, flattening.result.value);
}

const plateStands = (pitchMm: number, thicknessMm: number, stressPa: number): number =>
  (thicknessMm ** 2 * stressPa * 2.1) / pitchMm ** 2;

interface Part {
  title: string;
  criterionId: string;
  thicknessMm: number;
  isMeasured: boolean;
  standsPa: number;
}

const part = (
  title: string,
  criterionId: string,
  measuredMm: number | null,
  statedMm: number | null,
  stands: (thicknessMm: number) => number | null,
): Part[] => {
  const thicknessMm = measuredMm ?? statedMm;
  const standsPa = thicknessMm === null ? null : stands(thicknessMm);
  return thicknessMm === null || standsPa === null
    ? []
    : [{ title, criterionId, thicknessMm, isMeasured: measuredMm !== null, standsPa }];
};

/** The parts whose pressure can be worked out from what was measured, or failing that from what the seller says. */
function partsOf(facts: BoilerFacts, items: readonly Examined[]): Part[] {
  const stressPa = stressAt(facts.material, facts.workingPressurePa);
  if (stressPa === null) return [];
  const size = facts.dimensions;
  const outsideMm =
    figureOf(items, 'identity.match', 'outsideDiameterMm', 'most') ?? size.barrelOutsideDiameterMm;
  const flueInsideMm = figureOf(items, 'shell.flue', 'insideDiameterMm', 'most') ?? size.flueDiameterMm;
  const pitchMm = figureOf(items, 'shell.stays', 'pitchMm', 'most');
  return [
    ...part(
      'Barrel',
      'shell.barrel',
      figureOf(items, 'shell.barrel', 'thinnestMm'),
      size.barrelThicknessMm,
      (thicknessMm) => barrelStands(outsideMm, thicknessMm, stressPa),
    ),
    ...part(
      'Flue',
      'shell.flue',
      figureOf(items, 'shell.flue', 'thinnestMm'),
      size.flueThicknessMm,
      (thicknessMm) =>
        flueInsideMm === null ? null : flueStands(flueInsideMm, thicknessMm, stressPa, facts.material),
    ),
    ...part(
      'Stayed plate',
      'shell.stays',
      figureOf(items, 'shell.plates', 'thinnestMm'),
      size.endPlateThicknessMm,
      (thicknessMm) => (pitchMm === null ? null : plateStands(pitchMm, thicknessMm, stressPa)),
    ),
  ];
}

/**
 * What the thinnest parts will stand, as version 1.0.0 of the method worked it out. Reports scored with it keep it.
 */
export function partsPressureAtFirst({ facts }: SurveyInput, items: readonly Examined[]): EngineeringCheck {
  const parts = partsOf(facts, items);
  const measured = parts.filter(({ isMeasured }) => isMeasured);
  const weakest = (measured.length > 0 ? measured : parts).toSorted((a, b) => a.standsPa - b.standsPa)[0];
  const make = check('parts-pressure', 'What the parts will stand', weakest?.criterionId ?? 'shell.barrel');
  if (weakest === undefined)
    return make.cannotSay(
      stressAt(facts.material, facts.workingPressurePa) === null
        ? 'Cannot be worked out: no allowable stress is published here for this metal at that temperature.'
        : 'Cannot be worked out: measure the wall of barrel, flue and plates.',
    );
  const standsPa = Math.floor(weakest.standsPa);
  const figures = [
    figure(`${weakest.title}, thickness`, weakest.thicknessMm, 'mm'),
    figure(`${weakest.title} stands`, standsPa, 'Pa'),
    figure('Claimed working pressure', facts.workingPressurePa, 'Pa'),
  ];
  const told = `${weakest.title} at ${lengthText(weakest.thicknessMm)} comes to ${pressureText(standsPa)} by calculation, for ${pressureText(facts.workingPressurePa)} claimed`;
  if (!weakest.isMeasured)
    return make.cannotSay(`On the seller’s figures, not measured: ${told}. Measure it.`, figures);
  return isAbove(facts.workingPressurePa, standsPa)
    ? make.fail(`${told}.`, figures)
    : make.pass(`${told}.`, figures);
}
