/** How a line is drawn: weight, dash and ink follow from what it stands for. */
export type StrokeKind = 'outline' | 'thin' | 'hidden' | 'centre' | 'cut' | 'water';

export interface Stroke {
  /** SVG path. */
  d: string;
  kind: StrokeKind;
}

export type Spot = readonly [x: number, y: number];

/** A numbered balloon with its leader; `to` is null where the item has no place on the boiler. */
export interface Balloon {
  criterionId: string;
  number: number;
  x: number;
  y: number;
  to: Spot | null;
}

/** A general-arrangement drawing, in units of its own; the page and the paper draw the same lines. */
export interface Drawing {
  width: number;
  height: number;
  strokes: readonly Stroke[];
  balloons: readonly Balloon[];
}

/** Lines drawn so far, and where on them each item of the method is. */
export interface Sheet {
  add: (kind: StrokeKind, ...paths: readonly string[]) => void;
  point: (criterionId: string, x: number, y: number) => void;
  strokes: Stroke[];
  spots: Map<string, Spot>;
}

export function openSheet(): Sheet {
  const strokes: Stroke[] = [];
  const spots = new Map<string, Spot>();
  return {
    strokes,
    spots,
    add: (kind, ...paths) => {
      strokes.push(...paths.map((d) => ({ d, kind })));
    },
    point: (criterionId, x, y) => {
      spots.set(criterionId, [x, y]);
    },
  };
}

const round = (value: number): string => String(Math.round(value * 10) / 10);

/** A straight line through points. */
export const line = (...points: readonly Spot[]): string =>
  points.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${round(x)} ${round(y)}`).join('');

export const rect = (x: number, y: number, width: number, height: number): string =>
  `M${round(x)} ${round(y)}h${round(width)}v${round(height)}h${round(-width)}Z`;

export const circle = (x: number, y: number, radius: number): string =>
  `M${round(x - radius)} ${round(y)}a${round(radius)} ${round(radius)} 0 1 0 ${round(2 * radius)} 0a${round(radius)} ${round(radius)} 0 1 0 ${round(-2 * radius)} 0`;

/** A pipe or any bent line, as two curves through a middle point. */
export const curve = (from: Spot, bend: Spot, to: Spot): string =>
  `M${round(from[0])} ${round(from[1])}Q${round(bend[0])} ${round(bend[1])} ${round(to[0])} ${round(to[1])}`;

export const clamp = (value: number, least: number, most: number): number =>
  Math.min(most, Math.max(least, value));

/** Places evenly spread between two ends, neither end among them. */
export const between = (from: number, to: number, count: number): number[] =>
  Array.from({ length: count }, (_, index) => from + ((to - from) * (index + 1)) / (count + 1));

/** What is left of a plate between two ends where openings pass through it. */
export function solidBetween(
  from: number,
  to: number,
  openings: readonly (readonly [from: number, to: number])[],
): (readonly [from: number, to: number])[] {
  const edges = openings.toSorted(([a], [b]) => a - b);
  const starts = [from, ...edges.map(([, end]) => end)];
  const ends = [...edges.map(([start]) => start), to];
  return starts
    .map((start, index) => [start, ends[index] ?? to] as const)
    .filter(([start, end]) => end > start);
}
