import type { ReactElement } from 'react';
import { grades } from '#shared/surveys/record.ts';
import type { Grade } from '#shared/surveys/record.ts';

const colours: Record<Grade, string> = {
  sound: 'text-sound',
  serviceable: 'text-serviceable',
  attention: 'text-attention',
  unfit: 'text-unfit',
  notExamined: 'text-slate',
  notFitted: 'text-pencil',
};

const ring = <circle cx={11} cy={11} r={9} fill="none" stroke="currentColor" strokeWidth={2} />;
const shapes: Record<Grade, ReactElement> = {
  sound: <circle cx={11} cy={11} r={10} fill="currentColor" />,
  serviceable: (
    <>
      {ring}
      <circle cx={11} cy={11} r={4} fill="currentColor" />
    </>
  ),
  attention: (
    <>
      {ring}
      <path d="M11 2a9 9 0 0 1 0 18z" fill="currentColor" />
    </>
  ),
  unfit: (
    <>
      {ring}
      <path d="M5 5l12 12M17 5L5 17" stroke="currentColor" strokeWidth={2.4} />
    </>
  ),
  notExamined: (
    <circle
      cx={11}
      cy={11}
      r={9}
      fill="none"
      stroke="currentColor"
      strokeWidth={2}
      strokeDasharray="3.4 2.9"
    />
  ),
  notFitted: <path d="M4 11h14" stroke="currentColor" strokeWidth={2.4} />,
};

/** The mark of a grade as drawn in a balloon: shape as well as colour. Give `hasLabel` to say it in words beside it. */
export function GradeMark({
  grade,
  size = 18,
  hasLabel = false,
}: {
  grade: Grade;
  size?: number;
  hasLabel?: boolean;
}) {
  const mark = (
    <svg
      width={size}
      height={size}
      viewBox="0 0 22 22"
      aria-hidden="true"
      className={`flex-none ${colours[grade]}`}
    >
      {shapes[grade]}
    </svg>
  );
  if (!hasLabel) return mark;
  return (
    <span className="inline-flex items-center gap-2">
      {mark}
      {grades[grade]}
    </span>
  );
}
