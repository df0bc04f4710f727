import { ink } from './ink.ts';
import type { Sheets, Style } from './sheets.ts';

export interface PrintedColumn {
  head: string;
  /** Share of the width. */
  share: number;
  isNumber?: boolean;
}

const pad = 6;

/** A table ruled like a parts list. A row never breaks across sheets; the heads stand again on each. */
export function printTable(
  { doc, left, width, tag, need }: Sheets,
  columns: readonly PrintedColumn[],
  rows: readonly (readonly string[])[],
): void {
  const shares = columns.reduce((sum, { share }) => sum + share, 0);
  const widths = columns.map(({ share }) => (share / shares) * width);
  const lefts = widths.map((_, index) => left + widths.slice(0, index).reduce((sum, each) => sum + each, 0));
  const row = (cells: readonly string[], { size = 8.5, weight = 'regular', colour = 'ink' }: Style) => {
    doc.font(weight).fontSize(size);
    const heights = cells.map((cell, index) =>
      doc.heightOfString(cell || ' ', { width: (widths[index] ?? 0) - pad, lineGap: 1.5 }),
    );
    const height = Math.max(...heights) + 6;
    if (doc.y + height > doc.page.height - doc.page.margins.bottom) {
      doc.addPage();
      if (weight !== 'medium')
        row(
          columns.map(({ head }) => head),
          heads,
        );
    }
    const y = doc.y;
    tag('P', () => {
      for (const [index, cell] of cells.entries())
        doc
          .font(weight)
          .fontSize(size)
          .fillColor(ink[colour])
          .text(cell, lefts[index] ?? left, y + 2, {
            width: (widths[index] ?? 0) - pad,
            align: columns[index]?.isNumber === true ? 'right' : 'left',
            lineGap: 1.5,
            features: ['tnum'],
          });
    });
    doc.markContent('Artifact', { type: 'Layout' });
    doc
      .moveTo(left, y + height - 2)
      .lineTo(left + width, y + height - 2)
      .lineWidth(0.35)
      .strokeColor(ink.rule)
      .stroke();
    doc.endMarkedContent();
    doc.x = left;
    doc.y = y + height;
  };
  const heads: Style = { size: 7, weight: 'medium', colour: 'pencil' };
  need(50);
  if (columns.some(({ head }) => head !== ''))
    row(
      columns.map(({ head }) => head),
      heads,
    );
  for (const cells of rows) row(cells, {});
  doc.y += 4;
}
