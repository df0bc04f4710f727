import { monthsLater } from '../time.ts';
import type { Day } from '../time.ts';

/** Months from the examination after which a report is called old. */
export const oldAfterMonths = 14;

/** Whether a report of what was examined on one day is old on another. */
export const isOldReport = (examinedOn: Day, on: Day): boolean =>
  monthsLater(examinedOn, oldAfterMonths) < on;
