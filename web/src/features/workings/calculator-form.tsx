import type { Calculator, Inputs } from '#shared/workings/calculator.ts';
import type { Field } from '#shared/workings/field.ts';
import { FieldInput } from './field-input.tsx';

interface Props {
  calculator: Calculator;
  inputs: Inputs;
  errors: Readonly<Record<string, string>>;
  onChange: (changes: Inputs) => void;
}

/** Whether a field has anything to say, given the choices made. */
export const isShown = ({ when }: Field, inputs: Inputs): boolean =>
  when === null || when.is.includes(String(inputs[when.field]));

/** Whether a list's words want the whole width. */
const isLong = ({ control }: Field): boolean =>
  control.kind === 'choice' && Object.values(control.options).some((words) => words.length > 18);

/** The inputs of a calculator, under their headings. */
export function CalculatorForm({ calculator, inputs, errors, onChange }: Props) {
  const shown = Object.entries(calculator.fields).filter(([, field]) => isShown(field, inputs));
  const parts = [...new Set(shown.map(([, { part }]) => part))];
  return (
    <form
      aria-label="Figures"
      noValidate
      className="grid gap-6"
      onSubmit={(event) => {
        event.preventDefault();
      }}
    >
      {parts.map((part) => (
        <fieldset key={part ?? ''} className="min-w-0">
          {part !== null && (
            <legend className="mb-2 w-full border-b border-rule pb-1 text-label text-pencil">{part}</legend>
          )}
          <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-1 xl:grid-cols-2">
            {shown
              .filter(([, field]) => field.part === part)
              .map(([name, field]) => (
                <div key={name} className={isLong(field) ? 'sm:col-span-2 lg:col-span-1 xl:col-span-2' : ''}>
                  <FieldInput
                    field={field}
                    value={inputs[name]}
                    error={errors[name]}
                    onChange={(value) => {
                      onChange({ [name]: value });
                    }}
                  />
                </div>
              ))}
          </div>
        </fieldset>
      ))}
    </form>
  );
}
