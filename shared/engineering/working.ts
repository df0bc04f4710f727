import { fromKept, quantityText, toCoherentSi } from './quantities.ts';
import type { Quantity, UnitSystem } from './quantities.ts';
import { sources } from './sources.ts';
import type { Source, SourceId } from './sources.ts';

/** A figure with its symbol, in the unit its quantity is kept in. */
export interface Term {
  symbol: string;
  label: string;
  value: number;
  quantity: Quantity;
}

/** One line of a working: a formula, what goes into it, what comes out, where it holds and where it comes from. */
export interface Line {
  result: Term;
  /** Right-hand side, each symbol in braces: `{S}·{t} / {R}`. */
  formula: string;
  terms: readonly Term[];
  source: SourceId;
  /** The range it holds over, in words. */
  holds: string;
  /** A formula with units built into its constants is substituted in these units, whatever the reader's. */
  units?: UnitSystem;
}

/** Why there is no figure. Never a number in disguise. */
export interface Refusal {
  refused: 'out-of-range' | 'not-published' | 'measure-it';
  text: string;
}

export type Answer = Line | Refusal;

export const isRefusal = (of: object): of is Refusal => 'refused' in of;

export const outOfRange = (text: string): Refusal => ({ refused: 'out-of-range', text });
export const notPublished = (text: string): Refusal => ({ refused: 'not-published', text });
export const measureIt = (text: string): Refusal => ({ refused: 'measure-it', text });

/** The figure of an answer; null where it was refused. */
export const valueOf = (answer: Answer): number | null => (isRefusal(answer) ? null : answer.result.value);

type TermSpec = readonly [label: string, quantity: Quantity, value: number];

/**
 * Works one formula and keeps how.
 *
 * @param spec.compute in the units the quantities are kept in; it must say what `formula` says (a test works the text).
 * @throws RangeError if the outcome is no number: callers keep to the range first.
 */
export function work<S extends string>(spec: {
  result: readonly [symbol: string, label: string, quantity: Quantity];
  formula: string;
  terms: Readonly<Record<S, TermSpec>>;
  compute: (of: Readonly<Record<S, number>>) => number;
  source: SourceId;
  holds: string;
  units?: UnitSystem;
}): Line {
  const symbols = Object.keys(spec.terms) as S[];
  const values = Object.fromEntries(symbols.map((symbol) => [symbol, spec.terms[symbol][2]]));
  const value = spec.compute(values as Record<S, number>);
  const [symbol, label, quantity] = spec.result;
  if (!Number.isFinite(value)) throw new RangeError(`${label} is no number`);
  return {
    result: { symbol, label, value, quantity },
    formula: spec.formula,
    terms: symbols.map((each) => {
      const [termLabel, termQuantity, termValue] = spec.terms[each];
      return { symbol: each, label: termLabel, value: termValue, quantity: termQuantity };
    }),
    source: spec.source,
    holds: spec.holds,
    ...(spec.units && { units: spec.units }),
  };
}

const inBraces = /\{([^}]+)\}/g;

/** “P = S·t / R”. */
export const formulaText = ({ result, formula }: Line): string =>
  `${result.symbol} = ${formula.replace(inBraces, '$1')}`;

/** The formula with each symbol's figure and unit in its place, as the reader measures. */
export function substitutedText(line: Line, units: UnitSystem): string {
  const by = new Map(line.terms.map((term) => [term.symbol, term]));
  // Units have points of their own: what is multiplied is set apart by a cross.
  return line.formula
    .replaceAll('·', ' × ')
    .replace(/\{([^}]+)\}([²³^])?/g, (_, symbol: string, power: string | undefined) => {
      const term = by.get(symbol);
      const text = term === undefined ? symbol : quantityText(term.quantity, line.units ?? units, term.value);
      // The power is of the figure and its unit together.
      return power === undefined ? text : `(${text})${power}`;
    });
}

/** What the line comes to, as the reader measures. */
export const resultText = ({ result }: Line, units: UnitSystem): string =>
  quantityText(result.quantity, units, result.value);

export const sourceOf = ({ source }: Line): Source => sources[source];

/** The formula with every figure in coherent SI, for working it out apart from the code that did. */
export function coherentText(line: Line): string {
  const by = new Map(line.terms.map((term) => [term.symbol, term]));
  return line.formula.replace(inBraces, (_, symbol: string) => {
    const term = by.get(symbol);
    if (term === undefined) return symbol;
    const value =
      line.units === undefined
        ? toCoherentSi(term.quantity, term.value)
        : fromKept(term.quantity, line.units, term.value);
    return `(${String(value)})`;
  });
}

/** A term as it stands in a list: symbol, words and figure. */
export const termText = ({ quantity, value }: Term, units: UnitSystem): string =>
  quantityText(quantity, units, value);
