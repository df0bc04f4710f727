import { Link } from 'react-router-dom';
import type { ReportSummary } from '#shared/listings/contract.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import type { ScopeId } from '#shared/surveys/scopes.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { formatDay } from '#web/lib/format.ts';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

/** The survey reports of a boiler, newest first: Condition never without Evidence. */
export function ReportsList({ reports }: { reports: readonly ReportSummary[] }) {
  if (reports.length === 0)
    return <p className="text-pencil">No survey yet. What is said here is the seller’s word.</p>;
  return (
    <>
      <ul className="divide-y divide-rule border-y border-rule">
        {reports.map(({ reportId, verdict, condition, evidence, examinedOn, scope, version }) => (
          <li
            key={reportId}
            className="relative flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 py-3"
          >
            <Link to={sitePaths.report(reportId)} className="after:absolute after:inset-0">
              <VerdictMark verdict={verdict} />
              <span className="sr-only">, read the report</span>
            </Link>
            <span>
              Condition <strong className="font-medium">{condition ?? '–'}</strong> / 100, evidence{' '}
              <strong className="font-medium">{evidence}</strong> %
            </span>
            <span className="w-full text-sm text-pencil">
              {scopes[scope as ScopeId].label}, examined {formatDay(examinedOn)}
              {version > 1 && `, corrected: version ${String(version)}`}
            </span>
          </li>
        ))}
      </ul>
      {reports.length > 1 && (
        <p className="mt-2 text-sm leading-5 text-pencil">
          Surveyed {reports.length === 2 ? 'twice' : `${String(reports.length)} times`}. Each report shows how
          far it agrees with the {reports.length === 2 ? 'other' : 'others'}, and on which items it does not.
        </p>
      )}
    </>
  );
}
