import type { Calculator, Inputs } from '#shared/workings/calculator.ts';
import type { Field } from '#shared/workings/field.ts';
import { FieldInput } from './field-input.tsx';

interface Props {
  calculator: Calculator;
  inputs: Inputs;
  errors: Readonly<Record<string, string>>;
  onChange: (name: string, value: unknown) => void;
}

/** Whether a field has anything to say, given the choices made. */
export const isShown = ({ when }: Field, inputs: Inputs): boolean =>
  when === null || when.is.includes(String(inputs[when.field]));

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
                <FieldInput
                  key={name}
                  name={name}
                  field={field}
                  value={inputs[name]}
                  error={errors[name]}
                  onChange={(value) => {
                    onChange(name, value);
                  }}
                />
              ))}
          </div>
        </fieldset>
      ))}
    </form>
  );
}
