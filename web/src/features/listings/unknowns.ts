import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { traitsOf } from '#shared/boilers/boiler.ts';

/** What a buyer would ask and the seller has not said, each with why it matters. */
export function unknownsOf(facts: BoilerFacts): { what: string; why: string }[] {
  const traits = traitsOf(facts);
  const { dimensions } = facts;
  const has = (kind: string) => facts.papers.some((paper) => paper.kind === kind && paper.datedOn !== null);
  const asked: [boolean, string, string][] = [
    [
      dimensions.barrelThicknessMm === null,
      'Thickness of the barrel',
      'without it nobody can work out what pressure it will stand',
    ],
    [
      dimensions.endPlateThicknessMm === null,
      'Thickness of the end plates',
      'flat plates are often the weakest part',
    ],
    [
      traits.has('flue') && dimensions.flueThicknessMm === null,
      'Thickness of the flue',
      'a flue fails inwards',
    ],
    [
      traits.has('fire-tubes') && dimensions.tubeCount === null,
      'Number of tubes',
      'they are most of the heating surface',
    ],
    [dimensions.heatingSurfaceM2 === null, 'Heating surface', 'it says how much steam to expect'],
    [facts.builder === null, 'Builder', 'nobody can be asked how it was made'],
    [facts.builtYear === null, 'Year', 'the age of its joints is not known'],
    [
      !has('hydraulic-certificate'),
      'Date of the last hydraulic test',
      'there is no paper to say it ever held',
    ],
    [
      !has('steam-certificate'),
      'Date of the last steam test',
      'the valve’s lift has not been witnessed on paper',
    ],
    [
      facts.pressureEvidence === 'seller-only',
      'Where the working pressure comes from',
      'it is only what the seller was told',
    ],
    [
      facts.construction === 'unknown',
      'How it is joined',
      'soft solder in a pressure joint is a reason not to steam',
    ],
  ];
  return asked.filter(([isAsked]) => isAsked).map(([, what, why]) => ({ what, why }));
}
