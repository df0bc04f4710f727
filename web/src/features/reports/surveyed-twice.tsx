import { Link } from 'react-router-dom';
import type { ReportAgreement } from '#shared/surveys/contract.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { formatDay } from '#web/lib/format.ts';
import { Figure } from '#web/ui/figures.tsx';
import { GradeMark } from '#web/ui/grade-mark.tsx';
import { Table } from '#web/ui/table.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { alikeText, kappaText, meaningOf } from './agreement-words.ts';
import { foundId } from './found-item.tsx';

/** This report set against every other on the same boiler. */
export function SurveyedTwice({ others }: { others: readonly ReportAgreement[] }) {
  return (
    <div className="grid gap-10">
      {others.map((other) => (
        <AgreementWith key={other.id} other={other} />
      ))}
    </div>
  );
}

function AgreementWith({ other }: { other: ReportAgreement }) {
  const { agreement } = other;
  const kappa = kappaText(agreement.kappa);
  const filed = formatDay(other.filedAt.slice(0, 10));
  return (
    <article className="grid gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,5fr)_minmax(0,7fr)]">
      <div className="grid content-start gap-3">
        <h3>
          <Link className="link" to={sitePaths.report(other.id)}>
            {other.surveyor.name}’s report of {filed}
          </Link>
        </h3>
        <p>
          <VerdictMark verdict={other.verdict} />
        </p>
        {agreement.common > 1 && <p>{alikeText(agreement)}</p>}
        {kappa !== null && <Figure label="Agreement, weighted kappa" value={kappa} of="of 1" />}
        <p>{meaningOf(agreement)}</p>
        {kappa !== null && (
          <p className="text-sm leading-5 text-pencil">
            1 is full agreement, 0 what chance alone would give. Two grades apart counts four times as much as
            one.
          </p>
        )}
      </div>
      {agreement.differences.length > 0 && (
        <Table
          caption="Where the two differ, widest apart first"
          rows={agreement.differences}
          keyOf={({ criterionId }) => criterionId}
          columns={[
            {
              head: 'Item',
              cell: ({ criterionId, title }) => (
                <a className="underline decoration-rule underline-offset-4" href={`#${foundId(criterionId)}`}>
                  {title}
                </a>
              ),
            },
            { head: 'This report', cell: ({ first }) => <GradeMark grade={first} hasLabel /> },
            { head: other.surveyor.name, cell: ({ second }) => <GradeMark grade={second} hasLabel /> },
          ]}
        />
      )}
    </article>
  );
}
