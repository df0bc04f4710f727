import type { Grade } from '#shared/surveys/record.ts';
import { verdicts } from '#shared/surveys/verdicts.ts';
import type { VerdictId } from '#shared/surveys/verdicts.ts';
import { GradeMark } from './grade-mark.tsx';

const marks: Record<VerdictId, Grade> = {
  'in-steaming-order': 'sound',
  'not-proven': 'notExamined',
  'repair-before-steaming': 'attention',
  'do-not-steam': 'unfit',
};
const colours: Record<VerdictId, string> = {
  'in-steaming-order': 'text-sound',
  'not-proven': 'text-slate',
  'repair-before-steaming': 'text-attention',
  'do-not-steam': 'text-unfit',
};

/** A verdict with its mark; null says that there has been no survey. */
export function VerdictMark({ verdict, isLarge = false }: { verdict: VerdictId | null; isLarge?: boolean }) {
  if (verdict === null) return <span className="text-pencil">Not surveyed</span>;
  return (
    <span
      className={`inline-flex items-center gap-2 ${colours[verdict]} ${isLarge ? 'text-[1.75rem] leading-9 font-bold tracking-tight' : 'font-medium'}`}
    >
      <GradeMark grade={marks[verdict]} size={isLarge ? 28 : 16} />
      {verdicts[verdict]}
    </span>
  );
}
