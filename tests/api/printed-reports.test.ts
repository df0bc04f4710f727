import { readFileSync } from 'node:fs';
import { extractText, getDocumentProxy } from 'unpdf';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { printReport } from '#api/features/printed-reports/report-sheets.ts';
import type { Report } from '#shared/surveys/contract.ts';
import { criteriaFor } from '#shared/surveys/rubric/index.ts';
import { file, givenExamination, givenRecorded } from '#tests/support/examinations.ts';
import type { Examination } from '#tests/support/examinations.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

/** Text of a PDF, sheet by sheet, as a reader of its text layer has it: spaces where lines break. */
async function sheetsOf(content: Buffer): Promise<string[]> {
  const { text } = await extractText(await getDocumentProxy(new Uint8Array(content)), { mergePages: false });
  return text.map((sheet) => sheet.replaceAll(/\s+/g, ' '));
}

describe('a report on paper', () => {
  let site: Site;
  let examination: Examination;
  let report: Report;
  beforeAll(async () => {
    site = await givenSite();
    examination = await givenExamination(site);
    const recorded = await givenRecorded(site, examination);
    report = (await file(site, examination.surveyor, recorded)).body as Report;
  }, 60_000);
  afterAll(() => site.close());

  const print = (query = '') =>
    site.as(undefined).get(`/api/reports/${report.id}/pdf${query}`).responseType('blob');

  test('says what the page says: verdict, every item, checks, signature and limits', async () => {
    const { body, headers } = await print().expect(200);
    expect(headers['content-type']).toBe('application/pdf');
    const sheets = await sheetsOf(body as Buffer);
    const all = sheets.join(' ');
    expect(all).toContain(report.listing.title);
    expect(all).toContain(report.result.verdict.label);
    expect(all).toContain(
      `Condition ${String(report.result.condition)} of 100. Evidence ${String(report.result.evidence)} %.`,
    );
    for (const { title } of criteriaFor(report.facts)) expect(all).toContain(title);
    for (const { title, text } of report.result.checks) {
      expect(all).toContain(title);
      expect(all).toContain(text);
    }
    expect(all).toContain(`Signed ${report.signOff.name}`);
    expect(all).toContain('no certificate and no permission to steam');
    expect(all).not.toMatch(/NaN|Infinity|undefined/);
  });

  test('has its title block with check code and number on every sheet', async () => {
    const { body } = await print().expect(200);
    const sheets = await sheetsOf(body as Buffer);
    expect(sheets.length).toBeGreaterThan(1);
    for (const [index, sheet] of sheets.entries()) {
      expect(sheet).toContain(report.checkCode);
      expect(sheet).toContain(`${String(index + 1)} of ${String(sheets.length)}`);
    }
  });

  test('has a title, a language, bookmarks and tags', async () => {
    const { body } = await print().expect(200);
    const document = await getDocumentProxy(new Uint8Array(body as Buffer));
    const { info } = await document.getMetadata();
    const told = info as Record<string, unknown>;
    expect(told['Title']).toBe(`Survey report: ${report.listing.title}`);
    expect(told['Language']).toBe('en-GB');
    const outline = await document.getOutline();
    expect(outline.map(({ title }) => title)).toContain('What was found');
    expect(await document.getMarkInfo()).toMatchObject({ Marked: true });
  });

  test('comes on A4 or Letter, in the units asked for, and refuses what it cannot be', async () => {
    const sizeOf = async (query: string) => {
      const { body } = await print(query).expect(200);
      const document = await getDocumentProxy(new Uint8Array(body as Buffer));
      return (await document.getPage(1)).getViewport({ scale: 1 });
    };
    expect(Math.round((await sizeOf('?paper=a4')).height)).toBe(842);
    expect(Math.round((await sizeOf('?paper=letter')).height)).toBe(792);
    const metric = (await sheetsOf((await print('?units=metric').expect(200)).body as Buffer)).join(' ');
    expect(metric).toContain('Claimed working pressure 5.52 bar');
    const { status } = await site.as(undefined).get(`/api/reports/${report.id}/pdf?paper=vellum`);
    expect(status).toBe(422);
  });

  test('goes with the letters that say the report is in', async () => {
    await site.drain();
    const { email } = examination.buyer;
    const letters = (await site.post.list()).filter(
      ({ to, subject }) => to === email && subject.includes('The report is in'),
    );
    expect(letters).toHaveLength(1);
    expect(letters[0]?.attachments.map(({ filename }) => filename)).toEqual([
      `survey-report-${report.checkCode}.pdf`,
    ]);
  });

  test('with thirty photographs is made in under 3 seconds and under 6 MB', async () => {
    const picture = readFileSync('api/seed/photos/a1-vertical-multitube-threequarter.jpg');
    const { default: sharp } = await import('sharp');
    const jpeg = await sharp(picture).resize({ width: 960 }).jpeg({ quality: 80 }).toBuffer();
    const photos = Array.from({ length: 30 }, (_, index) => ({
      ...report.photos[0]!,
      id: `00000000-0000-4000-8000-${String(index).padStart(12, '0')}`,
      width: 960,
      height: 640,
    }));
    const began = performance.now();
    const content = await printReport(
      { ...report, photos },
      {
        paper: 'a4',
        units: 'imperial',
        // Each picture its own bytes, as thirty photographs are.
        images: new Map(photos.map(({ id }) => [id, Buffer.concat([jpeg, Buffer.from(id)])])),
        checkAddress: 'https://tubeplate.example/check/0000',
      },
    );
    expect(performance.now() - began).toBeLessThan(3_000);
    expect(content.length).toBeLessThan(6_000_000);
    expect(content.length).toBeGreaterThan(30 * jpeg.length);
  });
});
