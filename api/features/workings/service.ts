import type { UnitSystem } from '#shared/engineering/quantities.ts';
import type { Calculator, Inputs } from '#shared/workings/calculator.ts';
import { wiredAnswer } from '#shared/workings/wire.ts';
import type { WorkedAnswer } from '#shared/workings/wire.ts';

/** Works one calculator for anyone, as the Workings page does in the browser. */
export const workCalculator = (
  calculator: Calculator,
  { inputs, units }: { inputs: Inputs; units: UnitSystem },
): WorkedAnswer => wiredAnswer(calculator, calculator.work(inputs), units);
