import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { Survey } from '#shared/surveys/contract.ts';
import { missingForFiling } from '#shared/surveys/completeness.ts';
import type { Missing } from '#shared/surveys/completeness.ts';
import { contradictions } from '#shared/surveys/contradictions.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { Disclosure } from '#web/ui/disclosure.tsx';

interface Props {
  survey: Pick<Survey, 'facts' | 'scope' | 'photos'>;
  record: SurveyRecord;
  hrefOf: (stepId: string) => string;
  /** The result these findings come to. */
  result: ReactNode;
  /** Shown once nothing is missing. */
  sign: ReactNode;
}

/** The screen on which something missing is put right. */
function stepOf({ criterionId, pointer }: Missing): string {
  if (pointer.startsWith('#/hydraulic')) return 'hydraulic';
  if (pointer.startsWith('#/steam')) return 'steam';
  return criterionId ?? 'start';
}

/** Before signing: what is missing, what contradicts itself, and what it all comes to. */
export function ReviewScreen({ survey, record, hrefOf, result, sign }: Props) {
  const { facts, scope, photos } = survey;
  const missing = missingForFiling(facts, record, scope, { photoIds: photos.map(({ id }) => id) });
  const doubts = contradictions(facts, record);
  return (
    <div className="grid gap-8">
      {missing.length > 0 && (
        <Sentences title={`Still missing: ${String(missing.length)}`} items={missing} hrefOf={hrefOf} />
      )}
      {doubts.length > 0 && (
        <Sentences
          title="Does this agree?"
          about="You may file as it stands; a reader will ask the same."
          items={doubts}
          hrefOf={hrefOf}
        />
      )}
      <section aria-label="Result">
        <h2>What it comes to</h2>
        {missing.length > 0 && <p className="text-pencil">So far; it changes with what is still to come.</p>}
        <div className="mt-3">{result}</div>
      </section>
      {missing.length === 0 && sign}
    </div>
  );
}

interface SentencesProps {
  title: string;
  about?: string;
  items: readonly Missing[];
  hrefOf: (stepId: string) => string;
}

function Sentences({ title, about, items, hrefOf }: SentencesProps) {
  return (
    <section aria-label={title}>
      <h2>{title}</h2>
      {about !== undefined && <p className="text-pencil">{about}</p>}
      <Rows items={items.slice(0, inSight)} hrefOf={hrefOf} />
      {items.length > inSight && (
        <Disclosure summary={`And ${String(items.length - inSight)} more`}>
          <Rows items={items.slice(inSight)} hrefOf={hrefOf} />
        </Disclosure>
      )}
    </section>
  );
}

/** How many are shown before the rest must be asked for. */
const inSight = 6;

function Rows({ items, hrefOf }: Pick<SentencesProps, 'items' | 'hrefOf'>) {
  return (
    <ul className="mt-2 border-t border-rule">
      {items.map((item) => (
        <li key={item.pointer + item.sentence} className="border-b border-rule last:border-b-0">
          <Link to={hrefOf(stepOf(item))} className="flex min-h-11 items-center py-2 hover:bg-wash">
            <span>{item.sentence}</span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
