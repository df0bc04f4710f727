import { machine } from '../machine.ts';

export type ListingPart = 'seller' | 'office' | 'system';

export const listingMachine = machine<ListingPart>()({
  draft: {
    publish: { to: 'published', by: ['seller'] },
    discard: { to: 'discarded', by: ['seller'] },
  },
  published: {
    withdraw: { to: 'withdrawn', by: ['seller'] },
    takeDown: { to: 'taken-down', by: ['office'] },
  },
  withdrawn: {
    relist: { to: 'published', by: ['seller'] },
    takeDown: { to: 'taken-down', by: ['office'] },
  },
  'taken-down': {
    restore: { to: 'published', by: ['office'] },
  },
  discarded: {},
});

export type ListingStatus = (typeof listingMachine.states)[number];
export type ListingEvent = Parameters<typeof listingMachine.next>[1];

export const listingStatusLabels: Record<ListingStatus, string> = {
  draft: 'Draft',
  published: 'Listed',
  withdrawn: 'Withdrawn',
  'taken-down': 'Taken down by the office',
  discarded: 'Thrown away',
};

/** What the record says of an event, in the past tense. */
export const listingEventLabels: Record<ListingEvent, string> = {
  publish: 'Listed',
  discard: 'Draft thrown away',
  withdraw: 'Withdrawn by the seller',
  takeDown: 'Taken down by the office',
  relist: 'Listed again',
  restore: 'Put back by the office',
};
