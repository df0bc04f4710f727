import type { Units } from '#shared/accounts/contract.ts';
import { fromKept, quantityText, toKept, unitOf } from '#shared/engineering/quantities.ts';
import type { Quantity } from '#shared/engineering/quantities.ts';
import type { Money } from '#shared/money.ts';

const locale = 'en-GB';

export const formatMoney = ({ minor, currency }: Money): string =>
  new Intl.NumberFormat(locale, {
    style: 'currency',
    currency,
    ...(minor % 100 === 0 ? { minimumFractionDigits: 0 } : {}),
  }).format(minor / 100);

/** Money in a column that adds up: pence always, so that the figures stand under one another. */
export const formatSum = ({ minor, currency }: Money): string =>
  new Intl.NumberFormat(locale, { style: 'currency', currency }).format(minor / 100);

export const formatPence = (minor: number): string => formatMoney({ minor, currency: 'GBP' });

/** A band of money; one figure where both ends are the same. */
export const formatBand = (lowMinor: number, highMinor: number): string =>
  lowMinor === highMinor ? formatPence(lowMinor) : `${formatPence(lowMinor)}–${formatPence(highMinor)}`;

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

/** Places after the point where a list of figures wants them alike; the rest go by significant figures. */
const places: Partial<Record<Quantity, Record<Units, number>>> = {
  pressure: { imperial: 0, metric: 2 },
  length: { imperial: 3, metric: 1 },
  volume: { imperial: 2, metric: 2 },
  mass: { imperial: 1, metric: 1 },
  distance: { imperial: 0, metric: 0 },
};

/** A figure in the reader's units with its unit; a dash for none. */
export function formatQuantity(quantity: Quantity, units: Units, value: number | null | undefined): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '–';
  const digits = places[quantity]?.[units];
  return digits === undefined
    ? quantityText(quantity, units, value)
    : `${formatNumber(fromKept(quantity, units, value), digits)} ${unitOf(quantity, units)}`;
}

export const formatBytes = (bytes: number): string =>
  bytes < 1_000_000
    ? `${formatNumber(Math.ceil(bytes / 1_000))} kB`
    : `${formatNumber(bytes / 1_000_000, 1)} MB`;
