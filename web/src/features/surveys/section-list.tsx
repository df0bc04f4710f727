import { Link } from 'react-router-dom';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { GradeMark } from '#web/ui/grade-mark.tsx';
import { findingOf } from './record-edits.ts';
import { isTouched, sectionsOf } from './steps.ts';
import type { Step } from './steps.ts';

interface Props {
  steps: readonly Step[];
  record: SurveyRecord;
  hrefOf: (stepId: string) => string;
}

/** The whole examination at a glance: every screen, and what stands on it. */
export function SectionList({ steps, record, hrefOf }: Props) {
  const firstItem = steps.findIndex(({ kind }) => kind === 'criterion');
  const afterItems = steps.findLastIndex(({ kind }) => kind === 'criterion') + 1;
  return (
    <div className="grid gap-6">
      <PlainSteps steps={steps.slice(0, firstItem)} record={record} hrefOf={hrefOf} />
      {sectionsOf(steps, record).map((section) => (
        <section key={section.id} aria-label={section.title}>
          <div className="flex items-baseline justify-between gap-4 border-b border-ink pb-1">
            <h2 className="text-xl">{section.title}</h2>
            <span className="text-sm text-pencil">
              {section.done} of {section.steps.length}
            </span>
          </div>
          <ul>
            {section.steps.map((step) => {
              const grade = findingOf(record, step.id)?.grade;
              return (
                <li key={step.id} className="border-b border-rule">
                  <Link to={hrefOf(step.id)} className="flex min-h-12 items-center gap-3 py-2 hover:bg-wash">
                    <span className="w-7 flex-none text-right text-pencil">{step.criterion.number}</span>
                    <span className="min-w-0 flex-1">{step.title}</span>
                    {grade ? (
                      <GradeMark grade={grade} hasLabel />
                    ) : (
                      <span className="text-sm text-pencil">To do</span>
                    )}
                  </Link>
                </li>
              );
            })}
          </ul>
        </section>
      ))}
      <PlainSteps steps={steps.slice(afterItems)} record={record} hrefOf={hrefOf} />
    </div>
  );
}

function PlainSteps({ steps, record, hrefOf }: Props) {
  return (
    <ul className="border-t border-rule">
      {steps.map((step) => (
        <li key={step.id} className="border-b border-rule">
          <Link
            to={hrefOf(step.id)}
            className="flex min-h-12 items-center justify-between gap-3 py-2 font-medium hover:bg-wash"
          >
            {step.title}
            {step.kind !== 'review' && (
              <span className="text-sm font-normal text-pencil">
                {isTouched(step, record) ? 'Begun' : 'To do'}
              </span>
            )}
          </Link>
        </li>
      ))}
    </ul>
  );
}
