import type { Units } from '#shared/accounts/contract.ts';
import { useUnits } from '#web/lib/units.tsx';

const labels: readonly (readonly [Units, string])[] = [
  ['imperial', 'psi, inches'],
  ['metric', 'bar, mm'],
];

/** The reader's units, at hand where figures are typed. */
export function UnitsSwitch() {
  const { units, setUnits } = useUnits();
  return (
    <fieldset className="no-print flex flex-wrap gap-x-5">
      <legend className="sr-only">Units</legend>
      {labels.map(([id, label]) => (
        <label key={id} className="flex min-h-11 items-center gap-2">
          <input
            type="radio"
            name="units-here"
            className="tick"
            checked={units === id}
            onChange={() => {
              setUnits(id);
            }}
          />
          {label}
        </label>
      ))}
    </fieldset>
  );
}
