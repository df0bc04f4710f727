import fc from 'fast-check';
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { insertListing, moveListing } from '#api/features/listings/repo.ts';
import * as listings from '#api/features/listings/service.ts';
import type { ListingSummary } from '#shared/listings/contract.ts';
import { completeDraft, givenListing } from '#tests/support/factories.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

let site: Site;
let seller: Awaited<ReturnType<Site['givenPerson']>>;
beforeAll(async () => {
  site = await givenSite();
  seller = await site.givenPerson('Harriet Vane');
});
afterAll(() => site.close());

interface Page {
  items: ListingSummary[];
  nextCursor: string | null;
  total: number;
}
const search = async (query: string): Promise<Page> =>
  (await site.as().get(`/api/listings?${query}`).expect(200)).body as Page;

/** Listed boilers without pictures, put straight into the table: hundreds are wanted, many of them alike. */
async function givenRows(rows: { price: number; minute: number }[]): Promise<void> {
  const { db } = site.deps.database;
  await db.execute(sql`truncate listings cascade`);
  for (const { price, minute } of rows) {
    const at = new Date(Date.UTC(2026, 0, 1, 0, minute)).toISOString();
    const { address: _none, ...draft } = completeDraft({ askingMinor: price });
    const listing = await insertListing(db, { sellerId: seller.id, draft, at });
    await moveListing(db, listing, {
      event: 'publish',
      to: 'published',
      actorId: seller.id,
      reason: '',
      at,
      slug: listing.id,
    });
  }
}

const walk = async (sort: string, limit: number): Promise<ListingSummary[]> => {
  const seen: ListingSummary[] = [];
  for (let cursor: string | null = ''; cursor !== null;) {
    const page: Page = await search(
      `sort=${sort}&limit=${String(limit)}${cursor === '' ? '' : `&cursor=${cursor}`}`,
    );
    seen.push(...page.items);
    cursor = page.nextCursor;
  }
  return seen;
};

const few = fc.record({
  price: fc.constantFrom(10_000, 20_000, 30_000),
  minute: fc.integer({ min: 0, max: 3 }),
});
const valueOf = (item: ListingSummary, sort: string): number =>
  sort === 'newest'
    ? -Date.parse(item.publishedAt ?? '')
    : item.asking.minor * (sort === 'price-low' ? 1 : -1);

describe('paging', () => {
  test('however many are alike, walking the pages meets each once, in order', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(few, { minLength: 1, maxLength: 25 }),
        fc.integer({ min: 1, max: 7 }),
        fc.constantFrom('newest', 'price-low', 'price-high'),
        async (rows, limit, sort) => {
          await givenRows(rows);
          const seen = await walk(sort, limit);
          expect(new Set(seen.map(({ id }) => id)).size).toBe(rows.length);
          expect(seen.length).toBe(rows.length);
          const values = seen.map((item) => valueOf(item, sort));
          expect(values).toEqual(values.toSorted((a, b) => a - b));
        },
      ),
      { numRuns: 12 },
    );
  });

  test('a boiler listed while somebody reads does not show them one twice', async () => {
    await givenRows(Array.from({ length: 6 }, () => ({ price: 10_000, minute: 1 })));
    const first = await search('limit=3');
    await givenListing(site, seller);
    const second = await search(`limit=3&cursor=${first.nextCursor ?? ''}`);
    const ids = [...first.items, ...second.items].map(({ id }) => id);
    expect(new Set(ids).size).toBe(6);
    expect(second.total).toBe(7);
  });

  test.each([
    ['made up', 'cursor=abc'],
    ['of a list sorted otherwise', ''],
  ])('a cursor that is %s is refused', async (_name, given) => {
    await givenRows([
      { price: 1_000, minute: 1 },
      { price: 2_000, minute: 2 },
    ]);
    const { nextCursor } = await search('limit=1&sort=newest');
    const query = given === '' ? `sort=price-low&cursor=${nextCursor ?? ''}` : given;
    const refused = await site.as().get(`/api/listings?${query}`).expect(422);
    expect(refused.body).toMatchObject({ errors: [{ pointer: '#/cursor' }] });
  });
});

describe('filters', () => {
  test('by price, type and verdict, with the count of all that match', async () => {
    await site.deps.database.db.execute(sql`truncate listings cascade`);
    const cheap = await givenListing(site, seller, { askingMinor: 10_000 });
    const dear = await givenListing(site, seller, { askingMinor: 90_000 });
    await listings.attachVerdict(site.ctxAs(), dear.id, {
      verdict: 'do-not-steam',
      condition: null,
      evidence: 74,
    });
    const ids = async (query: string) => {
      const { items, total } = await search(query);
      expect(total).toBe(items.length);
      return items.map(({ id }) => id);
    };
    expect(await ids('priceMaxMinor=10000')).toEqual([cheap.id]);
    expect(await ids('priceMinMinor=10001')).toEqual([dear.id]);
    expect(await ids('verdict=not-surveyed')).toEqual([cheap.id]);
    expect(await ids('verdict=do-not-steam')).toEqual([dear.id]);
    expect(await ids('type=locomotive')).toEqual([]);
    expect(await ids('sort=price-low')).toEqual([cheap.id, dear.id]);
    const { items } = await search('verdict=do-not-steam');
    expect(items[0]).toMatchObject({ verdict: 'do-not-steam', condition: null, evidence: 74 });
  });

  test('a filter that is not one is refused beside its name', async () => {
    const refused = await site.as().get('/api/listings?priceMinMinor=-1').expect(422);
    expect(refused.body).toMatchObject({
      errors: [{ pointer: '#/priceMinMinor', detail: 'A price cannot be negative' }],
    });
  });
});
