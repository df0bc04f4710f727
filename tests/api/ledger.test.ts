import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { databaseFault } from '#api/db/client.ts';
import * as ledger from '#api/features/ledger/service.ts';
import { gbp } from '#shared/money.ts';
import { postPaid, postRefunded } from '#shared/payments/ledger.ts';
import { givenPlacedOrder } from '#tests/support/orders.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

let site: Site;
let orderId: string;
beforeAll(async () => {
  site = await givenSite();
  ({ orderId } = await givenPlacedOrder(site, { hasPayouts: false }));
});
afterAll(() => site.close());

const raw = (text: string) => site.deps.database.raw.query(text);
/** Class 23 of the SQL standard, integrity constraint violation, as PostgreSQL's Appendix A lists it. */
const integrityFault = /^23/;
const faultOf = (text: string): Promise<string | undefined> =>
  raw(text).then(
    () => undefined,
    (error: unknown) => databaseFault(error)?.code,
  );
const posting = (key: string, lines: [string, number, string][]) => `begin;
  insert into ledger_postings (key, what, order_id, at) values ('${key}', 'By hand', '${orderId}', now());
  ${lines
    .map(
      ([account, minor, currency]) =>
        `insert into ledger_lines (posting_id, account, amount_minor, currency)
         select id, '${account}', ${String(minor)}, '${currency}' from ledger_postings where key = '${key}';`,
    )
    .join('\n')}
  commit;`;
const rollback = () => raw('rollback');

describe('the database itself', () => {
  test.each([
    [
      'does not add up',
      [
        ['processor', 100, 'GBP'],
        ['held:x', -99, 'GBP'],
      ],
    ],
    [
      'adds up only across two currencies',
      [
        ['processor', 100, 'GBP'],
        ['held:x', -100, 'EUR'],
      ],
    ],
    ['has one line', [['processor', 0, 'GBP']]],
    ['has none', []],
  ] as [string, [string, number, string][]][])('refuses a posting that %s', async (name, lines) => {
    expect(await faultOf(posting(`by-hand:${name}`, lines))).toMatch(integrityFault);
    await rollback();
    const { rows } = await raw(`select 1 from ledger_postings where key = 'by-hand:${name}'`);
    expect(rows).toEqual([]);
  });

  test('takes one that does', async () => {
    await raw(
      posting('by-hand:sound', [
        ['processor', 5, 'GBP'],
        ['platform-charge', -5, 'GBP'],
      ]),
    );
    const { rows } = await raw("select 1 from ledger_postings where key = 'by-hand:sound'");
    expect(rows).toHaveLength(1);
  });

  test('refuses to add a line to a posting that balances', async () => {
    await ledger.post(site.ctxAs(), postPaid(orderId, gbp(1_000)));
    const code = await faultOf(
      `insert into ledger_lines (posting_id, account, amount_minor, currency)
       select id, 'processor', 1, 'GBP' from ledger_postings where key = 'paid:${orderId}'`,
    );
    expect(code).toMatch(integrityFault);
  });

  test.each([
    ['change an amount', 'update ledger_lines set amount_minor = amount_minor + 1'],
    ['change what a posting was for', "update ledger_postings set what = 'Something else'"],
    ['delete lines', 'delete from ledger_lines'],
    ['delete postings', 'delete from ledger_postings'],
    ['delete the record of an order', 'delete from survey_order_events'],
    ['change the record of an order', "update survey_order_events set reason = 'Another'"],
  ])('refuses to %s', async (_name, text) => {
    await ledger.post(site.ctxAs(), postPaid(orderId, gbp(1_000)));
    expect(await faultOf(text)).toMatch(integrityFault);
  });
});

describe('postings', () => {
  test('are entered once, however often and however many at a time', async () => {
    const entry = postRefunded(orderId, gbp(1_000));
    await Promise.all(Array.from({ length: 20 }, () => ledger.post(site.ctxAs(), entry)));
    const found = (await ledger.getEntriesOfOrder(site.ctxAs(), orderId)).filter(
      ({ what }) => what === 'Returned to the buyer',
    );
    expect(found).toHaveLength(1);
  });

  test('that do not add up are a fault of ours, and are not entered', async () => {
    const entry = postPaid(orderId, gbp(700));
    const [first] = entry.lines;
    await expect(
      ledger.post(site.ctxAs(), { ...entry, key: 'short', lines: first ? [first] : [] }),
    ).rejects.toThrow(RangeError);
  });

  test('add up to nothing over all accounts', async () => {
    const balances = await ledger.getBalances(site.ctxAs());
    expect(balances.reduce((sum, { balance }) => sum + balance.minor, 0)).toBe(0);
  });
});
