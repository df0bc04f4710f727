import { work } from './working.ts';
import type { Line } from './working.ts';

/** Speed of sound along the beam, m/s. */
export const waveSpeeds = {
  copper: { label: 'Copper', metresPerSecond: 4_660 },
  brass: { label: 'Brass', metresPerSecond: 4_430 },
  steel: { label: 'Steel', metresPerSecond: 5_920 },
} as const;
export type WaveMetalId = keyof typeof waveSpeeds;

/** Thickness by the time an echo takes. */
export const echoThickness = (metresPerSecond: number, microseconds: number): Line =>
  work({
    result: ['t', 'Thickness', 'length'],
    formula: '{v}·{Δτ} / 2',
    terms: {
      v: ['Speed of sound', 'waveSpeed', metresPerSecond],
      Δτ: ['Time of the echo', 'microseconds', microseconds],
    },
    compute: ({ v, Δτ }) => (v * Δτ) / 2_000,
    source: 'wave-speed',
    holds: 'Parallel faces, beam square on',
  });

/** True thickness where the meter was set for another metal. */
export const trueThickness = (readMm: number, setTo: WaveMetalId, metal: WaveMetalId): Line =>
  work({
    result: ['t', 'True thickness', 'length'],
    formula: '{r}·{v} / {v_s}',
    terms: {
      r: ['Reading', 'length', readMm],
      v: ['Speed in the metal', 'waveSpeed', waveSpeeds[metal].metresPerSecond],
      v_s: ['Speed the meter was set to', 'waveSpeed', waveSpeeds[setTo].metresPerSecond],
    },
    compute: ({ r, v, v_s }) => (r * v) / v_s,
    source: 'wave-speed',
    holds: 'Handbook speeds; check the meter on a piece of known thickness',
  });
