import { useSuspenseQueries } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { examinedOf } from '#shared/surveys/examined.ts';
import { extras, scopes } from '#shared/surveys/scopes.ts';
import type { KnownBoiler } from '#shared/workings/from-boiler.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { GeneralArrangement } from '#web/drawings/general-arrangement.tsx';
import { useMe } from '#web/features/accounts/use-me.ts';
import { FindingReply } from '#web/features/replies/finding-reply.tsx';
import { replyQueries } from '#web/features/replies/queries.ts';
import { RepairsSince } from '#web/features/replies/repairs-since.tsx';
import { AcceptReport } from '#web/features/reports/accept-report.tsx';
import { ChecksList } from '#web/features/reports/checks-list.tsx';
import { CorrectReport } from '#web/features/reports/correct-report.tsx';
import { foundId } from '#web/features/reports/found-item.tsx';
import { FoundList } from '#web/features/reports/found-list.tsx';
import { InstrumentsTable } from '#web/features/reports/instruments-table.tsx';
import { PrintLinks } from '#web/features/reports/print-links.tsx';
import { PutRight } from '#web/features/reports/put-right.tsx';
import { reportQueries } from '#web/features/reports/queries.ts';
import { ReportStanding } from '#web/features/reports/report-standing.tsx';
import { ResultSummary } from '#web/features/reports/result-summary.tsx';
import { SectionMeans } from '#web/features/reports/section-means.tsx';
import { SurveyedTwice } from '#web/features/reports/surveyed-twice.tsx';
import { HydraulicRecord, SteamRecord } from '#web/features/reports/test-records.tsx';
import { CheckWorking } from '#web/features/workings/check-working.tsx';
import { EngineMatches } from '#web/features/workings/engine-matches.tsx';
import { PartsTable } from '#web/features/workings/parts-table.tsx';
import { formatDay, formatInstant } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { TitleBlock } from '#web/ui/figures.tsx';
import { Caution } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';
import { PhotoViewer } from '#web/ui/photo-viewer.tsx';

