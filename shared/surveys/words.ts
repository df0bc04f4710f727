import { paPerBar, paPerPsi } from '../engineering/units.ts';

/** A gauge pressure in both the units in use, for a sentence. */
export const pressureText = (pa: number): string =>
  `${(pa / paPerBar).toFixed(1)} bar (${String(Math.round(pa / paPerPsi))} psi)`;

export const lengthText = (mm: number): string => `${trim(mm, 2)} mm`;
export const rateText = (kgPerH: number): string => `${trim(kgPerH, 1)} kg/h`;

/** A number to so many places, without noughts at the end. */
export const trim = (value: number, places: number): string => {
  const text = value.toFixed(places);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
};

/** “a, b and c”. */
export const listText = (parts: readonly string[]): string =>
  parts.length < 2 ? parts.join('') : `${parts.slice(0, -1).join(', ')} and ${parts.at(-1) ?? ''}`;

/** A title inside a sentence: its first letter small. */
export const inSentence = (title: string): string => title.charAt(0).toLowerCase() + title.slice(1);
