import { pointer } from '../problem.ts';
import type { FieldError } from '../problem.ts';
import type { Finding, SurveyRecord } from './record.ts';
import { criterionOf, defectOf, rubricOf } from './rubric/index.ts';
import type { Criterion } from './rubric/types.ts';

type Say = (path: readonly PropertyKey[], detail: string) => void;

function ofFinding(finding: Finding, criterion: Criterion, say: Say): void {
  for (const [index, id] of finding.ways.entries()) {
    if (!criterion.ways.some((way) => way.id === id))
      say(['ways', index], `“${id}” is not a way of examining “${criterion.title}”.`);
  }
  for (const [index, { code }] of finding.defects.entries()) {
    if (defectOf(criterion, code) === undefined)
      say(['defects', index, 'code'], `“${code}” is not in the defect catalogue of “${criterion.title}”.`);
  }
  for (const [index, { quantity }] of finding.measurements.entries()) {
    const spec = criterion.measurements.find((each) => each.quantity === quantity);
    if (spec?.takenIn !== 'finding')
      say(['measurements', index, 'quantity'], `“${quantity}” is not measured on “${criterion.title}”.`);
  }
}

/**
 * What a record says in words that its version of the method does not have: criteria, ways, defects and quantities.
 * Pointers are into a body that holds the record under `record`.
 *
 * @param photoIds the photographs a finding may name; left out where there is no survey to hold any.
 * @throws Problem `invalid-input` if no such version of the method was published.
 */
export function unknownWords(record: SurveyRecord, photoIds?: ReadonlySet<string>): FieldError[] {
  const rubric = rubricOf(record.rubricVersion);
  const found: FieldError[] = [];
  for (const [index, finding] of record.findings.entries()) {
    const say: Say = (path, detail) => {
      found.push({ detail, pointer: pointer(['record', 'findings', index, ...path]) });
    };
    const criterion = criterionOf(finding.criterionId, rubric);
    if (criterion === undefined)
      say(['criterionId'], `There is no item “${finding.criterionId}” in version ${rubric.version}.`);
    else ofFinding(finding, criterion, say);
    for (const [at, id] of finding.photoIds.entries()) {
      if (photoIds && !photoIds.has(id)) say(['photoIds', at], 'That photograph is not of this survey.');
    }
  }
  return found;
}
