import { useId } from 'react';
import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { grades } from '#shared/surveys/record.ts';
import type { Grade, SurveyRecord } from '#shared/surveys/record.ts';
import { criteriaFor, defectOf, rubricOf } from '#shared/surveys/rubric/index.ts';
import type { Criterion } from '#shared/surveys/rubric/types.ts';
import { GradeMark } from '#web/ui/grade-mark.tsx';

interface Props {
  facts: BoilerFacts;
  start: SurveyRecord;
  record: SurveyRecord;
  onGrade: (criterionId: string, grade: Grade, startedAs: Grade) => void;
}

const findingOf = (record: SurveyRecord, id: string) =>
  record.findings.find(({ criterionId }) => criterionId === id);
const gradeOf = (record: SurveyRecord, id: string): Grade => findingOf(record, id)?.grade ?? 'notExamined';

const gradeIds = Object.keys(grades) as Grade[];
/** The part that is open when the reader arrives: where a bad grade shows most. */
const openAtFirst = 'shell';

/** Every item that applies to the example, by section, each with its grade to choose. */
export function TrialGrades({ facts, start, record, onGrade }: Props) {
  const rubric = rubricOf(record.rubricVersion);
  const applicable = criteriaFor(facts, rubric);
  return (
    <div>
      <h3 className="border-b border-ink pb-1">Grades</h3>
      {rubric.sections.map(({ id, title }) => {
        const own = applicable.filter(({ section }) => section === id);
        return (
          <details key={id} className="border-b border-rule" open={id === openAtFirst}>
            <summary className="min-h-11 py-2.5 font-medium marker:text-copper">
              {title}{' '}
              <span className="font-normal text-pencil">
                {tally(own.map((criterion) => gradeOf(record, criterion.id)))}
              </span>
            </summary>
            <ul className="pb-3">
              {own.map((criterion) => (
                <GradeRow
                  key={criterion.id}
                  criterion={criterion}
                  grade={gradeOf(record, criterion.id)}
                  defectCodes={findingOf(record, criterion.id)?.defects.map(({ code }) => code) ?? []}
                  onGrade={(grade) => {
                    onGrade(criterion.id, grade, gradeOf(start, criterion.id));
                  }}
                />
              ))}
            </ul>
          </details>
        );
      })}
    </div>
  );
}

/** How many of each grade, best first: "6 sound, 1 unfit". */
const tally = (found: readonly Grade[]): string =>
  gradeIds
    .map((id) => [found.filter((grade) => grade === id).length, grades[id].toLowerCase()] as const)
    .filter(([count]) => count > 0)
    .map(([count, label]) => `${String(count)} ${label}`)
    .join(', ');

interface RowProps {
  criterion: Criterion;
  grade: Grade;
  defectCodes: readonly string[];
  onGrade: (grade: Grade) => void;
}

function GradeRow({ criterion, grade, defectCodes, onGrade }: RowProps) {
  const id = useId();
  const defects = defectCodes.flatMap((code) => defectOf(criterion, code)?.label ?? []);
  const isBad = grade === 'attention' || grade === 'unfit';
  const note =
    defects.length > 0
      ? `Taken as: ${defects.join('; ')}.`
      : isBad
        ? 'The catalogue has no defect of that grade here, so nothing is allowed for it.'
        : '';
  return (
    <li className="grid items-center gap-x-4 gap-y-1 border-t border-rule py-2 sm:grid-cols-[minmax(0,1fr)_13.5rem]">
      <label htmlFor={id} className="flex gap-2 leading-5">
        <span className="min-w-6 flex-none text-pencil">{criterion.number}</span>
        <span>
          {criterion.title}
          {criterion.safetyCritical && <span className="text-sm text-pencil"> · safety-critical</span>}
        </span>
      </label>
      <span className="flex items-center gap-2.5">
        <GradeMark grade={grade} />
        <select
          id={id}
          className="control"
          value={grade}
          aria-describedby={note === '' ? undefined : `${id}-note`}
          onChange={(event) => {
            const chosen = gradeIds.find((each) => each === event.target.value);
            if (chosen) onGrade(chosen);
          }}
        >
          {gradeIds.map((each) => (
            <option key={each} value={each}>
              {grades[each]}
            </option>
          ))}
        </select>
      </span>
      {note !== '' && (
        <p id={`${id}-note`} className="text-sm leading-5 text-pencil sm:col-span-2 sm:pl-8">
          {note}
        </p>
      )}
    </li>
  );
}
