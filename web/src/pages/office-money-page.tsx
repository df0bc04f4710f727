import { useSuspenseInfiniteQuery, useSuspenseQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { accountWords } from '#web/features/office/account-words.ts';
import { OfficeFrame } from '#web/features/office/office-frame.tsx';
import { officeQueries } from '#web/features/office/queries.ts';
import { requireOffice } from '#web/features/office/require-office.ts';
import { formatInstant, formatSum } from '#web/lib/format.ts';
import { Button } from '#web/ui/button.tsx';
import { KeyFigures } from '#web/ui/figures.tsx';
import { Empty, Notice } from '#web/ui/notes.tsx';
import { Section } from '#web/ui/page.tsx';
import { Table } from '#web/ui/table.tsx';

function Agreement({ agrees }: { agrees: boolean | null }) {
  if (agrees === null)
    return (
      <Notice kind="bad">
        The payment service did not answer, so the two could not be compared. Reload to try again.
      </Notice>
    );
  return agrees ? (
    <Notice kind="good">Ledger and payment service agree to the penny.</Notice>
  ) : (
    <Notice kind="bad">
      Ledger and payment service differ. A notice may be on its way; if it still differs in ten minutes, look
      at the last entries.
    </Notice>
  );
}

function Ledger({ labels }: { labels: ReadonlyMap<string, string> }) {
  const { data, hasNextPage, isFetchingNextPage, fetchNextPage } = useSuspenseInfiniteQuery(
    officeQueries.ledger(),
  );
  const lines = data.pages.flatMap((page) =>
    page.items.flatMap((entry) =>
      entry.lines.map((line, index) => ({ ...line, entry, isFirst: index === 0 })),
    ),
  );
  if (lines.length === 0) return <Empty title="No entries yet" />;
  return (
    <>
      <Table
        caption="Ledger entries, newest first; a debit is positive, a credit negative"
        isWide
        rows={lines}
        keyOf={({ entry, account }) => `${String(entry.id)}${account}`}
        columns={[
          {
            head: 'When',
            cell: ({ entry, isFirst }) =>
              isFirst ? <span className="whitespace-nowrap">{formatInstant(entry.at)}</span> : '',
          },
          {
            head: 'What',
            cell: ({ entry, isFirst }) =>
              isFirst ? (
                <Link className="link" to={sitePaths.order(entry.orderId)}>
                  {entry.what}
                </Link>
              ) : (
                ''
              ),
          },
          { head: 'Account', cell: ({ account }) => labels.get(account) ?? accountWords(account) },
          { head: 'Amount', isNumber: true, cell: ({ amount }) => formatSum(amount) },
        ]}
      />
      {hasNextPage && (
        <p className="mt-4">
          <Button kind="quiet" isPending={isFetchingNextPage} onClick={() => void fetchNextPage()}>
            Show more
          </Button>
        </p>
      )}
    </>
  );
}

export function Component() {
  requireOffice(useSignedIn());
  const { data } = useSuspenseQuery(officeQueries.money());
  return (
    <OfficeFrame title="Money" sub="What is held, for whom, and whether the payment service says the same.">
      <div className="grid gap-6">
        <Agreement agrees={data.agrees} />
        <KeyFigures
          columns={3}
          items={[
            { label: 'Held on orders', value: formatSum(data.held) },
            { label: 'With the payment service, by our ledger', value: formatSum(data.processorByLedger) },
            {
              label: 'With the payment service, by itself',
              value: data.processorByItself ? formatSum(data.processorByItself) : '–',
            },
          ]}
        />
      </div>
      <Section title="Accounts">
        <Table
          caption="Balances; what we owe is negative"
          rows={data.balances}
          keyOf={({ account, balance }) => account + balance.currency}
          columns={[
            { head: 'Account', cell: ({ label }) => label },
            { head: 'Balance', isNumber: true, cell: ({ balance }) => formatSum(balance) },
          ]}
        />
      </Section>
      <Section title="Ledger">
        <Ledger labels={new Map(data.balances.map(({ account, label }) => [account, label]))} />
      </Section>
    </OfficeFrame>
  );
}
