import { useState } from 'react';
import type { Report } from '#shared/surveys/contract.ts';
import { allowanceOf } from '#shared/surveys/allowance.ts';
import type { AllowanceGroup } from '#shared/surveys/result.ts';
import { formatBand, formatNumber, formatPence } from '#web/lib/format.ts';
import { Button } from '#web/ui/button.tsx';
import { MoneyInput } from '#web/ui/quantity-input.tsx';
import { Table } from '#web/ui/table.tsx';

const hours = ({ hoursLow, hoursHigh }: AllowanceGroup): string =>
  hoursLow === hoursHigh
    ? formatNumber(hoursLow, 2)
    : `${formatNumber(hoursLow, 2)}–${formatNumber(hoursHigh, 2)}`;

/** What it would cost to put right what was found, at the published labour rate or the reader's own. */
export function PutRight({ report }: { report: Pick<Report, 'facts' | 'record' | 'result'> }) {
  const { facts, record, result } = report;
  const published = result.allowance.labourMinorPerHour;
  const [rate, setRate] = useState<number | null>(published);
  const isOwn = rate !== null && rate !== published;
  const allowance = isOwn ? allowanceOf(facts, record, rate) : result.allowance;
  const rows = allowance.groups.filter(({ lines }) => lines.length > 0);
  if (rows.length === 0 && allowance.retestCosts.length === 0)
    return <p>Nothing found calls for work that costs money.</p>;
  return (
    <div className="grid gap-4">
      <Table
        caption="Put-right allowance"
        isCaptionHidden
        rows={rows}
        keyOf={({ id }) => id}
        columns={[
          { head: 'What it would take', cell: ({ label }) => label },
          { head: 'Hours', isNumber: true, cell: hours },
          {
            head: 'Parts',
            isNumber: true,
            cell: (group) => formatBand(group.partsLowMinor, group.partsHighMinor),
          },
          { head: 'In all', isNumber: true, cell: (group) => formatBand(group.lowMinor, group.highMinor) },
        ]}
      />
      <dl className="grid gap-1">
        {allowance.retestCosts.map(({ id, label, minor }) => (
          <div key={id} className="flex justify-between gap-4">
            <dt>{label}</dt>
            <dd>{formatPence(minor)}</dd>
          </div>
        ))}
        <div className="flex justify-between gap-4 border-t border-ink pt-2 font-medium">
          <dt>All together</dt>
          <dd>{formatBand(allowance.total.lowMinor, allowance.total.highMinor)}</dd>
        </div>
      </dl>
      <p className="text-sm leading-5 text-pencil">
        The low is the sum of the lows and the high the sum of the highs: nothing is taken off for jobs that
        share work.
      </p>
      <div className="flex flex-wrap items-end gap-3">
        <div className="w-48">
          <MoneyInput label="Labour, an hour" value={rate} onChange={setRate} />
        </div>
        {isOwn && (
          <Button
            kind="plain"
            onClick={() => {
              setRate(published);
            }}
          >
            Go back to the published {formatPence(published)}
          </Button>
        )}
      </div>
    </div>
  );
}
