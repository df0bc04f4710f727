import type { Instant } from '#shared/time.ts';

/** An amount as a letter says it. */
export { formatSum as moneyText } from '#shared/money-words.ts';

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
