import { createRequire } from 'node:module';
import PdfDocument from 'pdfkit';
import QRCode from 'qrcode';
import type { Instant } from '#shared/time.ts';
import { ink } from './ink.ts';
import type { Ink } from './ink.ts';

export const papers = ['a4', 'letter'] as const;
export type Paper = (typeof papers)[number];

/** What stands in the title block of every sheet. */
export interface BlockCell {
  label: string;
  value: string;
  /** Share of the width; 1 by default. */
  share?: number;
}

interface Options {
  paper: Paper;
  title: string;
  /** One line under the title of the document's properties. */
  subject: string;
  block: readonly BlockCell[];
  /** The address that the square code in the title block leads to. */
  codeAddress: string;
  /** When the document was made. */
  at: Instant;
}

type Doc = InstanceType<typeof PdfDocument>;
/** What a part of the document is, to a reader that cannot see it. */
type Tag = 'H1' | 'H2' | 'H3' | 'P' | 'L' | 'Figure' | 'Table' | 'Note';

const require = createRequire(import.meta.url);
const fontFile = (weight: 400 | 500 | 700): string =>
  require.resolve(`@fontsource/dm-sans/files/dm-sans-latin-${String(weight)}-normal.woff`);
export type Weight = 'regular' | 'medium' | 'bold';

const side = 42;
const top = 40;
const blockHeight = 48;
const foot = 26;

/** Sheets of paper to print a document on: text that flows, a title block on each, tags and bookmarks throughout. */
export interface Sheets {
  doc: Doc;
  /** Left edge and width of what is printed on, points. */
  left: number;
  width: number;
  /** Puts something on the sheet as one tagged part. */
  tag: (tag: Tag, draw: () => void, alt?: string) => void;
  /** Goes to a new sheet unless so much height is left on this one. */
  need: (height: number) => void;
  gap: (height: number) => void;
  write: (text: string, style?: Style) => void;
  heading: (level: 1 | 2 | 3, text: string) => void;
  rule: (colour?: Ink) => void;
  /** Numbers the sheets, draws their title blocks and gives the file. */
  finish: () => Promise<Buffer>;
}

export interface Style {
  size?: number;
  weight?: Weight;
  colour?: Ink;
  /** Set in from the left edge, and the width it may have; the whole width by default. */
  x?: number;
  width?: number;
  align?: 'left' | 'right' | 'center';
  lineGap?: number;
}

