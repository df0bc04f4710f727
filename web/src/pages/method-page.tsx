import { useSuspenseQuery } from '@tanstack/react-query';
import { lazy, Suspense, useEffect } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import type { MethodData } from '#shared/surveys/method.ts';
import { Criteria, weightOf } from '#web/features/method/criteria.tsx';
import { GradesAndFigures } from '#web/features/method/grades-and-figures.tsx';
import { LimitsList } from '#web/features/method/limits-list.tsx';
import { methodQueries } from '#web/features/method/queries.ts';
import { TestProfiles } from '#web/features/method/test-profiles.tsx';
import { VerdictRules } from '#web/features/method/verdict-rules.tsx';
import { Versions } from '#web/features/method/versions.tsx';
import { ResultSummary } from '#web/features/reports/result-summary.tsx';
import { formatDay } from '#web/lib/format.ts';
import { Loading } from '#web/ui/mark.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';

// Scoring is fetched after the page is there to read.
const TryIt = lazy(async () => ({ default: (await import('#web/features/method/try-it.tsx')).TryIt }));

/** Goes to the part of the page that the address names, which was not there yet when the browser looked for it. */
function useArriveAtPart() {
  useEffect(() => {
    document.getElementById(window.location.hash.slice(1))?.scrollIntoView();
  }, []);
}

/** The published method, from the very data that reports are scored by. */
export function Component() {
  const [search] = useSearchParams();
  const { data: method } = useSuspenseQuery(methodQueries.version(search.get('version')));
  useArriveAtPart();
  const { rubric, current } = method;
  const criteria = rubric.sections.reduce((sum, { criteria: own }) => sum + own.length, 0);
  return (
    <Page
      title="How a boiler is surveyed and scored"
      sub={`Method ${rubric.version}, published ${formatDay(rubric.publishedOn)}: ${String(criteria)} items in ${String(rubric.sections.length)} sections`}
    >
      {rubric.version !== current && (
        <div className="mb-6">
          <Notice>
            You are reading version {rubric.version}. It is not the current one: a new survey is made by{' '}
            <Link className="link" to={sitePaths.method}>
              version {current}
            </Link>
            .
          </Notice>
        </div>
      )}
      <Introduction method={method} />
      <Section title="The verdict" id="verdict">
        <p className="mb-4 max-w-prose">
          The rules are tried from the top. The first verdict with a rule that fires is the one given, with
          every rule that fired and the figures it fired on.
        </p>
        <VerdictRules method={method} />
      </Section>
      <Section title="Condition and Evidence" id="figures">
        <GradesAndFigures method={method} />
      </Section>
      <Section title="Try it" id="try">
        <p className="mb-5 max-w-prose">
          An invented copper vertical, gas fired, with a full survey behind it. Grade the barrel Unfit, or
          leave out the hydraulic test, and see what no other merit makes up for. Grade the paint Unfit, and
          see what that does not do.
        </p>
        <Suspense
          fallback={
            <div className="min-h-[97rem] lg:min-h-[61rem]">
              <Loading what="Setting it out" />
            </div>
          }
        >
          <TryIt
            key={rubric.version}
            version={rubric.version}
            summaryOf={(result) => <ResultSummary result={result} />}
          />
        </Suspense>
      </Section>
      <Criteria rubric={rubric} />
      <Section title="Limits and sources" id="limits">
        <LimitsList limits={method.limits} />
      </Section>
      <Section title="Test profiles" id="profiles">
        <p className="mb-4 max-w-prose">
          The surveyor picks the profile that the local code asks for, and the report says which. The local
          code governs.
        </p>
        <TestProfiles profiles={method.testProfiles} />
      </Section>
      <Section title="Check our scoring" id="check-us">
        <div className="grid max-w-prose gap-3">
          <p>
            Anyone may send a boiler’s facts and a surveyor’s findings and have them scored by the code that
            scores reports. Every report shows what was recorded, so every result can be worked out again.
          </p>
          <pre className="border border-rule bg-sheet p-4 text-sm whitespace-pre-wrap">
            {'POST /api/method/score\n{ "facts": …, "scope": "full", "record": … }'}
          </pre>
          <p>
            The method itself is at{' '}
            <a className="link" href="/api/method">
              /api/method
            </a>
            ; what to send, field by field, is in the{' '}
            <a className="link" href="/api/openapi.json">
              description of the API
            </a>{' '}
            under <code>scoreBySurveyMethod</code>.
          </p>
        </div>
      </Section>
      <Section title="Versions" id="versions">
        <Versions method={method} />
      </Section>
    </Page>
  );
}

function Introduction({ method }: { method: MethodData }) {
  const places: readonly (readonly [id: string, title: string, weight?: number])[] = [
    ['verdict', 'The verdict'],
    ['figures', 'Condition and Evidence'],
    ['try', 'Try it'],
    ...method.rubric.sections.map(({ id, title, criteria }) => [id, title, weightOf(criteria)] as const),
    ['limits', 'Limits and sources'],
    ['profiles', 'Test profiles'],
    ['check-us', 'Check our scoring'],
    ['versions', 'Versions'],
  ];
  return (
    <div className="grid gap-8 lg:grid-cols-[minmax(0,7fr)_minmax(0,4fr)]">
      <div className="grid max-w-prose content-start gap-4 text-lg leading-8">
        <p>
          Every surveyor goes through the same items in the same order, grades what was found, says how it was
          examined, and tests what the scope allows. What comes of it is worked out by the rules below and by
          nothing else.
        </p>
        <p>
          A boiler gets a verdict first. It comes from rules, not from adding up: one crack is not made good
          by fine paint. Beside it stand two figures. Condition says how good what was examined is; Evidence
          says how much was examined, and how surely. Neither is given without the other.
        </p>
        <Caution title={method.cautions[0] ?? ''}>{method.cautions.slice(1).join(' ')}</Caution>
      </div>
      <nav aria-label="On this page" className="self-start border-t border-ink pt-2">
        <ul>
          {places.map(([id, title, weight]) => (
            <li key={id} className="border-b border-rule">
              <a className="flex min-h-10 items-center justify-between gap-4 hover:underline" href={`#${id}`}>
                {title}
                {weight !== undefined && <span className="text-sm text-pencil">weight {weight}</span>}
              </a>
            </li>
          ))}
        </ul>
      </nav>
    </div>
  );
}
