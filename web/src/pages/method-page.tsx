import { useSuspenseQuery } from '@tanstack/react-query';
import { grade as gradeId } from '#shared/surveys/record.ts';
import { CriterionEntry } from '#web/features/method/criterion-entry.tsx';
import { methodQueries } from '#web/features/method/queries.ts';
import { VerdictRules } from '#web/features/method/verdict-rules.tsx';
import { formatDay, formatNumber } from '#web/lib/format.ts';
import { GradeMark } from '#web/ui/grade-mark.tsx';
import { Caution } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';
import { Table } from '#web/ui/table.tsx';

const weightOf = (own: readonly { weight: number }[]): number =>
  own.reduce((sum, { weight }) => sum + weight, 0);

const gradeCell = ({ id, label }: { id: string; label: string }) => {
  const known = gradeId.safeParse(id);
  return known.success ? <GradeMark grade={known.data} hasLabel /> : label;
};

/** The published method, from the very data that reports are scored by. */
export function Component() {
  const { data: method } = useSuspenseQuery(methodQueries.current());
  const { rubric } = method;
  const criteria = rubric.sections.reduce((sum, { criteria: own }) => sum + own.length, 0);
  return (
    <Page
      title="How a boiler is surveyed and scored"
      sub={`Method ${rubric.version}, published ${formatDay(rubric.publishedOn)}: ${String(criteria)} items in ${String(rubric.sections.length)} sections`}
    >
      <div className="grid gap-8 lg:grid-cols-[minmax(0,7fr)_minmax(0,4fr)]">
        <div className="grid max-w-prose content-start gap-4 text-lg leading-8">
          <p>
            Every surveyor goes through the same items in the same order, grades what was found, says how it
            was examined, and tests what the scope allows. What comes of it is worked out by the rules below
            and by nothing else.
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
            {[
              ['verdict', 'The verdict'],
              ['figures', 'Condition and Evidence'],
              ...rubric.sections.map(({ id, title }) => [id, title] as const),
              ['limits', 'Limits and sources'],
              ['check-us', 'Check our scoring'],
            ].map(([id, title]) => (
              <li key={id} className="border-b border-rule">
                <a className="flex min-h-10 items-center hover:underline" href={`#${id ?? ''}`}>
                  {title}
                </a>
              </li>
            ))}
          </ul>
        </nav>
      </div>
      <Section title="The verdict" id="verdict">
        <p className="mb-4 max-w-prose">
          The rules are tried from the top. The first verdict with a rule that fires is the one given, with
          every rule that fired and the figures it fired on.
        </p>
        <VerdictRules method={method} />
      </Section>
      <Section title="Condition and Evidence" id="figures">
        <div className="grid gap-8 lg:grid-cols-[minmax(0,4fr)_minmax(0,7fr)]">
          <Table
            caption="Grades"
            isCaptionHidden
            rows={method.grades}
            keyOf={({ id }) => id}
            columns={[
              {
                head: 'Grade',
                cell: gradeCell,
              },
              { head: 'Points', isNumber: true, cell: ({ points }) => points ?? '–' },
            ]}
          />
          <ul className="grid list-disc content-start gap-2 pl-5">
            {method.arithmetic.map((sentence) => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
        </div>
      </Section>
      {rubric.sections.map((section) => (
        <Section
          key={section.id}
          id={section.id}
          title={section.title}
          aside={<span className="text-pencil">{weightOf(section.criteria)} of 100</span>}
        >
          {section.criteria.map((criterion) => (
            <CriterionEntry key={criterion.id} criterion={criterion} />
          ))}
        </Section>
      ))}
      <Section title="Limits and sources" id="limits">
        <Table
          caption="Limits the method works by"
          isCaptionHidden
          rows={method.limits}
          keyOf={({ id }) => id}
          columns={[
            { head: 'Limit', cell: ({ label }) => label },
            { head: 'Value', isNumber: true, cell: ({ value }) => formatNumber(value, 2) },
            { head: 'Unit', cell: ({ unit }) => unit },
            { head: 'Source', cell: ({ source }) => source },
          ]}
        />
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
      <Section title="Versions">
        <ul className="grid gap-3">
          {method.versions.toReversed().map((version) => (
            <li key={version.version}>
              <p className="font-medium">
                {version.version}, {formatDay(version.publishedOn)}
              </p>
              <ul className="list-disc pl-5">
                {[...version.changes, ...version.differences.map(({ text }) => text)].map((text) => (
                  <li key={text}>{text}</li>
                ))}
              </ul>
            </li>
          ))}
        </ul>
        <p className="mt-3 max-w-prose text-pencil">
          A published version is never changed. A report keeps the version it was scored with.
        </p>
      </Section>
    </Page>
  );
}
