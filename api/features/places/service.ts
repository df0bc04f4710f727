import { createRequire } from 'node:module';
import { Problem } from '#shared/problem.ts';
import type { Town } from '#shared/listings/places.ts';

type Row = readonly [
  id: number,
  name: string,
  region: string,
  country: string,
  latitude: number,
  longitude: number,
];

const rows = createRequire(import.meta.url)('./towns.json') as Row[];
const towns = new Map<number, Town>(
  rows.map(([id, name, region, country, latitude, longitude]) => [
    id,
    { id, name, region, country, latitude, longitude },
  ]),
);
const plain = (text: string): string => text.normalize('NFD').replaceAll(/\p{M}/gu, '').toLowerCase();
const searchable = [...towns.values()].map((town) => ({ town, key: plain(town.name) }));

const most = 12;

/** Towns whose name begins with the text, then those in which a later word does. */
export function searchTowns(text: string): Town[] {
  const wanted = plain(text.trim());
  const first = searchable.filter(({ key }) => key.startsWith(wanted));
  const then = searchable.filter(({ key }) => !key.startsWith(wanted) && key.includes(` ${wanted}`));
  return [...first, ...then].slice(0, most).map(({ town }) => town);
}

export const findTown = (id: number | null): Town | undefined => (id === null ? undefined : towns.get(id));

/** @throws Problem not-found. */
export function getTown(id: number): Town {
  const town = towns.get(id);
  if (!town) throw new Problem('not-found', 'There is no such town in the gazetteer.');
  return town;
}
