import { z } from 'zod';

/** An instant in UTC, ISO 8601 with `Z`. */
export const instant = z.iso.datetime('Give a date and time');
export type Instant = z.infer<typeof instant>;
/** A calendar day, the same in every zone. */
export const day = z.iso.date('Give a date');
export type Day = z.infer<typeof day>;

const fromParts = (text: string): number => {
  // The one place in shared that touches Date: arithmetic on a given instant, never the clock.
  const ms = globalThis.Date.parse(text);
  if (Number.isNaN(ms)) throw new RangeError(`Not a time: ${text}`);
  return ms;
};
const toIso = (ms: number): string => new globalThis.Date(ms).toISOString();

export const minutesMs = 60_000;
export const hoursMs = 60 * minutesMs;
export const daysMs = 24 * hoursMs;

export const addMs = (from: Instant, ms: number): Instant => toIso(fromParts(from) + ms);
export const addHours = (from: Instant, hours: number): Instant => addMs(from, hours * hoursMs);
export const addDays = (from: Instant, days: number): Instant => addMs(from, days * daysMs);
export const isBefore = (a: Instant, b: Instant): boolean => fromParts(a) < fromParts(b);
/** Milliseconds from `a` to `b`; negative if `b` is earlier. */
export const msBetween = (a: Instant, b: Instant): number => fromParts(b) - fromParts(a);
/** The UTC day of an instant. */
export const dayOf = (at: Instant): Day => toIso(fromParts(at)).slice(0, 10);
/** Whole days from `a` to `b`. */
export const daysBetween = (a: Day, b: Day): number => Math.round((fromParts(b) - fromParts(a)) / daysMs);

/** The day a number of calendar months later; the last day of the month where the day does not exist. */
export function monthsLater(from: Day, months: number): Day {
  const [year = 0, month = 1, date = 1] = from.split('-').map(Number);
  const index = year * 12 + (month - 1) + months;
  const last = new globalThis.Date(
    globalThis.Date.UTC(Math.floor(index / 12), (index % 12) + 1, 0),
  ).getUTCDate();
  return toIso(globalThis.Date.UTC(Math.floor(index / 12), index % 12, Math.min(date, last))).slice(0, 10);
}

const monthNames = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const;

/** “12 March 2027”. */
export function dayText(of: Day): string {
  const [year = 0, month = 1, date = 1] = of.split('-').map(Number);
  return `${String(date)} ${monthNames[month - 1] ?? ''} ${String(year)}`;
}
