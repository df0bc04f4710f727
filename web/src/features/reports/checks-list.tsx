import type { ReactNode } from 'react';
import type { EngineeringCheck } from '#shared/surveys/result.ts';
import type { Grade } from '#shared/surveys/record.ts';
import { GradeMark } from '#web/ui/grade-mark.tsx';
import { FigureLine } from './result-summary.tsx';

const order: readonly EngineeringCheck['status'][] = ['fail', 'pass', 'cannot-say'];
const outcomes: Record<EngineeringCheck['status'], { mark: Grade; words: string }> = {
  pass: { mark: 'sound', words: 'Passes' },
  fail: { mark: 'unfit', words: 'Fails' },
  'cannot-say': { mark: 'notExamined', words: 'Cannot be said' },
};

/** The engineering checks, each with its outcome and the figures it went by; those that fail stand first. */
export function ChecksList({
  checks,
  aside,
}: {
  checks: readonly EngineeringCheck[];
  /** Stands after what a check says. */
  aside?: (check: EngineeringCheck) => ReactNode;
}) {
  const sorted = checks.toSorted((a, b) => order.indexOf(a.status) - order.indexOf(b.status));
  return (
    <ul className="border-t border-rule">
      {sorted.map((check) => {
        const { mark, words } = outcomes[check.status];
        return (
          <li
            key={check.id}
            className="grid gap-x-6 border-b border-rule py-2.5 sm:grid-cols-[14rem_9rem_minmax(0,1fr)]"
          >
            <span className="font-medium">{check.title}</span>
            <span className="inline-flex items-center gap-2 self-start">
              <GradeMark grade={mark} size={16} />
              {words}
            </span>
            <span>
              {check.text}
              <FigureLine figures={check.figures} />
              {aside?.(check)}
            </span>
          </li>
        );
      })}
    </ul>
  );
}
