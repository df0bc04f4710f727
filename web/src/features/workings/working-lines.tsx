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
    <div className="break-inside-avoid border-b border-rule py-3">
      <p className="font-medium">{line.result.label}</p>
      <div className="grid gap-1 overflow-x-auto py-1 leading-7">
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
      {!isLookedUp(line) && (
        <ul className="flex flex-wrap gap-x-5 text-sm text-pencil">
          {line.terms.map((term) => (
            <li key={term.symbol}>
              <Formula text={term.symbol} /> {term.label.charAt(0).toLowerCase() + term.label.slice(1)}{' '}
              {termText(term, units)}
            </li>
          ))}
        </ul>
      )}
      <p className="mt-1 text-sm text-pencil">
        {line.holds}. {source.title}.{' '}
        <em className="not-italic underline decoration-rule underline-offset-4">
          {surenesses[source.sureness]}
        </em>
        .
      </p>
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
