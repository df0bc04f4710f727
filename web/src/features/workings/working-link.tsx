import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import type { Inputs } from '#shared/workings/calculator.ts';
import { calculatorOf } from '#shared/workings/index.ts';
import { writeInputs } from './inputs-address.ts';

interface Props {
  calculator: string;
  inputs: Inputs;
  /** What a screen reader hears, where the words alone do not say of what. */
  of: string;
  children: ReactNode;
}

/** Leads from a figure to its working, with the numbers filled in. */
export function WorkingLink({ calculator: id, inputs, of, children }: Props) {
  const calculator = calculatorOf(id);
  if (calculator === undefined) return children;
  return (
    <Link
      className="link inline-flex min-h-6 items-center"
      to={sitePaths.working(id, writeInputs(calculator, inputs).toString())}
      aria-label={`${of}: how it is worked out`}
    >
      {children}
    </Link>
  );
}
