import { leakClasses, leakPlaces } from '#shared/surveys/record.ts';
import type { HydraulicTest, LeakPlace } from '#shared/surveys/record.ts';
import { Button } from '#web/ui/button.tsx';
import { Check } from '#web/ui/check.tsx';
import { Field } from '#web/ui/field.tsx';
import { WordsInput } from './words-input.tsx';

type Leak = HydraulicTest['leaks'][number];

const places = Object.keys(leakPlaces) as LeakPlace[];
const canCure = new Set<LeakPlace>(['gland', 'bush']);

/** Where water came out under pressure, and how much. */
export function LeakFields({
  leaks,
  onChange,
}: {
  leaks: readonly Leak[];
  onChange: (leaks: Leak[]) => void;
}) {
  const change = (index: number, fields: Partial<Leak>) => {
    onChange(leaks.map((leak, at) => (at === index ? { ...leak, ...fields } : leak)));
  };
  return (
    <section className="grid gap-3" aria-label="Leaks">
      <h2 className="text-lg">Leaks</h2>
      {leaks.length === 0 && <p className="text-pencil">None recorded: dry all over.</p>}
      {leaks.map((leak, index) => (
        // A leak has no name but its place in the list.
        // eslint-disable-next-line react/no-array-index-key
        <fieldset key={index} className="grid gap-3 border-t border-rule pt-3">
          <legend className="float-left w-full font-medium">Leak {index + 1}</legend>
          <div className="grid grid-cols-2 gap-3">
            <Field label="At">
              {(control) => (
                <select
                  {...control}
                  value={leak.place}
                  onChange={({ target }) => {
                    change(index, { place: target.value as LeakPlace });
                  }}
                >
                  {places.map((place) => (
                    <option key={place} value={place}>
                      {leakPlaces[place]}
                    </option>
                  ))}
                </select>
              )}
            </Field>
            <Field label="How much">
              {(control) => (
                <select
                  {...control}
                  value={leak.leakClass}
                  onChange={({ target }) => {
                    change(index, { leakClass: Number(target.value) });
                  }}
                >
                  {leakClasses.map((label, leakClass) => (
                    <option key={label} value={leakClass}>
                      {label}
                    </option>
                  ))}
                </select>
              )}
            </Field>
          </div>
          <WordsInput
            label="Where"
            most={120}
            value={leak.where}
            onChange={(where) => {
              change(index, { where });
            }}
          />
          {canCure.has(leak.place) && (
            <Check
              label="Made dry, and the test made again"
              checked={leak.cured}
              onChange={({ target }) => {
                change(index, { cured: target.checked });
              }}
            />
          )}
          <div>
            <Button
              kind="plain"
              onClick={() => {
                onChange(leaks.filter((_leak, at) => at !== index));
              }}
            >
              Take this leak off
            </Button>
          </div>
        </fieldset>
      ))}
      {leaks.length < 40 && (
        <div>
          <Button
            kind="quiet"
            onClick={() => {
              onChange([...leaks, { place: 'seam', leakClass: 1, where: '', cured: false }]);
            }}
          >
            Add a leak
          </Button>
        </div>
      )}
    </section>
  );
}
