import { randomUUID } from 'node:crypto';
import type { CompleteListing } from '#shared/listings/draft.ts';
import { addDays, addHours, dayOf } from '#shared/time.ts';
import type { Instant } from '#shared/time.ts';
import type { Actor, Ctx } from '../ctx.ts';
import { ctxFrom } from '../deps.ts';
import type { Deps } from '../deps.ts';
import * as accounts from '../features/accounts/service.ts';
import * as listings from '../features/listings/service.ts';
import * as photos from '../features/photos/service.ts';
import * as places from '../features/places/service.ts';
import * as surveyorService from '../features/surveyors/service.ts';
import { demoPassword } from '../demo-accounts.ts';
import { people, surveyors } from './people.ts';
import type { PersonKey } from './people.ts';
import { altOf, readPicture } from './pictures.ts';
import { draftOf } from './sizes.ts';
import type { SeedBoiler } from './sizes.ts';

/** What the seed has made so far, and how to act as one of its people on a day of its past. */
export interface World {
  deps: Deps;
  /** The moment of seeding; everything is so many days before it. */
  today: Instant;
  actors: ReadonlyMap<PersonKey, Actor>;
  as: (person: PersonKey, daysAgo: number, hour?: number) => Ctx;
  system: (daysAgo?: number) => Ctx;
}

const townId = (name: string): number => {
  const town = places.searchTowns(name).find((each) => each.name === name);
  if (!town) throw new RangeError(`No town called ${name}`);
  return town.id;
};

/** Joins everyone through the sign-in service, as they would themselves, and grants their roles. */
export async function makePeople(deps: Deps): Promise<World> {
  const today = deps.now();
  const actors = new Map<PersonKey, Actor>();
  const system = (daysAgo = 0): Ctx => ({ ...ctxFrom(deps), now: () => addDays(today, -daysAgo) });
  for (const [key, { email, name, roles }] of Object.entries(people)) {
    await deps.auth.api.signUpEmail({ body: { email, name, password: demoPassword } });
    const person = await accounts.confirmEmail(system(), email);
    for (const role of roles) {
      await accounts.changeRole(system(200), {
        userId: person.id,
        role,
        change: 'grant',
        reason: 'Founding member',
      });
    }
    actors.set(key as PersonKey, {
      id: person.id,
      name,
      email,
      isEmailVerified: true,
      roles: new Set(roles),
      sessionId: 'seed',
    });
  }
  const as = (person: PersonKey, daysAgo: number, hour = 0): Ctx => {
    const actor = actors.get(person);
    if (!actor) throw new RangeError(`Nobody called ${person}`);
    return { ...ctxFrom(deps, actor), now: () => addHours(addDays(today, -daysAgo), hour) };
  };
  return { deps, today, actors, as, system };
}

/** Finishes the payment service's own set-up page, as the surveyor would in a browser. */
async function finishPayoutSetUp(world: World, person: PersonKey): Promise<void> {
  const { url } = await surveyorService.startPayoutSetUp(world.as(person, 100));
  await fetch(url, { method: 'POST', redirect: 'manual' });
  const found = await surveyorService.findSurveyor(world.system(), world.as(person, 0).actor?.id ?? '');
  if (found?.payoutAccountId)
    await surveyorService.setPayoutsReady(world.system(), found.payoutAccountId, true);
}

export async function makeSurveyors(world: World): Promise<void> {
  for (const [key, surveyor] of Object.entries(surveyors)) {
    const person = key as PersonKey;
    await surveyorService.saveMySurveyorTerms(world.as(person, 120), {
      ...surveyor.terms,
      townId: townId(surveyor.town),
      insuredUntilOn: dayOf(addDays(world.today, surveyor.insuredForDays)),
    });
    if (surveyor.hasPayouts && world.deps.fakePaymentsUrl) await finishPayoutSetUp(world, person);
  }
}

export interface MadeBoiler {
  id: string;
  slug: string;
  facts: CompleteListing['facts'] | null;
}

/** Drafts, photographs and lists one boiler as its seller. */
export async function makeBoiler(world: World, boiler: SeedBoiler): Promise<MadeBoiler> {
  const daysAgo = boiler.listedDaysAgo ?? 2;
  const ctx = world.as(boiler.seller, daysAgo);
  const started = await listings.createListing(ctx);
  for (const picture of boiler.pictures) {
    await photos.addPhotoFromBuffer(ctx, {
      ownerId: ctx.actor?.id ?? '',
      listingId: started.id,
      view: picture.view,
      alt: altOf(picture),
      filename: `${picture.file}.jpg`,
      buffer: Buffer.from(await readPicture(picture)),
    });
  }
  const draft = draftOf(boiler, townId(boiler.town), randomUUID);
  const saved = await listings.saveListing(ctx, started.id, { version: started.version, draft });
  if (boiler.listedDaysAgo === undefined) return { id: saved.id, slug: saved.slug, facts: null };
  const listed = await listings.moveListing(ctx, started.id, { event: 'publish', reason: '' });
  const { facts } = await listings.getListing(ctx, listed.slug);
  return { id: listed.id, slug: listed.slug, facts };
}
