import type { EngineeringCheck } from '#shared/surveys/result.ts';
import type { KnownBoiler } from '#shared/workings/from-boiler.ts';
import { workingOfCheck } from '#shared/workings/implied.ts';
import { WorkingLink } from './working-link.tsx';

/** Leads from an engineering check to its working, with the report's own figures in it. */
export function CheckWorking({ boiler, check }: { boiler: KnownBoiler; check: EngineeringCheck }) {
  const working = workingOfCheck(boiler, check.id);
  if (working === null) return null;
  return (
    <span className="block text-sm">
      <WorkingLink calculator={working.calculator} inputs={working.inputs} of={check.title}>
        See the working
      </WorkingLink>
    </span>
  );
}
