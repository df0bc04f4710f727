import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import type { Calculator } from '#shared/workings/calculator.ts';
import { calculatorOf } from '#shared/workings/index.ts';
import { quantityText } from '#shared/engineering/quantities.ts';
import { useMe } from '#web/features/accounts/use-me.ts';
import { EnginePicker } from '#web/features/engines/engine-picker.tsx';
import { CalculatorForm } from '#web/features/workings/calculator-form.tsx';
import { Answers, OutcomePlot } from '#web/features/workings/outcome-view.tsx';
import { UnitsSwitch } from '#web/features/workings/units-switch.tsx';
import { useWorking } from '#web/features/workings/use-working.ts';
import { WorkingLines } from '#web/features/workings/working-lines.tsx';
import { formatDay } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Button } from '#web/ui/button.tsx';
import { TitleBlock } from '#web/ui/figures.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';
import { Component as NotFound } from './not-found-page.tsx';

function CopyAddress() {
  const [said, setSaid] = useState('');
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(globalThis.location.href);
      setSaid('Copied');
    } catch {
      setSaid('Copy it from the address bar');
    }
  };
  return (
    <span className="inline-flex items-center gap-3">
      <Button kind="quiet" onClick={() => void copy()}>
        Copy a link to these figures
      </Button>
      <output className="text-sm text-pencil">{said}</output>
    </span>
  );
}

/** The answer kept in sight on a phone while figures are changed. What it says is said aloud where the answer stands. */
function AnswerBar({ label, text }: { label: string; text: string }) {
  return (
    <div
      aria-hidden="true"
      className="no-print pointer-events-none sticky bottom-0 z-10 -mx-4 flex items-baseline justify-between gap-4 border-t border-ink bg-sheet px-4 py-3 sm:-mx-6 sm:px-6 lg:hidden"
    >
      <span className="text-pencil">{label}</span>
      <span className="text-lg font-medium">{text}</span>
    </div>
  );
}

function WorkingPage({ calculator }: { calculator: Calculator }) {
  const { inputs, errors, outcome, plot, change, reset } = useWorking(calculator);
  const { units } = useUnits();
  const me = useMe();
  const [workedOn] = useState(() => formatDay(new Date().toISOString().slice(0, 10)));
  const first = outcome?.answers[0];
  return (
    <Page
      title={calculator.title}
      sub={calculator.about}
      crumbs={[{ label: 'Workings', to: sitePaths.workings }, { label: calculator.title }]}
    >
      <div className="grid gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,5fr)_minmax(0,7fr)]">
        <div>
          <div className="mb-4 flex flex-wrap items-center justify-between gap-x-6 border-b border-ink pb-1">
            <h2>Figures</h2>
            <UnitsSwitch />
          </div>
          {calculator.id === 'engine' && me !== null && (
            <div className="no-print mb-4">
              <EnginePicker
                onPick={(engine) => {
                  change({ ...engine });
                }}
              />
            </div>
          )}
          <CalculatorForm calculator={calculator} inputs={inputs} errors={errors} onChange={change} />
          <div className="no-print mt-4">
            <Button kind="plain" onClick={reset}>
              Back to the example
            </Button>
          </div>
        </div>
        <div id="answer" className="grid content-start gap-6 lg:sticky lg:top-4 lg:self-start">
          {outcome === null ? (
            <Notice kind="bad">
              Something given cannot be. Put right what is marked, and the answer comes back.
            </Notice>
          ) : (
            <Answers outcome={outcome} />
          )}
          {calculator.caution !== null && (
            <Caution title="Before you act on it.">{calculator.caution}</Caution>
          )}
          {plot !== null && <OutcomePlot plot={plot} />}
        </div>
      </div>
      {outcome !== null && outcome.steps.length > 0 && (
        <div className="mt-12">
          <Section title="Line by line">
            <WorkingLines steps={outcome.steps} />
          </Section>
        </div>
      )}
      <div className="no-print mt-8 flex flex-wrap gap-3">
        <CopyAddress />
        <Button
          kind="quiet"
          onClick={() => {
            globalThis.print();
          }}
        >
          Print
        </Button>
      </div>
      <TitleBlock
        items={[
          { label: 'Working', value: calculator.title },
          { label: 'Worked on', value: workedOn },
          { label: 'Rests on', value: 'The figures given, which nobody has checked' },
          { label: 'Is not', value: 'A test, a certificate or leave to steam' },
        ]}
      />
      {first && <AnswerBar label={first.label} text={quantityText(first.quantity, units, first.value)} />}
    </Page>
  );
}

export function Component() {
  const { id = '' } = useParams();
  const calculator = calculatorOf(id);
  return calculator === undefined ? <NotFound /> : <WorkingPage key={id} calculator={calculator} />;
}
