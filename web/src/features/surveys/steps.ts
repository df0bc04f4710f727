import type { Survey } from '#shared/surveys/contract.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { criteriaFor, rubricOf } from '#shared/surveys/rubric/index.ts';
import type { Criterion, SectionId } from '#shared/surveys/rubric/types.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import { findingOf } from './record-edits.ts';

export type Step =
  | { kind: 'start' | 'hydraulic' | 'steam' | 'summary' | 'review'; id: string; title: string }
  | { kind: 'criterion'; id: string; title: string; criterion: Criterion };

const plain = (kind: Exclude<Step['kind'], 'criterion'>, title: string): Step => ({ kind, id: kind, title });

type Subject = Pick<Survey, 'facts' | 'scope'> & { record: Pick<SurveyRecord, 'rubricVersion'> };

/** The screens of an examination in the order of the work: instruments, every item that applies, tests, report. */
export function stepsOf({ facts, scope, record }: Subject): Step[] {
  const criteria = criteriaFor(facts, rubricOf(record.rubricVersion));
  return [
    plain('start', 'Day and instruments'),
    ...criteria.map((criterion): Step => ({
      kind: 'criterion',
      id: criterion.id,
      title: criterion.title,
      criterion,
    })),
    ...(scopes[scope].hydraulic ? [plain('hydraulic', 'Hydraulic test')] : []),
    ...(scopes[scope].steam ? [plain('steam', 'Steam test')] : []),
    plain('summary', 'In your own words'),
    plain('review', 'Review and sign'),
  ];
}

export interface SectionProgress {
  id: SectionId;
  title: string;
  steps: Extract<Step, { kind: 'criterion' }>[];
  done: number;
}

/** How far each section has got; an item counts once something is recorded of it. */
export function sectionsOf(steps: readonly Step[], record: SurveyRecord): SectionProgress[] {
  return rubricOf(record.rubricVersion)
    .sections.map(({ id, title }) => {
      const own = steps.flatMap((step) =>
        step.kind === 'criterion' && step.criterion.section === id ? [step] : [],
      );
      const done = own.filter((step) => findingOf(record, step.id) !== undefined).length;
      return { id, title, steps: own, done };
    })
    .filter(({ steps }) => steps.length > 0);
}

/** Whether something is recorded on a screen. */
export function isTouched(step: Step, record: SurveyRecord): boolean {
  const touched: Record<Step['kind'], boolean> = {
    start: record.examinedOn !== null,
    criterion: findingOf(record, step.id) !== undefined,
    hydraulic: record.hydraulic !== null || record.noHydraulicReason !== '',
    steam: record.steam !== null || record.noSteamReason !== '',
    summary: record.summary !== '',
    review: false,
  };
  return touched[step.kind];
}
