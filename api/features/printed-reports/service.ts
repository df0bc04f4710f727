import { buffer } from 'node:stream/consumers';
import type { UnitSystem } from '#shared/engineering/quantities.ts';
import type { Photo } from '#shared/listings/pictures.ts';
import { Problem } from '#shared/problem.ts';
import { sitePaths } from '#shared/site-paths.ts';
import type { Ctx } from '../../ctx.ts';
import type { Paper } from '../../print/sheets.ts';
import * as photos from '../photos/service.ts';
import * as reports from '../reports/service.ts';
import { printReport } from './report-sheets.ts';

/** Wide enough for half a sheet at 300 dots an inch, and small enough for a letter. */
const printedWidth = 960;

/** Nothing where the picture may not be seen: that of a boiler taken down. */
async function readImage(ctx: Ctx, { id, widths }: Photo): Promise<readonly (readonly [string, Buffer])[]> {
  const width = widths.filter((each) => each <= printedWidth).at(-1) ?? widths[0] ?? printedWidth;
  try {
    const { stream } = await photos.openVariant(ctx, id, `${String(width)}.jpeg`);
    return [[id, await buffer(stream)]];
  } catch (error) {
    if (error instanceof Problem && error.slug === 'not-found') return [];
    throw error;
  }
}

export interface Printed {
  filename: string;
  content: Buffer;
}

/** A filed report on paper, for anyone who may read it. @throws Problem not-found. */
export async function printFiledReport(
  ctx: Ctx,
  id: string,
  { paper, units }: { paper: Paper; units: UnitSystem },
): Promise<Printed> {
  const report = await reports.getReport(ctx, id);
  const images = new Map((await Promise.all(report.photos.map((photo) => readImage(ctx, photo)))).flat());
  const content = await printReport(report, {
    paper,
    units,
    images,
    checkAddress: `${ctx.site.publicUrl}${sitePaths.checkCode(report.checkCode)}`,
  });
  return { filename: `survey-report-${report.checkCode}.pdf`, content };
}

/** The report of an order as an enclosure of a letter; nothing if there is none any more. */
export async function printForLetter(
  ctx: Ctx,
  orderId: string,
): Promise<{ filename: string; contentType: string; content: Buffer }[]> {
  const id = await reports.findReportIdOfOrder(ctx, orderId);
  if (id === undefined) return [];
  const printed = await printFiledReport(ctx, id, { paper: 'a4', units: 'imperial' });
  return [{ ...printed, contentType: 'application/pdf' }];
}
