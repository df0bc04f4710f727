import type { PrintJob } from './job.ts';

/** The photographs, two to a row, each under what it shows. */
export function printPhotographs({ sheets, report, images }: PrintJob): void {
  const shown = report.photos.filter(({ id }) => images.has(id));
  if (shown.length === 0) return;
  const { doc, left, width } = sheets;
  sheets.heading(2, 'Photographs');
  const column = (width - 14) / 2;
  for (let index = 0; index < shown.length; index += 2) {
    const row = shown.slice(index, index + 2);
    const heights = row.map((photo) => Math.min(250, (column * photo.height) / photo.width));
    const height = Math.max(...heights);
    sheets.need(height + 34);
    const y = doc.y;
    for (const [place, photo] of row.entries()) {
      const x = left + place * (column + 14);
      sheets.tag(
        'Figure',
        () => {
          doc.image(images.get(photo.id) ?? Buffer.alloc(0), x, y, {
            fit: [column, height],
          });
        },
        photo.alt,
      );
      doc.y = y + height + 3;
      sheets.tag('P', () => {
        sheets.write(photo.alt, { size: 8, colour: 'pencil', x: x - left, width: column });
      });
    }
    doc.x = left;
    doc.y = y + height + 30;
  }
}
