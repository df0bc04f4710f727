import type { ListingDraft } from '#shared/listings/draft.ts';
import type { FieldError } from '#shared/problem.ts';

/** What every step of the sell form is given. */
export interface StepProps {
  draft: ListingDraft;
  onChange: (draft: ListingDraft) => void;
  /** Mistakes to show beside their fields; empty until somebody asked for them. */
  errors: readonly FieldError[];
}

/** A copy of a draft with some of its facts changed. */
export const withFacts = (draft: ListingDraft, facts: Partial<ListingDraft['facts']>): ListingDraft => ({
  ...draft,
  facts: { ...draft.facts, ...facts },
});
