import { sitePaths } from '#shared/site-paths.ts';
import { useUnits } from '#web/lib/units.tsx';

const look =
  'inline-flex min-h-11 items-center rounded border border-ink px-4 py-2 font-medium hover:bg-wash';

/** The report on paper, in the reader's units. */
export function PrintLinks({ reportId }: { reportId: string }) {
  const { units } = useUnits();
  return (
    <p className="no-print flex flex-wrap gap-3">
      <a className={look} href={sitePaths.printedReport(reportId, 'a4', units)}>
        PDF for A4 paper
      </a>
      <a className={look} href={sitePaths.printedReport(reportId, 'letter', units)}>
        PDF for Letter paper
      </a>
    </p>
  );
}