/** Opens a document with DM Sans, in English, with its title shown by readers. */
export function openSheets(options: Options): Sheets {
  const { paper, title, subject, at } = options;
  const doc = new PdfDocument({
    size: paper === 'a4' ? 'A4' : 'LETTER',
    margins: { left: side, right: side, top, bottom: foot + blockHeight + 14 },
    bufferPages: true,
    tagged: true,
    lang: 'en-GB',
    displayTitle: true,
    pdfVersion: '1.7',
    info: { Title: title, Subject: subject, Author: 'Tubeplate', CreationDate: new Date(at) },
  });
  const chunks: Buffer[] = [];
  doc.on('data', (chunk: Buffer) => chunks.push(chunk));
  const done = new Promise<Buffer>((resolve) => {
    doc.on('end', () => {
      resolve(Buffer.concat(chunks));
    });
  });
  doc.registerFont('regular', fontFile(400));
  doc.registerFont('medium', fontFile(500));
  doc.registerFont('bold', fontFile(700));

  const root = doc.struct('Document');
  doc.addStructure(root);
  const left = side;
  const width = doc.page.width - 2 * side;
  const bottom = () => doc.page.height - doc.page.margins.bottom;

  const tag: Sheets['tag'] = (kind, draw, alt) => {
    root.add(doc.struct(kind, alt === undefined ? {} : { alt }, draw));
  };
  const need: Sheets['need'] = (height) => {
    if (doc.y + height > bottom()) doc.addPage();
  };
  const write: Sheets['write'] = (text, style = {}) => {
    const { size = 9.5, weight = 'regular', colour = 'ink', x = 0, align = 'left', lineGap = 2.2 } = style;
    doc
      .font(weight)
      .fontSize(size)
      .fillColor(ink[colour])
      .text(text, left + x, doc.y, {
        width: style.width ?? width - x,
        align,
        lineGap,
        features: ['tnum'],
      });
  };
  const heading: Sheets['heading'] = (level, text) => {
    const size = { 1: 21, 2: 14, 3: 10.5 }[level];
    need(level === 3 ? 40 : 70);
    if (level < 3 && doc.y > top + 4) doc.y += level === 2 ? 12 : 0;
    if (level === 2) doc.outline.addItem(text);
    tag(`H${String(level)}` as 'H1' | 'H2' | 'H3', () => {
      write(text, { size, weight: 'bold', lineGap: 0 });
    });
    doc.y += 3;
    if (level === 2) rule('ink');
  };
  const rule = (colour: Ink = 'rule') => {
    doc.markContent('Artifact', { type: 'Layout' });
    doc
      .moveTo(left, doc.y)
      .lineTo(left + width, doc.y)
      .lineWidth(0.5)
      .strokeColor(ink[colour])
      .stroke();
    doc.endMarkedContent();
    doc.y += 5;
  };
  return {
    doc,
    left,
    width,
    tag,
    need,
    gap: (height) => {
      doc.y += height;
    },
    write,
    heading,
    rule,
    finish: () => {
      root.end();
      const { start, count } = doc.bufferedPageRange();
      for (let index = start; index < start + count; index += 1) {
        doc.switchToPage(index);
        drawBlock(doc, options, `${String(index - start + 1)} of ${String(count)}`);
      }
      doc.end();
      return done;
    },
  };
}

/** The title block at the foot of a sheet, as on a drawing; a fixture of the page, which readers aloud pass over. */
function drawBlock(doc: Doc, { block, codeAddress }: Options, sheet: string): void {
  const left = side;
  const y = doc.page.height - foot - blockHeight;
  const width = doc.page.width - 2 * side;
  const cells = [...block, { label: 'Sheet', value: sheet, share: 0.8 }];
  const shares = cells.reduce((sum, { share = 1 }) => sum + share, 0);
  const one = (width - blockHeight) / shares;
  // The block lies below the margin, where text would otherwise start another sheet.
  const { bottom } = doc.page.margins;
  doc.page.margins.bottom = 0;
  doc.markContent('Artifact', { type: 'Pagination' });
  doc.lineWidth(0.7).strokeColor(ink.ink).rect(left, y, width, blockHeight).stroke();
  let x = left;
  for (const [index, { label, value, share = 1 }] of cells.entries()) {
    const each = share * one;
    if (index > 0)
      doc
        .moveTo(x, y)
        .lineTo(x, y + blockHeight)
        .stroke();
    doc
      .font('medium')
      .fontSize(6)
      .fillColor(ink.pencil)
      .text(label, x + 5, y + 5, { width: each - 8 });
    doc
      .font('medium')
      .fontSize(8)
      .fillColor(ink.ink)
      .text(value, x + 5, y + 14, {
        width: each - 8,
        height: blockHeight - 16,
        ellipsis: true,
        features: ['tnum'],
      });
    x += each;
  }
  drawCode(doc, codeAddress, left + width - blockHeight + 4, y + 4, blockHeight - 8);
  doc
    .moveTo(left + width - blockHeight, y)
    .lineTo(left + width - blockHeight, y + blockHeight)
    .stroke();
  doc.endMarkedContent();
  doc.page.margins.bottom = bottom;
}

/** A square code, as vectors. */
function drawCode(doc: Doc, address: string, x: number, y: number, size: number): void {
  const { modules } = QRCode.create(address, { errorCorrectionLevel: 'M' });
  const cell = size / modules.size;
  for (let row = 0; row < modules.size; row += 1)
    for (let column = 0; column < modules.size; column += 1)
      if (modules.get(row, column)) doc.rect(x + column * cell, y + row * cell, cell, cell);
  doc.fillColor('#000').fill();
}
