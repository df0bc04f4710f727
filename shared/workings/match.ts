import { engineDemand, matchEngine } from '../engineering/engine-demand.ts';
import type { EngineMatch } from '../engineering/engine-demand.ts';
import { bandOf } from '../engineering/evaporation.ts';
import type { EngineFacts } from '../engines/engine.ts';
import { evaporationOf } from '../surveys/checks-capacity.ts';
import { emptyRecord } from '../surveys/record.ts';
import { rubricVersion } from '../surveys/rubric/index.ts';
import type { KnownBoiler } from './from-boiler.ts';

/** An engine on a boiler: measured steam beats estimated. Null where the steam made is not known. */
export function matchOnBoiler({ facts, record }: KnownBoiler, engine: EngineFacts): EngineMatch | null {
  const made = evaporationOf({ facts, record: record ?? emptyRecord(rubricVersion) });
  if (made === null) return null;
  const at = { ...engine, pressurePa: Math.min(engine.pressurePa, facts.workingPressurePa) };
  return matchEngine(at, made, bandOf(engineDemand(at)));
}
