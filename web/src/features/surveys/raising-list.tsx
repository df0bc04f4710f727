import { raisingSteps } from '#shared/surveys/test-steps.ts';
import type { HydraulicTest } from '#shared/surveys/record.ts';
import { useUnits } from '#web/lib/units.tsx';

/** The steps of raising pressure: where to stop, look and read, and which have been read. */
export function RaisingList({ test }: { test: HydraulicTest }) {
  const { show } = useUnits();
  const steps = raisingSteps(test);
  const next = steps.find(({ isReached }) => !isReached);
  return (
    <section aria-label="Raising the pressure" className="grid gap-2">
      <h2 className="text-lg">Raise it by quarters</h2>
      <ol className="border-t border-rule">
        {steps.map((step) => (
          <li
            key={step.pressurePa}
            className={`flex justify-between gap-4 border-b border-rule py-2 ${step === next ? 'font-medium' : ''}`}
          >
            <span>
              {show('pressure', step.pressurePa)}
              {step === next && ': stop here, look all over, and read'}
            </span>
            <span className="text-pencil">{step.isReached ? 'Read' : ''}</span>
          </li>
        ))}
      </ol>
    </section>
  );
}
