import type { Units } from '#shared/accounts/contract.ts';
import { fromKept, listedText, toKept, unitOf } from '#shared/engineering/quantities.ts';
import type { Quantity } from '#shared/engineering/quantities.ts';

const locale = 'en-GB';

export { formatBand, formatMoney, formatPence, formatSum } from '#shared/money-words.ts';

export const formatNumber = (value: number, digits = 0): string =>
  new Intl.NumberFormat(locale, { maximumFractionDigits: digits }).format(value);

const read = (text: string): Date => new Date(text.length === 10 ? `${text}T12:00:00` : text);

export const formatDay = (day: string): string =>
  new Intl.DateTimeFormat(locale, { day: 'numeric', month: 'long', year: 'numeric' }).format(read(day));

export const formatInstant = (at: string): string =>
  new Intl.DateTimeFormat(locale, {
    weekday: 'short',
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
  }).format(read(at));

/** A year, a month or a day, as far as it is known. */
export function formatRough(when: string): string {
  if (when.length === 4) return when;
  if (when.length === 7)
    return new Intl.DateTimeFormat(locale, { month: 'long', year: 'numeric' }).format(read(`${when}-15`));
  return formatDay(when);
}

/** How far off an instant is, in words: "in 2 days", "3 hours ago". */
export function formatFromNow(at: string, now: Date = new Date()): string {
  const minutes = Math.round((read(at).getTime() - now.getTime()) / 60_000);
  const words = new Intl.RelativeTimeFormat(locale, { numeric: 'auto' });
  if (Math.abs(minutes) < 60) return words.format(minutes, 'minute');
  if (Math.abs(minutes) < 48 * 60) return words.format(Math.round(minutes / 60), 'hour');
  return words.format(Math.round(minutes / 1_440), 'day');
}

export type { Quantity };
export { unitOf };
export const fromSi = fromKept;
export const toSi = toKept;

/** A figure in the reader's units with its unit; a dash for none. */
export const formatQuantity = (quantity: Quantity, units: Units, value: number | null | undefined): string =>
  value === null || value === undefined ? '–' : listedText(quantity, units, value);

export const formatBytes = (bytes: number): string =>
  bytes < 1_000_000
    ? `${formatNumber(Math.ceil(bytes / 1_000))} kB`
    : `${formatNumber(bytes / 1_000_000, 1)} MB`;
