import { useState } from 'react';
import { Link } from 'react-router-dom';
import { isOldReport, oldAfterMonths } from '#shared/surveys/age.ts';
import type { ReportVersions } from '#shared/surveys/corrections-contract.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { formatDay } from '#web/lib/format.ts';
import { Notice } from '#web/ui/notes.tsx';

interface Props {
  reportId: string;
  versions: ReportVersions['items'];
  examinedOn: string;
}

const todayUtc = (): string => new Date().toISOString().slice(0, 10);

/** Above a report: whether it was superseded, what it corrects, and whether it is old. Nothing where none applies. */
export function ReportStanding({ reportId, versions, examinedOn }: Props) {
  const [today] = useState(todayUtc);
  const own = versions.find((each) => each.reportId === reportId);
  const newest = versions.at(-1);
  const earlier = versions.filter((each) => own !== undefined && each.version < own.version);
  const isSuperseded = own !== undefined && newest !== undefined && newest.version > own.version;
  const isOld = isOldReport(examinedOn, today);
  if (!isSuperseded && earlier.length === 0 && !isOld) return null;
  return (
    <div className="mb-6 grid gap-3">
      {isSuperseded && (
        <Notice kind="bad">
          <p className="font-medium">
            Superseded by{' '}
            <Link className="link" to={sitePaths.report(newest.reportId)}>
              version {newest.version} of {formatDay(newest.filedAt.slice(0, 10))}
            </Link>
            : {newest.reason}
          </p>
          <p>This is version {own.version}, as it was signed. Read the newer one.</p>
        </Notice>
      )}
      {own !== undefined && earlier.length > 0 && (
        <Notice>
          <p>
            <span className="font-medium">
              Version {own.version}, corrected on {formatDay(own.filedAt.slice(0, 10))}:
            </span>{' '}
            {own.reason}
          </p>
          <p>
            Still to be read:{' '}
            {earlier.map((each, index) => (
              <span key={each.reportId}>
                {index > 0 && ', '}
                <Link className="link" to={sitePaths.report(each.reportId)}>
                  version {each.version} of {formatDay(each.filedAt.slice(0, 10))}
                </Link>
              </span>
            ))}
          </p>
        </Notice>
      )}
      {isOld && (
        <Notice>
          <p className="font-medium">This report is more than {oldAfterMonths} months old.</p>
          <p>
            The boiler was examined on {formatDay(examinedOn)}. Much can change in store and in steam since.
          </p>
        </Notice>
      )}
    </div>
  );
}
