import { grades, remedies } from '#shared/surveys/record.ts';
import type { AllowanceOverride, FoundDefect, Remedy } from '#shared/surveys/record.ts';
import { stopKinds } from '#shared/surveys/rubric/types.ts';
import type { DefectSpec } from '#shared/surveys/rubric/types.ts';
import { Disclosure } from '#web/ui/disclosure.tsx';
import { Field } from '#web/ui/field.tsx';
import { AllowanceFields } from './allowance-fields.tsx';
import { bandText } from './band-text.ts';
import { WordsInput } from './words-input.tsx';

interface Props {
  spec: DefectSpec;
  defect: FoundDefect;
  /** What the catalogue allows for it on this boiler. */
  band: AllowanceOverride;
  onChange: (change: Partial<FoundDefect>) => void;
}

/** A defect that was found: where, and anything in which it differs from what the catalogue says of it. */
export function DefectDetails({ spec, defect, band, onChange }: Props) {
  const remedy = defect.remedy ?? spec.remedy;
  return (
    <section className="border-l-4 border-ink pl-3" aria-label={spec.label}>
      <p className="font-bold">{spec.label}</p>
      <p className="text-[0.9375rem] leading-6 text-pencil">
        Usually {grades[spec.grade].toLowerCase()} · {remedies[remedy].toLowerCase()} ·{' '}
        {bandText(defect.allowance ?? band)}
        {defect.allowance !== null && ', your figure'}
      </p>
      {spec.stop !== null && (
        <p className="font-medium text-unfit">{stopKinds[spec.stop]}: the verdict becomes Do not steam.</p>
      )}
      <div className="mt-2">
        <WordsInput
          label="Where"
          hint="A few words"
          most={120}
          value={defect.where}
          onChange={(where) => {
            onChange({ where });
          }}
        />
      </div>
      <Disclosure summary="Note, remedy and cost">
        <div className="grid gap-4">
          <WordsInput
            label="Note"
            most={600}
            rows={3}
            value={defect.note}
            onChange={(note) => {
              onChange({ note });
            }}
          />
          <Field label="Remedy">
            {(control) => (
              <select
                {...control}
                value={remedy}
                onChange={({ target }) => {
                  onChange({ remedy: target.value === spec.remedy ? null : (target.value as Remedy) });
                }}
              >
                {(Object.keys(remedies) as Remedy[]).map((id) => (
                  <option key={id} value={id}>
                    {remedies[id]}
                    {id === spec.remedy ? ' (usual)' : ''}
                  </option>
                ))}
              </select>
            )}
          </Field>
          <AllowanceFields
            band={band}
            value={defect.allowance}
            onChange={(allowance) => {
              onChange({ allowance });
            }}
          />
        </div>
      </Disclosure>
    </section>
  );
}
