import type { SectionScore } from '#shared/surveys/result.ts';
import { Table } from '#web/ui/table.tsx';

const orDash = (value: number | null, unit = ''): string =>
  value === null ? '–' : `${String(value)}${unit}`;

/** Condition and Evidence of each section, side by side. */
export function SectionMeans({ sections }: { sections: readonly SectionScore[] }) {
  return (
    <Table
      caption="Condition and Evidence of each section"
      isCaptionHidden
      rows={sections}
      keyOf={({ id }) => id}
      columns={[
        { head: 'Section', cell: ({ title }) => title },
        { head: 'Condition', isNumber: true, cell: ({ mean }) => orDash(mean) },
        { head: 'Evidence', isNumber: true, cell: ({ evidence }) => orDash(evidence, ' %') },
      ]}
    />
  );
}
