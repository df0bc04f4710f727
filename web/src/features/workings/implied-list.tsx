import { figureText, fromKept, quantityText } from '#shared/engineering/quantities.ts';
import type { Term } from '#shared/engineering/working.ts';
import { impliedBy } from '#shared/workings/implied.ts';
import type { KnownBoiler } from '#shared/workings/from-boiler.ts';
import { useUnits } from '#web/lib/units.tsx';
import { WorkingLink } from './working-link.tsx';

/** What follows from a boiler's figures, each leading to its working with the figures filled in. */
export function ImpliedList({ boiler }: { boiler: KnownBoiler }) {
  const { units } = useUnits();
  const text = ([first, last]: readonly Term[]): string => {
    if (first === undefined) return 'Cannot say';
    const one = quantityText(first.quantity, units, first.value, 3);
    return last === undefined
      ? one
      : `${figureText(fromKept(first.quantity, units, first.value), 3)} to ${quantityText(last.quantity, units, last.value, 3)}`;
  };
  return (
    <ul className="border-t border-rule">
      {impliedBy(boiler).map(({ label, figures, note, calculator, inputs }) => (
        <li key={calculator} className="border-b border-rule py-2">
          <div className="flex items-baseline justify-between gap-4">
            <span className="text-pencil">{label}</span>
            <span className="text-right font-medium">
              <WorkingLink calculator={calculator} inputs={inputs} of={label}>
                {text(figures)}
              </WorkingLink>
            </span>
          </div>
          {note !== null && <p className="text-sm leading-5 text-pencil">{note}</p>}
        </li>
      ))}
    </ul>
  );
}
