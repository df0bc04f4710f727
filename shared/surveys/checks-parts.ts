import { check, figure, isAbove } from './check.ts';
import type { Examined, SurveyInput } from './examined.ts';
import { partsOf, weakestOf } from './parts.ts';
import type { BoilerPart } from './parts.ts';
import type { EngineeringCheck, Figure } from './result.ts';
import { inSentence, lengthText, listText, pressureText } from './words.ts';

const partFigure = ({ title, standsPa }: BoilerPart): Figure[] =>
  standsPa === null ? [] : [figure(`${title}, by calculation`, Math.floor(standsPa), 'Pa')];

const toldOf = ({ id, title, thicknessMm, standsPa }: BoilerPart): string => {
  const comes = id === 'barrel' || id === 'flue' ? 'comes' : 'come';
  return `${title} at ${lengthText(thicknessMm ?? 0)} ${comes} to ${pressureText(Math.floor(standsPa ?? 0))} by calculation`;
};

/** What could not be worked out, and what to measure. */
function gapsOf(parts: readonly BoilerPart[]): string {
  const gaps = parts.filter(({ standsPa }) => standsPa === null);
  return gaps.length === 0 ? '' : ` Not worked out: ${listText(gaps.map(({ title }) => inSentence(title)))}.`;
}

/**
 * What each pressure part stands by calculation, against the claimed working pressure. Only a part that was measured can
 * fail a boiler; one that falls short on the seller's figures is to be measured.
 */
export function partsPressure({ facts }: SurveyInput, items: readonly Examined[]): EngineeringCheck {
  const claimedPa = facts.workingPressurePa;
  const parts = partsOf(facts, items);
  const worked = parts.filter(({ standsPa }) => standsPa !== null);
  const measured = weakestOf(worked.filter(({ isMeasured }) => isMeasured));
  const stated = weakestOf(worked.filter(({ isMeasured }) => !isMeasured));
  const isShort = (part: BoilerPart | null): part is BoilerPart =>
    part !== null && isAbove(claimedPa, Math.floor(part.standsPa ?? 0));
  const subject = (isShort(measured) ? measured : isShort(stated) ? stated : null) ?? measured ?? stated;
  const make = check('parts-pressure', 'What the parts will stand', subject?.criterionId ?? 'shell.barrel');
  if (subject === null)
    return make.cannotSay(
      `Cannot be worked out. ${parts.map(({ refusal }) => refusal?.text ?? '').find(Boolean) ?? ''}`,
    );
  const figures = [
    figure(`${subject.title}, thickness`, subject.thicknessMm ?? 0, 'mm'),
    ...parts.flatMap(partFigure),
    figure('Claimed working pressure', claimedPa, 'Pa'),
  ];
  const told = `${toldOf(subject)}, for ${pressureText(claimedPa)} claimed.`;
  if (isShort(measured)) return make.fail(told, figures);
  if (measured === null || isShort(stated))
    return make.cannotSay(
      `On the seller’s figures, not measured: ${told} Measure it.${gapsOf(parts)}`,
      figures,
    );
  return make.pass(`The weakest part measured: ${inSentence(told)}${gapsOf(parts)}`, figures);
}
