import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { OfficeFrame } from '#web/features/office/office-frame.tsx';
import { officeQueries } from '#web/features/office/queries.ts';
import { requireOffice } from '#web/features/office/require-office.ts';
import { formatInstant } from '#web/lib/format.ts';
import { Button } from '#web/ui/button.tsx';
import { Empty } from '#web/ui/notes.tsx';
import { Table } from '#web/ui/table.tsx';

export function Component() {
  requireOffice(useSignedIn());
  const { data, hasNextPage, isFetchingNextPage, fetchNextPage } = useSuspenseInfiniteQuery(
    officeQueries.audit(),
  );
  const entries = data.pages.flatMap((page) => page.items);
  return (
    <OfficeFrame
      title="Record"
      sub="Everything that moved, by whom and why. Nothing in it can be changed or taken out."
    >
      {entries.length === 0 ? (
        <Empty title="Nothing has happened yet" />
      ) : (
        <Table
          caption="Newest first"
          isWide
          rows={entries}
          keyOf={({ id }) => id}
          columns={[
            {
              head: 'When',
              cell: ({ at }) => <span className="whitespace-nowrap">{formatInstant(at)}</span>,
            },
            { head: 'Who', cell: ({ who }) => who },
            { head: 'What', cell: ({ what }) => what },
            {
              head: 'To what',
              cell: ({ subject, subjectPath }) =>
                subjectPath === null ? (
                  subject
                ) : (
                  <Link className="link" to={subjectPath}>
                    {subject}
                  </Link>
                ),
            },
            { head: 'Why', cell: ({ reason }) => reason },
          ]}
        />
      )}
      {hasNextPage && (
        <p className="mt-4">
          <Button kind="quiet" isPending={isFetchingNextPage} onClick={() => void fetchNextPage()}>
            Show more
          </Button>
        </p>
      )}
    </OfficeFrame>
  );
}
