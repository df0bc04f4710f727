import { completeListing } from '#shared/listings/draft.ts';
import type { ListingDraft } from '#shared/listings/draft.ts';
import { invalidInput } from '#shared/problem.ts';
import type { FieldError } from '#shared/problem.ts';

/** The steps of the sell form, and which parts of the draft each holds, by the beginning of their pointers. */
export const sellSteps = [
  {
    id: 'what',
    label: 'What it is',
    holds: [
      '#/title',
      '#/description',
      '#/facts/type',
      '#/facts/material',
      '#/facts/construction',
      '#/facts/built',
      '#/facts/builder',
    ],
  },
  {
    id: 'sizes',
    label: 'Sizes and pressure',
    holds: [
      '#/facts/dimensions',
      '#/facts/workingPressurePa',
      '#/facts/pressureEvidence',
      '#/facts/waterCapacityL',
    ],
  },
  { id: 'fittings', label: 'Fittings and firing', holds: ['#/facts/fittings', '#/facts/firing'] },
  { id: 'history', label: 'Papers and history', holds: ['#/facts/papers', '#/history'] },
  { id: 'photographs', label: 'Photographs', holds: ['#/photos'] },
  { id: 'declaration', label: 'Declaration', holds: ['#/declaration'] },
  {
    id: 'place',
    label: 'Place and price',
    holds: ['#/townId', '#/address', '#/askingMinor', '#/currency', '#/terms'],
  },
  { id: 'list', label: 'Look over and list', holds: [] },
] as const;
export type SellStepId = (typeof sellSteps)[number]['id'];

/** The step in which a mistake is put right; the last one if none holds it. */
export const stepOf = (pointer: string): SellStepId =>
  sellSteps.find(({ holds }) => holds.some((beginning) => pointer.startsWith(beginning)))?.id ?? 'list';

/** What still keeps a draft from being listed. Photographs are counted by the server. */
export function missingFrom(draft: ListingDraft): readonly FieldError[] {
  const parsed = completeListing.safeParse(draft);
  return parsed.success ? [] : invalidInput(parsed.error).errors;
}

/** The sentence beside a field, if its pointer is among the mistakes. */
export const errorAt = (errors: readonly FieldError[], pointer: string): string | undefined =>
  errors.find((error) => error.pointer === pointer)?.detail;
