import { figureText } from '#shared/engineering/quantities.ts';
import { formatBand, formatPence } from '#shared/money-words.ts';
import { printTable } from '../../print/table.ts';
import type { PrintJob } from './job.ts';

const hours = (low: number, high: number): string =>
  low === high ? figureText(low) : `${figureText(low)}–${figureText(high)}`;

/** What it would take to put right. */
export function printAllowance({ sheets, report }: PrintJob): void {
  const { allowance } = report.result;
  sheets.heading(2, 'What it would take to put right');
  const groups = allowance.groups.filter(({ lines }) => lines.length > 0);
  if (groups.length === 0 && allowance.retestCosts.length === 0) {
    sheets.tag('P', () => {
      sheets.write('Nothing found calls for work that costs money.');
    });
    return;
  }
  printTable(
    sheets,
    [
      { head: 'What it would take', share: 5 },
      { head: 'Hours', share: 2, isNumber: true },
      { head: 'Parts', share: 2, isNumber: true },
      { head: 'In all', share: 2, isNumber: true },
    ],
    [
      ...groups.map((group) => [
        group.label,
        hours(group.hoursLow, group.hoursHigh),
        formatBand(group.partsLowMinor, group.partsHighMinor),
        formatBand(group.lowMinor, group.highMinor),
      ]),
      ...allowance.retestCosts.map(({ label, minor }) => [label, '', '', formatPence(minor)]),
      ['All together', '', '', formatBand(allowance.total.lowMinor, allowance.total.highMinor)],
    ],
  );
  sheets.tag('P', () => {
    sheets.write(
      `At ${formatPence(allowance.labourMinorPerHour)} an hour. The low is the sum of the lows and the high the sum of the highs.`,
      { size: 8, colour: 'pencil' },
    );
  });
}
