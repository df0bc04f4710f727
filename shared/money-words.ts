import type { Money } from './money.ts';

const locale = 'en-GB';

/** Money as it is read: pence only where there are some. */
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
