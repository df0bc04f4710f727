import type { Money } from '#shared/money.ts';
import type { Instant } from '#shared/time.ts';

/** An amount as a letter says it. */
export const moneyText = ({ minor, currency }: Money): string =>
  new Intl.NumberFormat('en-GB', { style: 'currency', currency }).format(minor / 100);

const clock = new Intl.DateTimeFormat('en-GB', {
  weekday: 'long',
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
  timeZone: 'Europe/London',
  timeZoneName: 'short',
});

/** A time as a letter says it, by the clock of the workshop's country, which it names. */
export const timeText = (at: Instant): string => clock.format(new Date(at));
