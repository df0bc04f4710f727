import { z } from 'zod';
import {
  boilerFacts,
  constructionId,
  firingId,
  fittingId,
  materialId,
  paperKindId,
  pressureEvidenceId,
  yearSurenessId,
} from '../boilers/boiler.ts';
import { boilerTypeId } from '../boilers/boiler-types.ts';
import { amount, currency } from '../money.ts';

const text = (most: number) => z.string().max(most, `Keep it under ${String(most)} characters`);
const loose = z.number().finite().nullable().default(null);

/** ISO 8601 at the precision known: a year, a month or a day. */
export const roughDate = z
  .string()
  .regex(
    /^\d{4}(-(0[1-9]|1[0-2])(-(0[1-9]|[12]\d|3[01]))?)?$/,
    'Give a year, a month or a day, such as 1998 or 1998-04',
  );

export const historyEntry = z.strictObject({
  id: z.uuid(),
  when: roughDate,
  text: z.string().trim().min(3, 'Say what happened').max(600, 'Keep it under 600 characters'),
  documentIds: z.array(z.uuid()).max(6, 'At most six documents to an entry').default([]),
});
export type HistoryEntry = z.infer<typeof historyEntry>;

export const laggingAnswers = {
  none: 'No lagging',
  'known-free': 'Lagged, and I know with what',
  'not-known': 'Lagged, and I do not know with what',
} as const;
const laggingAnswer = z.enum(
  Object.keys(laggingAnswers) as [keyof typeof laggingAnswers],
  'Say what the lagging is',
);

/** Private until an appointment is agreed, and never part of a listing. */
export const address = z.strictObject({
  line1: z.string().trim().min(3, 'Give the first line of the address').max(120),
  line2: z.string().trim().max(120).default(''),
  postcode: z.string().trim().min(3, 'Give the postcode').max(12, 'A postcode is at most 12 characters'),
  accessNotes: z.string().trim().max(500, 'Keep it under 500 characters').default(''),
});
export type Address = z.infer<typeof address>;

/** What a draft may hold while it is being written: anything in the right shape, however incomplete. */
export const listingDraft = z.strictObject({
  title: text(120).default(''),
  description: text(6_000).default(''),
  facts: z
    .strictObject({
      type: boilerTypeId.nullable().default(null),
      material: materialId.nullable().default(null),
      construction: constructionId.nullable().default(null),
      builder: text(120).nullable().default(null),
      builtYear: loose,
      builtYearSureness: yearSurenessId.default('guess'),
      dimensions: z
        .strictObject({
          barrelOutsideDiameterMm: loose,
          barrelLengthMm: loose,
          barrelThicknessMm: loose,
          endPlateThicknessMm: loose,
          flueDiameterMm: loose,
          flueThicknessMm: loose,
          tubeCount: loose,
          tubeDiameterMm: loose,
          tubeThicknessMm: loose,
          heatingSurfaceM2: loose,
          overallHeightMm: loose,
          weightKg: loose,
        })
        .prefault({}),
      workingPressurePa: loose,
      pressureEvidence: pressureEvidenceId.nullable().default(null),
      waterCapacityL: loose,
      fittings: z.array(fittingId).max(30).default([]),
      firing: firingId.nullable().default(null),
      papers: z
        .array(
          z.strictObject({
            kind: paperKindId,
            datedOn: text(10).nullable().default(null),
            by: text(120).default(''),
          }),
        )
        .max(20)
        .default([]),
    })
    .prefault({}),
  history: z
    .array(
      z.strictObject({
        id: z.uuid(),
        when: text(10).default(''),
        text: text(600).default(''),
        documentIds: z.array(z.uuid()).max(6).default([]),
      }),
    )
    .max(40, 'At most 40 entries')
    .default([]),
  declaration: z
    .strictObject({
      ownsIt: z.boolean().default(false),
      isTruthful: z.boolean().default(false),
      knownDefects: text(2_000).default(''),
      knownRepairs: text(2_000).default(''),
      lagging: laggingAnswer.nullable().default(null),
    })
    .prefault({}),
  townId: z.int().nullable().default(null),
  address: z
    .strictObject({
      line1: text(120).default(''),
      line2: text(120).default(''),
      postcode: text(12).default(''),
      accessNotes: text(500).default(''),
    })
    .prefault({}),
  askingMinor: z.int().nullable().default(null),
  currency: currency.default('GBP'),
  terms: z
    .strictObject({
      canCollect: z.boolean().default(true),
      canCarry: z.boolean().default(false),
      carriageNote: text(300).default(''),
      takesOffers: z.boolean().default(true),
    })
    .prefault({}),
});
export type ListingDraft = z.infer<typeof listingDraft>;

/** What a listing must be before it is published. */
export const completeListing = z.strictObject({
  title: z.string().trim().min(8, 'Give a title of at least 8 characters').max(120),
  description: z.string().trim().min(40, 'Describe it in at least 40 characters').max(6_000),
  facts: boilerFacts,
  history: z.array(historyEntry).max(40),
  declaration: z.strictObject({
    ownsIt: z.literal(true, 'Confirm that it is yours to sell'),
    isTruthful: z.literal(true, 'Confirm that this is true as far as you know'),
    knownDefects: z.string().trim().min(2, 'List what you know is wrong, or write “none known”').max(2_000),
    knownRepairs: z.string().trim().min(2, 'List the repairs you know of, or write “none known”').max(2_000),
    lagging: laggingAnswer,
  }),
  townId: z.int('Choose the nearest town'),
  address,
  askingMinor: amount.shape.minor.min(100, 'Ask at least 1.00'),
  currency,
  terms: z
    .strictObject({
      canCollect: z.boolean(),
      canCarry: z.boolean(),
      carriageNote: z.string().trim().max(300),
      takesOffers: z.boolean(),
    })
    .refine((terms) => terms.canCollect || terms.canCarry, {
      path: ['canCollect'],
      message: 'Choose collection, carriage or both',
    }),
});
export type CompleteListing = z.infer<typeof completeListing>;

export const emptyDraft = (): ListingDraft => listingDraft.parse({});