/** A filed report, for anyone. */
export function Component() {
  const { id = '' } = useParams();
  const [{ data: report }, { data: agreements }, { data: versions }, { data: replies }] = useSuspenseQueries({
    queries: [
      reportQueries.detail(id),
      reportQueries.agreements(id),
      reportQueries.versions(id),
      replyQueries.ofReport(id),
    ],
  });
  const { show } = useUnits();
  const me = useMe();
  const { listing, surveyor, facts, scope, record, result, photos, sellerPhotos, viewer } = report;
  const boiler: KnownBoiler = { facts, items: examinedOf({ facts, record }), record };
  const gradesFound = new Map(boiler.items.map(({ criterion, finding }) => [criterion.id, finding.grade]));
  const examined = record.examinedOn === null ? formatInstant(report.filedAt) : formatDay(record.examinedOn);
  const version = versions.items.find(({ reportId }) => reportId === id)?.version ?? 1;
  const covered = [scopes[scope].label, ...report.extras.map((extra) => extras[extra].label)];
  return (
    <Page
      title={listing.title}
      crumbs={[
        { label: 'Boilers', to: sitePaths.boilers },
        { label: listing.title, to: sitePaths.listing(listing.slug) },
        { label: 'Survey report' },
      ]}
      sub={`Examined ${examined} · ${covered.join(', ').toLowerCase()} · claimed working pressure ${show('pressure', facts.workingPressurePa)}`}
    >
      <ReportStanding
        reportId={id}
        versions={versions.items}
        examinedOn={record.examinedOn ?? report.filedAt.slice(0, 10)}
      />
      <CorrectReport reportId={id} viewer={versions.viewer} />
      {viewer.canAccept && viewer.orderId !== null && (
        <div className="mb-6">
          <AcceptReport orderId={viewer.orderId} />
        </div>
      )}
      <div className="grid items-start gap-6 lg:grid-cols-[minmax(0,5fr)_minmax(0,7fr)]">
        <div className="grid gap-6">
          <ResultSummary result={result} hrefOf={(criterionId) => `#${foundId(criterionId)}`} />
          <Caution title="This is not a certificate.">
            It says what was found on one day. Before the boiler is steamed again, your club’s or insurer’s
            boiler inspector must test it under your local code.
          </Caution>
        </div>
        {photos.length > 0 && (
          <PhotoViewer photos={photos} title="The surveyor’s photographs" layout="lead" />
        )}
      </div>
      <Section title="Drawing">
        <GeneralArrangement
          facts={facts}
          rubricVersion={record.rubricVersion}
          label="General arrangement with the grade of each item; what each balloon says is listed under What was found"
          gradeOf={(criterionId) => gradesFound.get(criterionId)}
          hrefOf={(criterionId) => `#${foundId(criterionId)}`}
        />
        <p className="mt-2 text-sm text-pencil">
          Of the type, in proportion to the sizes given; not a drawing of this very boiler. A balloon leads to
          what was found.
        </p>
      </Section>
      {record.summary !== '' && (
        <Section title="From the surveyor">
          <p className="max-w-prose whitespace-pre-line">{record.summary}</p>
        </Section>
      )}
      <div className="mt-10 grid gap-x-10 lg:grid-cols-2">
        <Section title="What it would take to put right">
          <PutRight report={report} />
        </Section>
        <div className="mt-10 lg:mt-0">
          <Section title="Section by section">
            <SectionMeans sections={result.sections} />
          </Section>
        </div>
      </div>
      <Section title="What was found">
        <FoundList
          report={report}
          under={({ criterion }) => (
            <FindingReply reportId={id} version={version} criterion={criterion} replies={replies} />
          )}
        />
      </Section>
      {(replies.repairs.length > 0 || replies.viewer.canReply) && (
        <Section title="Repairs since, by the seller">
          <RepairsSince reportId={id} replies={replies} />
        </Section>
      )}
      {agreements.items.length > 0 && (
        <Section title={agreements.items.length === 1 ? 'Surveyed twice' : 'Surveyed more than once'}>
          <SurveyedTwice others={agreements.items} />
        </Section>
      )}
      <div className="mt-10 grid gap-x-10 lg:grid-cols-2">
        <Section title="Hydraulic test">
          <HydraulicRecord report={report} />
        </Section>
        <div className="mt-10 lg:mt-0">
          <Section title="Steam test">
            <SteamRecord report={report} />
          </Section>
        </div>
      </div>
      <Section title="Pressure by parts">
        <PartsTable boiler={boiler} />
      </Section>
      <Section title="Engineering checks">
        <ChecksList
          checks={result.checks}
          aside={(check) => <CheckWorking boiler={boiler} check={check} />}
        />
      </Section>
      <Section title="Will it drive my engine">
        <EngineMatches boiler={boiler} isMember={me !== null} />
      </Section>
      <Section title="Instruments">
        <InstrumentsTable record={record} />
      </Section>
      {sellerPhotos.length > 0 && (
        <Section title="The seller’s photographs">
          <PhotoViewer photos={sellerPhotos} title="The seller’s photographs" layout="row" />
        </Section>
      )}
      <Section title="Limits of this report">
        <ul className="max-w-prose list-disc pl-5">
          <li>It covers what the scope covers and no more: {scopes[scope].covers}</li>
          <li>
            It speaks of the day of examination only. A boiler can change in store, in carriage and in steam.
          </li>
          <li>What is marked Not examined was not examined, and nothing is implied about it.</li>
          <li>
            It was scored by the{' '}
            <Link className="link" to={sitePaths.methodVersion(record.rubricVersion)}>
              published method
            </Link>
            , version {record.rubricVersion}; anyone can work it out again from what is recorded here.
          </li>
          <li>
            It is no certificate and no permission to steam. Follow your local code and your boiler inspector.
          </li>
        </ul>
      </Section>
      <div className="mt-8">
        <PrintLinks reportId={id} />
      </div>
      <TitleBlock
        items={[
          { label: 'Boiler', value: listing.title },
          {
            label: 'Surveyor',
            value: surveyor.number === '' ? surveyor.name : `${surveyor.name}, no. ${surveyor.number}`,
          },
          {
            label: 'Signed and filed',
            value: `${report.signOff.name}, ${formatDay(report.filedAt.slice(0, 10))}`,
          },
          { label: 'Method', value: record.rubricVersion },
          ...(version > 1 ? [{ label: 'Version', value: `${String(version)}, corrected` }] : []),
          {
            label: 'Check code',
            value: (
              <Link className="link" to={sitePaths.checkCode(report.checkCode)}>
                {report.checkCode}
              </Link>
            ),
          },
        ]}
      />
    </Page>
  );
}
