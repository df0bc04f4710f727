import { isInDate } from '#shared/surveys/instruments.ts';
import { instrumentKinds } from '#shared/surveys/record.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { formatDay } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Table } from '#web/ui/table.tsx';

/** What was measured with, and whether it was in calibration on the day. */
export function InstrumentsTable({ record }: { record: SurveyRecord }) {
  const { show } = useUnits();
  if (record.instruments.length === 0) return <p>None recorded.</p>;
  return (
    <Table
      caption="Instruments and their calibration"
      isCaptionHidden
      rows={record.instruments}
      keyOf={(_instrument, index) => String(index)}
      columns={[
        { head: 'Instrument', cell: ({ kind }) => instrumentKinds[kind] },
        {
          head: 'Name and number',
          cell: ({ name, serial }) => [name, serial].filter(Boolean).join(', '),
        },
        { head: 'Full scale', isNumber: true, cell: ({ fullScalePa }) => show('pressure', fullScalePa) },
        {
          head: 'Calibrated on',
          cell: ({ calibratedOn }) => (calibratedOn === null ? 'Not known' : formatDay(calibratedOn)),
        },
        {
          head: 'On the day',
          cell: (instrument) => (isInDate(instrument, record.examinedOn) ? 'In date' : 'Out of date'),
        },
      ]}
    />
  );
}
