import { useId, useState } from 'react';
import type { ReactNode } from 'react';
import type { SurveyResult } from '#shared/surveys/result.ts';
import { formatBand } from '#web/lib/format.ts';
import { Button } from '#web/ui/button.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

interface Props {
  result: SurveyResult;
  summaryOf: (result: SurveyResult) => ReactNode;
  /** Null where nothing has been changed. */
  onReset: (() => void) | null;
}

const figures = ({ condition, evidence }: SurveyResult): string =>
  `Condition ${condition === null ? 'none' : String(condition)}, Evidence ${String(evidence)} %`;

/** What the findings come to, always in sight: beside them on a wide screen, in a bar above them on a phone. */
export function TrialResult({ result, summaryOf, onReset }: Props) {
  const [isOpen, setIsOpen] = useState(false);
  const id = useId();
  const { verdict, allowance } = result;
  const total = formatBand(allowance.total.lowMinor, allowance.total.highMinor);
  return (
    <aside
      aria-label="What the findings come to"
      className="sticky top-0 z-10 -mx-4 bg-paper px-4 sm:-mx-6 sm:px-6 lg:top-4 lg:col-start-2 lg:mx-0 lg:max-h-[calc(100dvh-2rem)] lg:self-start lg:overflow-y-auto lg:px-0"
    >
      <output className="sr-only" aria-live="polite">
        {verdict.label}. {figures(result)}. Put-right allowance {total}.
      </output>
      <div className="flex items-center justify-between gap-3 border-b border-ink py-1.5 lg:hidden">
        <div className="min-w-0">
          <VerdictMark verdict={verdict.id} />
          <p className="text-sm leading-5 text-pencil">{figures(result)}</p>
        </div>
        <Button
          kind="quiet"
          aria-expanded={isOpen}
          aria-controls={id}
          onClick={() => {
            setIsOpen(!isOpen);
          }}
        >
          {isOpen ? 'Close' : 'Why'}
        </Button>
      </div>
      <div
        id={id}
        className={`lg:block lg:max-h-none ${isOpen ? 'max-h-[70dvh] overflow-y-auto border-b border-ink py-3' : 'hidden'} lg:border-b-0 lg:py-0`}
      >
        {summaryOf(result)}
        <dl className="border-x border-b border-ink bg-sheet px-5 py-3">
          {allowance.groups
            .filter(({ lines }) => lines.length > 0)
            .map(({ id, label, lowMinor, highMinor }) => (
              <div key={id} className="flex justify-between gap-4 text-[0.9375rem]">
                <dt>{label}</dt>
                <dd className="flex-none">{formatBand(lowMinor, highMinor)}</dd>
              </div>
            ))}
          {allowance.retestCosts.map(({ id, label, minor }) => (
            <div key={id} className="flex justify-between gap-4 text-[0.9375rem]">
              <dt>{label}</dt>
              <dd className="flex-none">{formatBand(minor, minor)}</dd>
            </div>
          ))}
          <div className="mt-1 flex justify-between gap-4 border-t border-rule pt-1 font-medium">
            <dt>Put-right allowance</dt>
            <dd className="flex-none">{total}</dd>
          </div>
        </dl>
        <div className="mt-3">
          <Button kind="quiet" disabled={onReset === null} onClick={() => onReset?.()}>
            Back to the start
          </Button>
        </div>
      </div>
    </aside>
  );
}
