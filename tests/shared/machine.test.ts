import { describe, expect, test } from 'vitest';
import { listingEventLabels, listingMachine, listingStatusLabels } from '#shared/listings/machine.ts';
import { paymentMachine, paymentStatusLabels } from '#shared/payments/machine.ts';
import { Problem } from '#shared/problem.ts';
import { orderEventLabels, orderStatusLabels, surveyOrderMachine } from '#shared/survey-orders/machine.ts';

type Table = Readonly<Record<string, Readonly<Record<string, { to: string; by: readonly string[] }>>>>;

const machines = [
  {
    noun: 'listing',
    table: listingMachine.table as Table,
    start: ['draft'],
    statuses: listingStatusLabels,
    events: listingEventLabels,
    final: ['discarded'],
    // Until a sale ends it, what has been listed is listed, withdrawn or taken down.
    endless: ['published', 'taken-down', 'withdrawn'],
  },
  {
    noun: 'survey order',
    table: surveyOrderMachine.table as Table,
    start: ['awaiting-payment'],
    statuses: orderStatusLabels,
    events: orderEventLabels,
    final: ['settled', 'refunded', 'cancelled'],
    endless: [],
  },
  {
    noun: 'payment',
    table: paymentMachine.table as Table,
    start: ['awaiting-card'],
    statuses: paymentStatusLabels,
    events: undefined,
    final: ['released', 'refunded'],
    endless: [],
  },
];

const eventsIn = (table: Table) => Object.values(table).flatMap((steps) => Object.keys(steps));

describe.each(machines)('the $noun', ({ table, start, statuses, events, final, endless }) => {
  test('can come into every state it has', () => {
    const reached = new Set(start);
    for (const state of reached) for (const { to } of Object.values(table[state] ?? {})) reached.add(to);
    expect([...reached].toSorted()).toEqual(Object.keys(table).toSorted());
  });

  test('can come to an end from every state that is to have one, and stays there', () => {
    const ends = Object.keys(table).filter((state) => Object.keys(table[state]!).length === 0);
    expect(ends.toSorted()).toEqual(final.toSorted());
    const leadsToEnd = new Set(ends);
    for (let before = -1; before !== leadsToEnd.size;) {
      before = leadsToEnd.size;
      for (const [state, steps] of Object.entries(table))
        if (Object.values(steps).some(({ to }) => leadsToEnd.has(to))) leadsToEnd.add(state);
    }
    expect(
      Object.keys(table)
        .filter((state) => !leadsToEnd.has(state))
        .toSorted(),
    ).toEqual(endless);
  });

  test('has words for every state and every event', () => {
    expect(Object.keys(statuses).toSorted()).toEqual(Object.keys(table).toSorted());
    const words: Record<string, string> = events ?? {};
    const named = events ? [...new Set(eventsIn(table))] : [];
    expect(named.filter((event) => !words[event])).toEqual([]);
    for (const label of [...Object.values(statuses), ...Object.values(words)])
      expect(label).toMatch(/^[A-Z].*[^.!]$/);
  });

  test('lets somebody cause every event', () => {
    const steps = Object.values(table).flatMap((all) => Object.values(all));
    expect(steps.every(({ by }) => by.length > 0)).toBe(true);
  });
});

describe('asking a machine', () => {
  test('an event that the state does not know is the wrong state, the wrong part is not permitted', () => {
    const slugOf = (ask: () => unknown) => {
      try {
        ask();
      } catch (error) {
        return error instanceof Problem ? error.slug : String(error);
      }
      return undefined;
    };
    expect(slugOf(() => surveyOrderMachine.next('settled', 'cancel', 'buyer'))).toBe('wrong-state');
    expect(slugOf(() => surveyOrderMachine.next('awaiting-surveyor', 'accept', 'buyer'))).toBe(
      'not-permitted',
    );
    expect(surveyOrderMachine.next('awaiting-surveyor', 'accept', 'surveyor')).toBe('arranging');
  });

  test('money can leave an order in one way only: what is released is never refunded', () => {
    const from = (state: keyof typeof paymentMachine.table): Set<string> => {
      const reached = new Set<string>([state]);
      for (const one of reached)
        for (const { to } of Object.values((paymentMachine.table as Table)[one]!)) reached.add(to);
      return reached;
    };
    expect(from('releasing').has('refunded')).toBe(false);
    expect(from('refunding').has('released')).toBe(false);
  });

  test('no one but the surveyor files a report, and no one but the buyer or time ends the review', () => {
    const causes = Object.entries(surveyOrderMachine.table as Table).flatMap(([state, steps]) =>
      Object.entries(steps).map(([event, { by }]) => ({ state, event, by })),
    );
    expect(causes.filter(({ event }) => event === 'fileReport').flatMap(({ by }) => by)).toEqual([
      'surveyor',
    ]);
    expect(causes.filter(({ state }) => state === 'in-review').flatMap(({ by }) => by)).toEqual([
      'buyer',
      'system',
    ]);
  });
});
