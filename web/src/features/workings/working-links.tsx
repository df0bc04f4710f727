import type { KnownBoiler } from '#shared/workings/from-boiler.ts';
import { workingsOf } from '#shared/workings/implied.ts';
import { WorkingLink } from './working-link.tsx';

/** The calculators this boiler's figures go through, filled in. */
export function WorkingLinks({ boiler }: { boiler: KnownBoiler }) {
  return (
    <ul className="flex flex-wrap gap-x-6 gap-y-1">
      {workingsOf(boiler).map(({ title, calculator, inputs }) => (
        <li key={calculator}>
          <WorkingLink calculator={calculator} inputs={inputs} of={title}>
            {title}
          </WorkingLink>
        </li>
      ))}
    </ul>
  );
}
