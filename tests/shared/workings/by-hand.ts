import type { Line } from '#shared/engineering/working.ts';
import { coherentText } from '#shared/engineering/working.ts';
import { fromKept, toCoherentSi } from '#shared/engineering/quantities.ts';

/**
 * Works the printed formula of a line from its text alone, figures put in, as an inspector with a calculator would.
 * Knows what the formulas are written with: · / + − ^ ² ³ π and sin cos asin.
 */
export function workedByHand(line: Line): number {
  const text = coherentText(line)
    .replaceAll('·', '*')
    .replaceAll('−', '-')
    .replaceAll('²', '^2')
    .replaceAll('³', '^3')
    .replaceAll('π', String(Math.PI));
  let at = 0;
  const skip = () => {
    while (text[at] === ' ') at += 1;
  };
  const takes = (sign: string): boolean => {
    skip();
    if (!text.startsWith(sign, at)) return false;
    at += sign.length;
    return true;
  };
  const functions = { asin: Math.asin, sin: Math.sin, cos: Math.cos } as const;
  const atom = (): number => {
    if (takes('-')) return -atom();
    for (const name of ['asin', 'sin', 'cos'] as const)
      if (takes(`${name}(`)) return closing(functions[name](sum()));
    if (takes('(')) return closing(sum());
    skip();
    const number = /^\d+(\.\d+)?(e[+-]?\d+)?/.exec(text.slice(at));
    if (!number) throw new Error(`Cannot read “${text.slice(at)}” of ${text}`);
    at += number[0].length;
    return Number(number[0]);
  };
  const closing = (value: number): number => {
    if (!takes(')')) throw new Error(`No closing bracket at ${text.slice(at)}`);
    return value;
  };
  const power = (): number => {
    const base = atom();
    return takes('^') ? base ** power() : base;
  };
  const product = (): number => {
    let value = power();
    for (;;) {
      if (takes('*')) value *= power();
      else if (takes('/')) value /= power();
      else return value;
    }
  };
  const sum = (): number => {
    let value = product();
    for (;;) {
      if (takes('+')) value += product();
      else if (takes('-')) value -= product();
      else return value;
    }
  };
  const value = sum();
  skip();
  if (at !== text.length) throw new Error(`Left over: ${text.slice(at)}`);
  return value;
}

/** What the line says it comes to, in the units `workedByHand` works in. */
export const saidBy = ({ result, units }: Line): number =>
  units === undefined
    ? toCoherentSi(result.quantity, result.value)
    : fromKept(result.quantity, units, result.value);
