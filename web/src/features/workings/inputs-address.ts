import type { Calculator, Inputs } from '#shared/workings/calculator.ts';
import type { Field } from '#shared/workings/field.ts';

function readField({ control, isOptional }: Field, text: string): unknown {
  if (text === '') return isOptional ? null : undefined;
  return control.kind === 'quantity' ? Number(text) : text;
}

/** The inputs an address holds; what it does not name is as the calculator begins. */
export function readInputs({ fields, initial }: Calculator, search: URLSearchParams): Inputs {
  return Object.fromEntries(
    Object.entries(fields).map(([name, field]) => {
      const text = search.get(name);
      return [name, text === null ? initial[name] : readField(field, text)];
    }),
  );
}

/** Every input in the address, in the units they are kept in, so that a link says the same to everyone. */
export const writeInputs = ({ fields }: Calculator, inputs: Inputs): URLSearchParams =>
  new URLSearchParams(
    Object.keys(fields).map((name) => {
      const value = inputs[name];
      return [name, typeof value === 'number' || typeof value === 'string' ? String(value) : ''];
    }),
  );
