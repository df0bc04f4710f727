import { useState } from 'react';
import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { testsDueByPapers } from '#shared/papers/due.ts';

/** When tests are due again by the papers: due, never valid. */
export function TestsDue({ facts }: { facts: BoilerFacts }) {
  const [today] = useState(() => new Date().toISOString().slice(0, 10));
  return (
    <div className="mt-4">
      <h3 className="mb-1">Tests due</h3>
      <ul className="divide-y divide-rule border-y border-rule">
        {testsDueByPapers(facts, today).map(({ id, text, isOverdue }) => (
          <li key={id} className={`py-2 ${isOverdue === true ? 'font-medium text-attention' : ''}`}>
            {text}
          </li>
        ))}
      </ul>
      <p className="mt-2 text-sm text-pencil">
        By the dates on the papers and the intervals of the UK hobby code of 2006 as quoted. Due is not valid:
        the inspector decides, under your local code.
      </p>
    </div>
  );
}
