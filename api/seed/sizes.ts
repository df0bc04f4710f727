import { emptyDraft } from '#shared/listings/draft.ts';
import type { ListingDraft } from '#shared/listings/draft.ts';
import type { SeedPicture } from './pictures.ts';
import type { PersonKey } from './people.ts';

/** Exact: one inch is 25.4 mm, one pound a square inch 6,894.757 Pa, one imperial pint 0.568261 L. */
export const inch = (inches: number): number => Math.round(inches * 25.4 * 100) / 100;
export const psi = (pounds: number): number => Math.round(pounds * 6_894.757);
export const pints = (count: number): number => Math.round(count * 0.568_261 * 1_000) / 1_000;

type Facts = ListingDraft['facts'];

export interface SeedBoiler {
  key: string;
  seller: PersonKey;
  town: string;
  /** Days before the seeding that it was listed; absent for a draft. */
  listedDaysAgo?: number;
  title: string;
  description: string;
  askingPounds: number;
  facts: Partial<Omit<Facts, 'dimensions'>> & { dimensions: Partial<Facts['dimensions']> };
  history: { when: string; text: string }[];
  knownDefects: string;
  knownRepairs: string;
  lagging: 'none' | 'known-free' | 'not-known';
  carriage?: string;
  address: { line1: string; postcode: string; accessNotes: string };
  pictures: SeedPicture[];
}

/** The whole draft of a seeded boiler, but for ids that only the seed can give. */
export function draftOf(boiler: SeedBoiler, townId: number, newId: () => string): ListingDraft {
  const empty = emptyDraft();
  return {
    ...empty,
    title: boiler.title,
    description: boiler.description,
    facts: {
      ...empty.facts,
      ...boiler.facts,
      dimensions: { ...empty.facts.dimensions, ...boiler.facts.dimensions },
    },
    history: boiler.history.map((entry) => ({ ...entry, id: newId(), documentIds: [] })),
    declaration: {
      ownsIt: true,
      isTruthful: true,
      knownDefects: boiler.knownDefects,
      knownRepairs: boiler.knownRepairs,
      lagging: boiler.lagging,
    },
    townId,
    address: { ...boiler.address, line2: '' },
    askingMinor: boiler.askingPounds * 100,
    terms: {
      canCollect: true,
      canCarry: boiler.carriage !== undefined,
      carriageNote: boiler.carriage ?? '',
      takesOffers: true,
    },
  };
}
