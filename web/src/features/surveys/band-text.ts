import type { AllowanceOverride } from '#shared/surveys/record.ts';
import { formatBand, formatNumber } from '#web/lib/format.ts';

/** Hours and parts of a band in one line: `0.5–2 h and £1–£5 of parts`. */
export function bandText({ hoursLow, hoursHigh, partsLowMinor, partsHighMinor }: AllowanceOverride): string {
  const labour = hoursHigh > 0 ? `${hoursText(hoursLow, hoursHigh)} h` : '';
  const parts = partsHighMinor > 0 ? `${formatBand(partsLowMinor, partsHighMinor)} of parts` : '';
  return [labour, parts].filter(Boolean).join(' and ') || 'nothing to pay';
}

export const hoursText = (low: number, high: number): string =>
  low === high ? formatNumber(low, 2) : `${formatNumber(low, 2)}–${formatNumber(high, 2)}`;
