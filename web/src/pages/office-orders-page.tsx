import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { orderStatusLabels, surveyOrderMachine } from '#shared/survey-orders/machine.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { OfficeFrame } from '#web/features/office/office-frame.tsx';
import { officeQueries } from '#web/features/office/queries.ts';
import { requireOffice } from '#web/features/office/require-office.ts';
import { formatFromNow, formatSum } from '#web/lib/format.ts';
import { Empty } from '#web/ui/notes.tsx';
import { Table } from '#web/ui/table.tsx';

export function Component() {
  requireOffice(useSignedIn());
  const [search, setSearch] = useSearchParams();
  const status = surveyOrderMachine.states.find((each) => each === search.get('status'));
  const { data } = useSuspenseQuery(officeQueries.orders(status));
  return (
    <OfficeFrame title="Orders" sub="Those that have not moved for longest first.">
      <label className="mb-4 grid max-w-sm gap-1">
        <span className="font-medium">Stage</span>
        <select
          className="control"
          value={status ?? ''}
          onChange={(event) => {
            setSearch(event.target.value === '' ? {} : { status: event.target.value }, { replace: true });
          }}
        >
          <option value="">Any</option>
          {surveyOrderMachine.states.map((each) => (
            <option key={each} value={each}>
              {orderStatusLabels[each]}
            </option>
          ))}
        </select>
      </label>
      {data.items.length === 0 ? (
        <Empty title="No orders at that stage" />
      ) : (
        <Table
          caption="Survey orders"
          isCaptionHidden
          isWide
          rows={data.items}
          keyOf={({ id }) => id}
          columns={[
            {
              head: 'Boiler',
              cell: ({ id, listingTitle }) => (
                <Link className="link" to={sitePaths.order(id)}>
                  {listingTitle}
                </Link>
              ),
            },
            { head: 'Stage', cell: ({ status: at }) => orderStatusLabels[at] },
            { head: 'Buyer', cell: ({ buyer }) => buyer },
            { head: 'Seller', cell: ({ seller }) => seller },
            { head: 'Surveyor', cell: ({ surveyor }) => surveyor },
            {
              head: 'Moved',
              cell: ({ movedAt }) => <span className="whitespace-nowrap">{formatFromNow(movedAt)}</span>,
            },
            { head: 'Total', isNumber: true, cell: ({ total }) => formatSum(total) },
            { head: 'Held', isNumber: true, cell: ({ held }) => formatSum(held) },
          ]}
        />
      )}
    </OfficeFrame>
  );
}
