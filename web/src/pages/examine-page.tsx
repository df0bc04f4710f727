import { useSuspenseQuery } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { Link, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import type { Survey } from '#shared/surveys/contract.ts';
import { surveyRecord } from '#shared/surveys/record.ts';
import { rubricOf } from '#shared/surveys/rubric/index.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { GeneralArrangement } from '#web/drawings/general-arrangement.tsx';
import { ResultSummary } from '#web/features/reports/result-summary.tsx';
import { CorrectionNote } from '#web/features/surveys/correction-note.tsx';
import { ExamineBar } from '#web/features/surveys/examine-bar.tsx';
import { FindingScreen } from '#web/features/surveys/finding-screen.tsx';
import { HydraulicScreen } from '#web/features/surveys/hydraulic-screen.tsx';
import { LeaveGuard } from '#web/features/surveys/leave-guard.tsx';
import { surveyQueries } from '#web/features/surveys/queries.ts';
import { findingOf, setGrade } from '#web/features/surveys/record-edits.ts';
import { ReviewScreen } from '#web/features/surveys/review-screen.tsx';
import { SaveState, SaveTrouble } from '#web/features/surveys/save-state.tsx';
import { SectionList } from '#web/features/surveys/section-list.tsx';
import { SignForm } from '#web/features/surveys/sign-form.tsx';
import { StartScreen } from '#web/features/surveys/start-screen.tsx';
import { SteamScreen } from '#web/features/surveys/steam-screen.tsx';
import { stepsOf } from '#web/features/surveys/steps.ts';
import type { Step } from '#web/features/surveys/steps.ts';
import { SummaryScreen } from '#web/features/surveys/summary-screen.tsx';
import { useDraft } from '#web/features/surveys/use-draft.ts';
import type { Draft } from '#web/features/surveys/use-draft.ts';
import { ButtonLink } from '#web/ui/button.tsx';
import { Page } from '#web/ui/page.tsx';

/** The surveyor's own page, for a phone in one hand. */
export function Component() {
  const { id = '' } = useParams();
  const { data: survey } = useSuspenseQuery(surveyQueries.detail(id));
  if (survey.isFiled)
    return (
      <Page title="The report is filed" sub={survey.listing.title} isNarrow>
        <p className="mb-4">It can be read by everyone, and is never changed.</p>
        {survey.reportId !== null && (
          <ButtonLink to={sitePaths.report(survey.reportId)}>Read the report</ButtonLink>
        )}
      </Page>
    );
  return <Examination key={survey.orderId} survey={survey} />;
}

const hrefOf = (stepId: string | null): string => (stepId === null ? '?' : `?at=${stepId}`);

function Examination({ survey }: { survey: Survey }) {
  const draft = useDraft(survey);
  const [search] = useSearchParams();
  const steps = stepsOf(survey);
  const place = steps.findIndex(({ id }) => id === search.get('at'));
  const step = steps[place];
  const next = step === undefined ? steps.find((each) => isToDo(each, draft)) : steps[place + 1];
  const title = step?.title ?? survey.listing.title;
  const heading = useHeading(title, step?.id);
  const count = steps.filter(({ kind }) => kind === 'criterion').length;
  return (
    <div className="mx-auto max-w-2xl px-4 pt-2 pb-28">
      <div className="mb-4 flex min-h-11 items-center justify-between gap-4 border-b border-rule">
        {step === undefined ? (
          <Link to={sitePaths.order(survey.orderId)} className="py-2 font-medium">
            <span aria-hidden="true">‹ </span>
            The order
          </Link>
        ) : (
          <Link to={hrefOf(null)} className="py-2 font-medium">
            <span aria-hidden="true">‹ </span>
            {sectionTitle(step, survey)}
          </Link>
        )}
        <SaveState draft={draft} />
      </div>
      {step?.kind === 'criterion' && (
        <p className="text-sm text-pencil">
          No. {step.criterion.number} ·{' '}
          {steps.slice(0, place + 1).filter(({ kind }) => kind === 'criterion').length} of {count}
          {step.criterion.safetyCritical && ' · bears on the verdict'}
        </p>
      )}
      <h1 ref={heading} tabIndex={-1} className="mb-3 text-2xl outline-hidden">
        {title}
      </h1>
      <div className="grid grid-cols-1 gap-5">
        <SaveTrouble draft={draft} orderId={survey.orderId} />
        {step === undefined ? (
          <>
            <p className="text-pencil">{scopes[survey.scope].label}</p>
            {survey.correction !== null && <Correcting survey={survey} draft={draft} />}
            <GeneralArrangement
              facts={survey.facts}
              rubricVersion={draft.record.rubricVersion}
              label="Drawing of this type of boiler; a balloon opens its item, and the list below has the same"
              gradeOf={(criterionId) => findingOf(draft.record, criterionId)?.grade}
              hrefOf={hrefOf}
            />
            <SectionList steps={steps} record={draft.record} hrefOf={hrefOf} />
          </>
        ) : (
          <Screen key={step.id} step={step} survey={survey} draft={draft} />
        )}
      </div>
      <ExamineBar
        listHref={step === undefined ? null : hrefOf(null)}
        nextHref={next === undefined ? null : hrefOf(next.id)}
        nextLabel={nextLabel(step, next)}
        {...(step?.kind === 'criterion'
          ? {
              notExamined: {
                isOn: findingOf(draft.record, step.id)?.grade === 'notExamined',
                onPress: () => {
                  draft.store.edit(setGrade(step.id, 'notExamined'));
                },
              },
            }
          : {})}
      />
      <LeaveGuard draft={draft} />
    </div>
  );
}

function Correcting({ survey, draft }: { survey: Survey; draft: Draft }) {
  const navigate = useNavigate();
  const { correction, orderId } = survey;
  return correction === null ? null : (
    <CorrectionNote
      orderId={orderId}
      correction={correction}
      draft={draft}
      onGivenUp={() => void navigate(sitePaths.report(correction.reportId), { replace: true })}
    />
  );
}

const isToDo = (step: Step, draft: Draft): boolean =>
  step.kind === 'start'
    ? draft.record.examinedOn === null
    : step.kind === 'review' || (step.kind === 'criterion' && findingOf(draft.record, step.id) === undefined);

function nextLabel(step: Step | undefined, next: Step | undefined): string {
  if (next?.kind === 'criterion')
    return `${step === undefined ? 'Go on' : 'Next'}: ${String(next.criterion.number)}`;
  return next === undefined ? '' : next.title;
}

const sectionTitle = (step: Step, { record }: Survey): string => {
  if (step.kind !== 'criterion') return 'Examination';
  const own = rubricOf(record.rubricVersion).sections.find(({ id }) => id === step.criterion.section);
  return own?.title ?? 'Examination';
};

/** Says the screen's name and moves there, as a new page would. */
function useHeading(title: string, stepId: string | undefined) {
  const heading = useRef<HTMLHeadingElement>(null);
  const seen = useRef(stepId);
  useEffect(() => {
    document.title = `${title} · Tubeplate`;
    if (seen.current === stepId) return;
    seen.current = stepId;
    heading.current?.focus();
    window.scrollTo({ top: 0 });
  }, [title, stepId]);
  return heading;
}

/** Today where the phone is. */
const today = (): string => new Intl.DateTimeFormat('en-CA').format(new Date());

function Screen({ step, survey, draft }: { step: Step; survey: Survey; draft: Draft }) {
  const { record, store, uploads, photoUploads } = draft;
  const { edit } = store;
  switch (step.kind) {
    case 'start':
      return <StartScreen record={record} today={today()} edit={edit} />;
    case 'criterion':
      return (
        <FindingScreen
          survey={survey}
          criterion={step.criterion}
          record={record}
          uploads={uploads}
          photoUploads={photoUploads}
          edit={edit}
        />
      );
    case 'hydraulic':
      return (
        <HydraulicScreen
          orderId={survey.orderId}
          facts={survey.facts}
          scope={survey.scope}
          record={record}
          edit={edit}
        />
      );
    case 'steam':
      return <SteamScreen orderId={survey.orderId} facts={survey.facts} record={record} edit={edit} />;
    case 'summary':
      return <SummaryScreen record={record} edit={edit} />;
    case 'review':
  }
  return <Review survey={survey} draft={draft} />;
}

function Review({ survey, draft }: { survey: Survey; draft: Draft }) {
  const navigate = useNavigate();
  // As the server will keep it: words trimmed, what is left out filled in.
  const parsed = surveyRecord.safeParse(draft.record);
  if (!parsed.success) return <p>Mend what could not be saved first; it is named above.</p>;
  const record = parsed.data;
  const result = scoreSurvey({ facts: survey.facts, scope: survey.scope, record });
  return (
    <ReviewScreen
      survey={survey}
      record={record}
      hrefOf={hrefOf}
      result={<ResultSummary result={result} hrefOf={hrefOf} />}
      sign={
        <SignForm
          orderId={survey.orderId}
          draft={draft}
          result={result}
          onFiled={(report) => void navigate(sitePaths.report(report.id), { replace: true })}
        />
      }
    />
  );
}
