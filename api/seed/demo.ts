import { ctxFrom } from '../deps.ts';
import type { Deps } from '../deps.ts';
import * as accounts from '../features/accounts/service.ts';
import { handleJob } from '../jobs/handlers.ts';
import { horizontalBoilers } from './boilers-horizontal.ts';
import { keepEngines } from './engines.ts';
import { otherBoilers } from './boilers-other.ts';
import { verticalBoilers } from './boilers-vertical.ts';
import { makeOrder, seedOrders } from './orders.ts';
import { makeBoiler, makePeople, makeSurveyors } from './world.ts';
import type { MadeBoiler } from './world.ts';

const boilers = [...verticalBoilers, ...horizontalBoilers, ...otherBoilers];

/**
 * Loads the demonstration into an empty database, through the same services that the product uses, with each person
 * as the one who acts: so it can hold only what the rules allow. Does nothing where there is anybody already.
 */
export async function seedIfEmpty(deps: Deps, say: (line: string) => void): Promise<void> {
  if ((await accounts.searchPeople(ctxFrom(deps), '')).length > 0) return;
  say('loading the demonstration (once, under a minute)');
  const world = await makePeople(deps);
  await makeSurveyors(world);
  await keepEngines(world);
  say('  people and surveyors');
  const made = new Map<string, MadeBoiler>();
  // The longest listed first, as it was.
  for (const boiler of boilers.toSorted((a, b) => (b.listedDaysAgo ?? 0) - (a.listedDaysAgo ?? 0))) {
    made.set(boiler.key, await makeBoiler(world, boiler));
    say(`  boiler ${String(made.size)} of ${String(boilers.length)}: ${boiler.title}`);
  }
  for (const order of seedOrders.toSorted((a, b) => b.placedDaysAgo - a.placedDaysAgo)) {
    const boiler = made.get(order.boiler);
    const seller = boilers.find((each) => each.key === order.boiler)?.seller;
    if (!boiler || !seller) throw new Error(`No boiler called ${order.boiler}`);
    await makeOrder(world, order, boiler, seller);
  }
  say('  surveys and reports');
  await deps.queue.drain((job) => handleJob(world.system(), job));
  say('  letters posted');
}
