import { z } from 'zod';
import { add, money, shareOf, zero } from '../money.ts';
import type { Currency, Money } from '../money.ts';
import { extras, scopes } from '../surveys/scopes.ts';
import type { ExtraId, ScopeId } from '../surveys/scopes.ts';

/** Tubeplate's charge on the surveyor's fee, extras and travel, in hundredths of a per cent: 12 %. */
export const platformChargeBasisPoints = 1_200;

/** What a surveyor may ask, in pence: the platform's bands. */
export const feeBands: Record<ScopeId | ExtraId, { lowMinor: number; highMinor: number }> = {
  external: { lowMinor: 3_000, highMinor: 12_000 },
  hydraulic: { lowMinor: 5_000, highMinor: 20_000 },
  full: { lowMinor: 8_000, highMinor: 35_000 },
  thickness: { lowMinor: 1_000, highMinor: 8_000 },
  borescope: { lowMinor: 1_000, highMinor: 8_000 },
};

const feeOf = (id: ScopeId | ExtraId) =>
  z
    .int('Give a sum in pounds and pence')
    .min(feeBands[id].lowMinor, `At least £${(feeBands[id].lowMinor / 100).toFixed(2)}`)
    .max(feeBands[id].highMinor, `At most £${(feeBands[id].highMinor / 100).toFixed(2)}`);

/** A surveyor's own fees, within the bands. An extra at null is not offered. */
export const surveyorFees = z.strictObject({
  external: feeOf('external'),
  hydraulic: feeOf('hydraulic'),
  full: feeOf('full'),
  thickness: feeOf('thickness').nullable(),
  borescope: feeOf('borescope').nullable(),
  /** Travel for each kilometre, there and back counted, in pence. */
  perKmMinor: z
    .int('Give a sum in pounds and pence')
    .min(0, 'Not negative')
    .max(100, 'At most £1.00 a kilometre'),
});
export type SurveyorFees = z.infer<typeof surveyorFees>;

export const quotationLine = z.object({
  kind: z.enum(['scope', 'extra', 'travel', 'charge']),
  label: z.string(),
  amount: money,
});

/** What a survey costs the buyer, line by line; the lines add up to the total to the penny. */
export const quotation = z.object({
  lines: z.array(quotationLine),
  total: money,
  /** The part that goes to the surveyor. */
  surveyorPart: money,
  /** The part Tubeplate keeps. */
  platformPart: money,
  distanceKm: z.number(),
});
export type Quotation = z.infer<typeof quotation>;

interface QuoteInput {
  fees: SurveyorFees;
  scope: ScopeId;
  extras: readonly ExtraId[];
  /** One way, as the crow flies, from the surveyor's town to the boiler's. */
  distanceKm: number;
  currency: Currency;
}

/**
 * Works out a quotation; each line is rounded once, half up, and the total is the sum of the lines.
 * @throws RangeError if an extra is asked that the surveyor does not offer, or the distance is not a distance.
 */
export function quote({ fees, scope, extras: wanted, distanceKm, currency }: QuoteInput): Quotation {
  if (!(distanceKm >= 0 && distanceKm < 20_100)) throw new RangeError('Not a distance on this earth');
  const of = (minor: number): Money => ({ minor, currency });
  const chosen = [...new Set(wanted)].toSorted();
  const fee = { kind: 'scope' as const, label: scopes[scope].label, amount: of(fees[scope]) };
  const extraLines = chosen.map((id) => {
    const minor = fees[id];
    if (minor === null) throw new RangeError(`This surveyor does not offer ${id}`);
    return { kind: 'extra' as const, label: extras[id].label, amount: of(minor) };
  });
  const travel = {
    kind: 'travel' as const,
    label: `Travel, ${String(Math.round(distanceKm * 2))} km there and back`,
    amount: of(Math.round(distanceKm * 2 * fees.perKmMinor)),
  };
  const surveyorPart = [fee, ...extraLines, travel].reduce(
    (sum, line) => add(sum, line.amount),
    zero(currency),
  );
  const charge = {
    kind: 'charge' as const,
    label: `Tubeplate’s charge, ${String(platformChargeBasisPoints / 100)} %`,
    amount: shareOf(surveyorPart, platformChargeBasisPoints),
  };
  return {
    lines: [fee, ...extraLines, travel, charge],
    total: add(surveyorPart, charge.amount),
    surveyorPart,
    platformPart: charge.amount,
    distanceKm,
  };
}
