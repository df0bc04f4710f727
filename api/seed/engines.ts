import type { EngineDraft } from '#shared/engines/engine.ts';
import * as engineService from '../features/engines/service.ts';
import type { PersonKey } from './people.ts';
import type { World } from './world.ts';

/** Engines that people keep, so that listings can say what drives them. */
const engines: Partial<Record<PersonKey, readonly EngineDraft[]>> = {
  tomos: [
    {
      name: 'Launch twin, 3/4 in bore',
      boreMm: 19.05,
      strokeMm: 19.05,
      cylinders: 2,
      action: 'double',
      speedRpm: 350,
      cutOffPercent: 75,
      pressurePa: 310_000,
    },
    {
      name: 'Little mill engine',
      boreMm: 12.7,
      strokeMm: 25.4,
      cylinders: 1,
      action: 'double',
      speedRpm: 180,
      cutOffPercent: 70,
      pressurePa: 200_000,
    },
  ],
};

/** Keeps each engine as its owner would. */
export async function keepEngines(world: World): Promise<void> {
  for (const [person, kept] of Object.entries(engines) as [PersonKey, readonly EngineDraft[]][]) {
    for (const [index, engine] of kept.entries())
      await engineService.keepEngine(world.as(person, 60 - index), engine);
  }
}
