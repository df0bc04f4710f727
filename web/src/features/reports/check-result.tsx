import { useQuery } from '@tanstack/react-query';
import { daysBetween } from '#shared/time.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { formatDay } from '#web/lib/format.ts';
import { ButtonLink } from '#web/ui/button.tsx';
import { Loading } from '#web/ui/mark.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { reportQueries } from './queries.ts';

/** How old a report is, in words that make a reader think. */
function ageText(filedAt: string): string {
  const days = daysBetween(filedAt.slice(0, 10), new Date().toISOString().slice(0, 10));
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
  const { status, reportId, filedAt } = check.data;
  const age = filedAt === null ? '' : `filed on ${formatDay(filedAt.slice(0, 10))}, ${ageText(filedAt)}`;
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
      {status === 'genuine' ? (
        <>
          <p className="font-medium">Genuine: a report {age}.</p>
          <p>
            What is stored is what was signed, to the last figure. Compare it with the copy in your hand. It
            speaks of the day of examination only.
          </p>
        </>
      ) : (
        <>
          <p className="font-medium">Changed: a report {age}, is no longer as it was signed.</p>
          <p>Do not rely on it. Write to the office and quote the code.</p>
        </>
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
