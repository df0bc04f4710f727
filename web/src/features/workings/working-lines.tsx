import { surenesses } from '#shared/engineering/sources.ts';
import { formulaText, resultText, sourceOf, substitutedText, termText } from '#shared/engineering/working.ts';
import type { Line } from '#shared/engineering/working.ts';
import type { Steps } from '#shared/workings/calculator.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Formula } from '#web/ui/formula.tsx';
import { Notice } from '#web/ui/notes.tsx';

/** A figure looked up rather than worked: its formula is its own name. */
const isLookedUp = ({ formula, terms }: Line): boolean =>
  terms.length === 1 && formula === `{${terms[0]?.symbol ?? ''}}`;

function WorkingLine({ line }: { line: Line }) {
  const { units } = useUnits();
  const source = sourceOf(line);
  return (
    <div className="grid break-inside-avoid gap-x-10 gap-y-2 border-b border-rule py-3 md:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
      <div>
        <p className="font-medium">{line.result.label}</p>
        <div className="grid gap-0.5 leading-7">
          {!isLookedUp(line) && (
            <>
              <p>
                <Formula text={formulaText(line)} />
              </p>
              <p>
                <Formula text={`${line.result.symbol} = ${substitutedText(line, units)}`} />
              </p>
            </>
          )}
          <p>
            <Formula text={`${line.result.symbol} = `} />
            <strong className="font-bold">{resultText(line, units)}</strong>
          </p>
        </div>
      </div>
      <div className="grid content-start gap-1 text-sm leading-5 text-pencil">
        {!isLookedUp(line) && (
          <ul>
            {line.terms.map((term) => (
              <li key={term.symbol} className="flex justify-between gap-4">
                <span>
                  <Formula text={term.symbol} /> {term.label.charAt(0).toLowerCase() + term.label.slice(1)}
                </span>
                <span className="text-right whitespace-nowrap">{termText(term, units)}</span>
              </li>
            ))}
          </ul>
        )}
        <p>Range: {line.holds}.</p>
        <p>
          From: {source.title}. <span className="text-ink">{surenesses[source.sureness]}.</span>
        </p>
      </div>
    </div>
  );
}

/** A working, line by line: formula, figures, result, where it holds and where it is from. */
export function WorkingLines({ steps }: { steps: readonly Steps[] }) {
  return (
    <div className="grid gap-6">
      {steps.map(({ title, lines, refusals }) => (
        <div key={title}>
          <h3 className="border-b border-ink pb-1">{title}</h3>
          {lines.map((line) => (
            <WorkingLine key={`${line.result.symbol}${line.result.label}${line.formula}`} line={line} />
          ))}
          {refusals.map(({ text }) => (
            <div key={text} className="py-3">
              <Notice>Cannot say: {text}</Notice>
            </div>
          ))}
        </div>
      ))}
    </div>
  );
}
