/** `npm run bench`: ratios measured side by side in one run on one machine. Prints; passes no judgement. */
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import autocannon from 'autocannon';
import { sql } from 'drizzle-orm';
import express from 'express';
import sharp from 'sharp';
import { addPhotoFromBuffer } from '#api/features/photos/service.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { makeTemplate } from '#tests/support/db-template.ts';
import { givenExamination, givenRecorded } from '#tests/support/examinations.ts';
import { givenListing } from '#tests/support/factories.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

const say = (what: string, figure: string) => process.stdout.write(`${what.padEnd(58)} ${figure}\n`);
const perSecond = async (url: string): Promise<number> =>
  (await autocannon({ url, connections: 8, duration: 5 })).requests.average;

/** Listing search through the whole stack, against a bare route that runs the same kind of SQL on the same database. */
async function search(site: Site): Promise<void> {
  const seller = await site.givenPerson('Bench Seller');
  for (let count = 0; count < 30; count += 1) await givenListing(site, seller);
  const { db } = site.deps.database;
  const bare = express();
  bare.get('/', async (_request, response) => {
    const total = await db.execute(sql`select count(*) from listings where status = 'published'`);
    const rows = await db.execute(sql`
      select l.*, p.id as photo_id, p.alt, p.width, p.height, p.widths from listings l
      left join lateral (select * from photos where listing_id = l.id and removed_at is null order by position limit 1) p on true
      where l.status = 'published' order by l.published_at desc, l.id desc limit 13`);
    response.json({ total, rows });
  });
  const server = bare.listen(0, '127.0.0.1');
  await new Promise((resolve) => {
    server.once('listening', resolve);
  });
  const { port } = server.address() as { port: number };
  const plain = await perSecond(`http://127.0.0.1:${String(port)}/`);
  const whole = await perSecond(`${site.url}/api/listings?limit=12`);
  server.close();
  say('search: whole stack, requests a second', whole.toFixed(0));
  say('search: the same SQL on a bare route', plain.toFixed(0));
  say('search: ratio (aim 0.7 or more)', (whole / plain).toFixed(2));
}

/** What the first page loads before anything is pressed. */
function firstLoad(): void {
  const root = path.resolve('dist/web');
  const html = readFileSync(path.join(root, 'index.html'), 'utf8');
  const files = [...html.matchAll(/(?:src|href)="(\/[^"]+\.js)"/g)].map((match) => match[1] ?? '');
  const bytes = files.reduce((sum, file) => sum + gzipSync(readFileSync(path.join(root, file))).length, 0);
  say('first load: JavaScript, gzip (aim 170 KB or less)', `${(bytes / 1024).toFixed(0)} KB`);
}

/** A 24-megapixel picture to all variants, against plain sharp making the same files. */
async function pictures(site: Site): Promise<void> {
  const seller = await site.givenPerson('Bench Photographer');
  const { id: listingId } = await givenListing(site, seller);
  const noise = { type: 'gaussian', mean: 128, sigma: 30 } as const;
  const buffer = Buffer.from(
    await sharp({ create: { width: 6_000, height: 4_000, channels: 3, background: '#888', noise } })
      .jpeg()
      .toBuffer(),
  );
  const plainFrom = performance.now();
  const decoded = sharp(buffer).autoOrient();
  await Promise.all(
    [480, 960, 1_920].flatMap((width) => [
      decoded.clone().resize({ width }).avif({ quality: 52, effort: 2 }).toBuffer(),
      decoded.clone().resize({ width }).jpeg({ quality: 80, mozjpeg: true }).toBuffer(),
    ]),
  );
  const plainMs = performance.now() - plainFrom;
  const oursFrom = performance.now();
  await addPhotoFromBuffer(site.ctxAs(), {
    ownerId: seller.id,
    listingId,
    view: 'whole',
    alt: 'x',
    filename: 'x.jpg',
    buffer,
  });
  const oursMs = performance.now() - oursFrom;
  say('pictures: 24 megapixels to all variants', `${oursMs.toFixed(0)} ms`);
  say('pictures: plain sharp making the same', `${plainMs.toFixed(0)} ms`);
  say('pictures: ratio (aim 1.25 or less)', (oursMs / plainMs).toFixed(2));
}

async function scoring(site: Site): Promise<void> {
  const { facts, record, scope } = await givenRecorded(site, await givenExamination(site));
  const from = performance.now();
  let count = 0;
  while (performance.now() - from < 3_000) {
    scoreSurvey({ facts, record, scope });
    count += 1;
  }
  say(
    'scoring: full surveys a second (aim 1,000 or more)',
    ((count * 1_000) / (performance.now() - from)).toFixed(0),
  );
}

await makeTemplate();
const site = await givenSite();
try {
  firstLoad();
  await scoring(site);
  await search(site);
  await pictures(site);
} finally {
  await site.close();
}
