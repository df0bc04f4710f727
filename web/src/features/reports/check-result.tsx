import { useQuery } from '@tanstack/react-query';
import { oldAfterMonths } from '#shared/surveys/age.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { formatDay } from '#web/lib/format.ts';
import { ButtonLink } from '#web/ui/button.tsx';
import { Loading } from '#web/ui/mark.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { reportQueries } from './queries.ts';

/** How long ago, in words that make a reader think. */
function ageText(days: number): string {
  if (days < 1) return 'today';
  if (days < 60) return days === 1 ? 'yesterday' : `${String(days)} days ago`;
  const months = Math.round(days / 30.44);
  return months < 24 ? `${String(months)} months ago` : `${String(Math.floor(days / 365.25))} years ago`;
}

/** What stands behind a check code now. */
export function CheckResult({ code }: { code: string }) {
  const check = useQuery(reportQueries.check(code));
  if (check.isPending) return <Loading what="Working the report out again" />;
  if (check.isError) return <Notice kind="bad">{messageOf(check.error)}</Notice>;
  const { status, reportId, version, filedAt, examinedOn, ageDays, isOld, newer } = check.data;
  const which = version !== null && version > 1 ? `version ${String(version)} of a report` : 'a report';
  const age = filedAt === null ? which : `${which}, filed on ${formatDay(filedAt.slice(0, 10))}`;
  if (status === 'unknown')
    return (
      <Notice kind="bad">
        <p className="font-medium">No report has this code.</p>
        <p>
          Look again at the letters and digits: there is no I, L, O or U in a code. If it is typed as printed,
          the paper is not one of ours.
        </p>
      </Notice>
    );
  return (
    <Notice kind={status === 'genuine' ? 'good' : 'bad'}>
      {status === 'genuine' && (
        <>
          <p className="font-medium">Genuine: {age}.</p>
          <p>
            What is stored is what was signed, to the last figure. Compare it with the copy in your hand. It
            speaks of the day of examination only.
          </p>
        </>
      )}
      {status === 'superseded' && newer !== null && (
        <>
          <p className="font-medium">
            Superseded: {age}, was corrected on {formatDay(newer.filedAt.slice(0, 10))}.
          </p>
          <p>
            The copy in your hand is as it was signed, but the surveyor has signed version {newer.version}{' '}
            since. The reason: {newer.reason}
          </p>
          <div className="mt-3">
            <ButtonLink to={sitePaths.report(newer.reportId)}>Read version {newer.version}</ButtonLink>
          </div>
        </>
      )}
      {status === 'changed' && (
        <>
          <p className="font-medium">Changed: {age}, is no longer as it was signed.</p>
          <p>Do not rely on it. Write to the office and quote the code.</p>
        </>
      )}
      {examinedOn !== null && ageDays !== null && (
        <p className="mt-2">
          The boiler was examined on {formatDay(examinedOn)}, {ageText(ageDays)}.
          {isOld && (
            <span className="font-medium">
              {' '}
              That is more than {oldAfterMonths} months: the report is old.
            </span>
          )}
        </p>
      )}
      {reportId !== null && (
        <div className="mt-3">
          <ButtonLink kind="quiet" to={sitePaths.report(reportId)}>
            Read the report as stored
          </ButtonLink>
        </div>
      )}
    </Notice>
  );
}
