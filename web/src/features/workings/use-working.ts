import { useMemo, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { Calculator, Inputs, Outcome, Plot } from '#shared/workings/calculator.ts';
import { isShown } from './calculator-form.tsx';
import { readInputs, writeInputs } from './inputs-address.ts';

interface Working {
  inputs: Inputs;
  errors: Readonly<Record<string, string>>;
  /** Null while something given cannot be. */
  outcome: Outcome | null;
  plot: Plot | null;
  change: (changes: Inputs) => void;
  reset: () => void;
}

/** What is not on the form does not count: it stands as the calculator begins. */
const counted = ({ fields, initial }: Calculator, inputs: Inputs): Inputs =>
  Object.fromEntries(
    Object.entries(fields).map(([name, field]) => [
      name,
      isShown(field, inputs) ? inputs[name] : initial[name],
    ]),
  );

function worked(calculator: Calculator, inputs: Inputs): Pick<Working, 'errors' | 'outcome' | 'plot'> {
  const read = calculator.schema.safeParse(counted(calculator, inputs));
  if (read.success)
    return { errors: {}, outcome: calculator.work(read.data), plot: calculator.plot(read.data) };
  const errors: Record<string, string> = {};
  for (const { path, message } of read.error.issues) errors[String(path[0])] ??= message;
  return { errors, outcome: null, plot: null };
}

/** A calculator at work: its inputs live in the address, and what comes of them is worked out as they change. */
export function useWorking(calculator: Calculator): Working {
  const [search, setSearch] = useSearchParams();
  const [inputs, setInputs] = useState<Inputs>(() => readInputs(calculator, search));
  const address = search.toString();
  const [seen, setSeen] = useState(address);
  // Gone back, or come by another link: the address has the last word.
  if (seen !== address) {
    setSeen(address);
    if (address !== writeInputs(calculator, inputs).toString()) setInputs(readInputs(calculator, search));
  }
  const result = useMemo(() => worked(calculator, inputs), [calculator, inputs]);
  const put = (next: Inputs) => {
    setInputs(next);
    setSearch(writeInputs(calculator, next), { replace: true, preventScrollReset: true });
  };
  return {
    ...result,
    inputs,
    change: (changes) => {
      put({ ...inputs, ...changes });
    },
    reset: () => {
      put(calculator.initial);
    },
  };
}
