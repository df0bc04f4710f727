import { paPerPsi } from './units.ts';

/** What a joint is made with: its published rating in saturated steam, and where its metal begins to melt. */
interface JointSpec {
  label: string;
  /** Pa gauge; null where none is published here. */
  ratedPa: number | null;
  /** °C, solidus and liquidus; null where it does not melt before the plate. */
  meltsCelsius: readonly [low: number, high: number] | null;
}

const soft = 15 * paPerPsi;
const brazed = 120 * paPerPsi;

export const jointMetals = {
  'tin-lead': { label: 'Soft solder, tin and lead (63/37)', ratedPa: soft, meltsCelsius: [183, 183] },
  'tin-antimony': { label: 'Soft solder, tin with antimony (95/5)', ratedPa: soft, meltsCelsius: [233, 240] },
  'silver-55': { label: 'Silver solder, 55 % silver with tin', ratedPa: brazed, meltsCelsius: [630, 660] },
  'silver-45': { label: 'Silver solder, 45 % silver with tin', ratedPa: brazed, meltsCelsius: [640, 680] },
  'silver-40': { label: 'Silver solder, 40 % silver with tin', ratedPa: brazed, meltsCelsius: [650, 710] },
  'silver-30': { label: 'Silver solder, 30 % silver with tin', ratedPa: brazed, meltsCelsius: [665, 755] },
  welded: { label: 'Welded', ratedPa: null, meltsCelsius: null },
  riveted: { label: 'Riveted and caulked', ratedPa: null, meltsCelsius: null },
} as const satisfies Record<string, JointSpec>;
export type JointMetalId = keyof typeof jointMetals;

export const jointOf = (id: JointMetalId): JointSpec => jointMetals[id];

/** Whether a joint is made with something that must not hold pressure. */
export const isSoftJoint = (id: JointMetalId): boolean => jointOf(id).ratedPa === soft;
