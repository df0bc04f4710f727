import { Link } from 'react-router-dom';
import type { Figure as FigureData, Reason, SurveyResult } from '#shared/surveys/result.ts';
import { Figure } from '#web/ui/figures.tsx';
import { GradeMark } from '#web/ui/grade-mark.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { useShowFigure } from './use-show-figure.ts';

interface Props {
  result: SurveyResult;
  /** Where a reason's item can be read; absent where there is nowhere to go. */
  hrefOf?: (criterionId: string) => string;
}

/** Verdict with its reasons first, then the two figures, never one without the other. */
export function ResultSummary({ result, hrefOf }: Props) {
  const { verdict, reasons, furtherReasons, toProve, condition, evidence } = result;
  return (
    <div className="border border-ink bg-sheet">
      <div className="p-5">
        <p className="text-label text-pencil">Verdict, as found on the day</p>
        <div className="mt-1">
          <VerdictMark verdict={verdict.id} isLarge />
        </div>
        {reasons.length === 0 ? (
          <p className="mt-3">Nothing found speaks against it, and enough was examined to say so.</p>
        ) : (
          <Reasons reasons={reasons} hrefOf={hrefOf} />
        )}
        {furtherReasons.length > 0 && (
          <details className="mt-2">
            <summary className="min-h-11 py-2.5 font-medium marker:text-copper">
              What would still stand against it once that is put right: {furtherReasons.length}
            </summary>
            <Reasons reasons={furtherReasons} hrefOf={hrefOf} />
          </details>
        )}
        {toProve.length > 0 && (
          <div className="mt-3">
            <h3>What would prove it</h3>
            <ul className="list-disc pl-5">
              {toProve.map(({ rule, text }) => (
                <li key={rule + text}>{text}</li>
              ))}
            </ul>
          </div>
        )}
      </div>
      <div className="grid grid-cols-2 border-t border-rule">
        <div className="p-5">
          <Figure label="Condition" value={condition ?? '–'} of="/ 100" share={condition} />
          {condition === null && (
            <p className="mt-2 text-sm text-pencil">Less than a third was examined, so none is given.</p>
          )}
        </div>
        <div className="border-l border-rule p-5">
          <Figure label="Evidence" value={evidence} of="%" share={evidence} />
        </div>
      </div>
    </div>
  );
}

const marks = {
  'do-not-steam': 'unfit',
  'repair-before-steaming': 'attention',
  'not-proven': 'notExamined',
  'in-steaming-order': 'sound',
} as const;

function Reasons({ reasons, hrefOf }: { reasons: readonly Reason[]; hrefOf: Props['hrefOf'] }) {
  return (
    <ul className="mt-3 border-t border-rule">
      {reasons.map((reason) => (
        <li
          key={reason.rule + (reason.criterionId ?? '') + reason.text}
          className="flex gap-3 border-b border-rule py-2 leading-6"
        >
          <span className="mt-1 flex-none">
            <GradeMark grade={marks[reason.verdict]} />
          </span>
          <span className="min-w-0">
            {reason.criterionId !== null && hrefOf ? (
              <Link className="underline decoration-rule underline-offset-4" to={hrefOf(reason.criterionId)}>
                {reason.text}
              </Link>
            ) : (
              reason.text
            )}
            <FigureLine figures={reason.figures} />
          </span>
        </li>
      ))}
    </ul>
  );
}

/** The figures behind a statement, in the reader's own units. */
export function FigureLine({ figures }: { figures: readonly FigureData[] }) {
  const show = useShowFigure();
  if (figures.length === 0) return null;
  return (
    <span className="block text-sm text-pencil">
      {figures.map((figure) => `${figure.label} ${show(figure)}`).join(' · ')}
    </span>
  );
}
