import type { EngineDraft } from '#shared/engines/engine.ts';

/** An engine that any member might keep. */
export const anEngine: EngineDraft = {
  name: 'Twin for the launch',
  boreMm: 19.05,
  strokeMm: 19.05,
  cylinders: 2,
  action: 'double',
  speedRpm: 350,
  cutOffPercent: 75,
  pressurePa: 310_000,
};
