import type { EngineeringCheck, Figure } from './result.ts';
import { isStopCheck } from './verdict-rules.ts';
import type { CheckId } from './verdict-rules.ts';

export interface CheckMaker {
  pass: (text: string, figures?: readonly Figure[]) => EngineeringCheck;
  fail: (text: string, figures?: readonly Figure[]) => EngineeringCheck;
  cannotSay: (text: string, figures?: readonly Figure[]) => EngineeringCheck;
}

/** Makes the outcomes of one engineering check. */
export function check(id: CheckId, title: string, criterionId: string | null): CheckMaker {
  const make =
    (status: EngineeringCheck['status']) =>
    (text: string, figures: readonly Figure[] = []): EngineeringCheck => ({
      id,
      title,
      status,
      stop: isStopCheck(id),
      criterionId,
      text,
      figures: [...figures],
    });
  return { pass: make('pass'), fail: make('fail'), cannotSay: make('cannot-say') };
}

export const figure = (label: string, value: number, unit: Figure['unit']): Figure => ({
  label,
  value,
  unit,
});

/** A thousandth of a bar: less than any gauge shows, more than a change of units can make. */
const unseenPa = 100;

/** Whether one pressure is above another by more than a change of units could make. */
export const isAbove = (pa: number, limitPa: number): boolean => pa > limitPa + unseenPa;
