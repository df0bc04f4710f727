import type PdfDocument from 'pdfkit';
import type { Grade } from '#shared/surveys/record.ts';
import { ink } from './ink.ts';
import type { Ink } from './ink.ts';

type Doc = InstanceType<typeof PdfDocument>;

export const inkOfGrade: Readonly<Record<Grade, Ink>> = {
  sound: 'sound',
  serviceable: 'serviceable',
  attention: 'attention',
  unfit: 'unfit',
  notExamined: 'slate',
  notFitted: 'pencil',
};

/** The mark of a grade, as on the drawing: shape as well as colour. `x` and `y` are its centre. */
export function drawMark(doc: Doc, grade: Grade, x: number, y: number, radius = 4): void {
  const colour = ink[inkOfGrade[grade]];
  doc
    .lineWidth(radius / 4.5)
    .strokeColor(colour)
    .fillColor(colour);
  switch (grade) {
    case 'sound':
      doc.circle(x, y, radius).fill();
      break;
    case 'serviceable':
      doc.circle(x, y, radius).stroke();
      doc.circle(x, y, radius * 0.42).fill();
      break;
    case 'attention':
      doc.circle(x, y, radius).stroke();
      doc
        .path(
          `M${String(x)} ${String(y - radius)}A${String(radius)} ${String(radius)} 0 0 1 ${String(x)} ${String(y + radius)}Z`,
        )
        .fill();
      break;
    case 'unfit': {
      const arm = radius * 0.66;
      doc.circle(x, y, radius).stroke();
      doc.moveTo(x - arm, y - arm).lineTo(x + arm, y + arm);
      doc
        .moveTo(x + arm, y - arm)
        .lineTo(x - arm, y + arm)
        .stroke();
      break;
    }
    case 'notExamined':
      doc.circle(x, y, radius).dash(1.6, { space: 1.3 }).stroke().undash();
      break;
    case 'notFitted':
      doc
        .moveTo(x - radius, y)
        .lineTo(x + radius, y)
        .stroke();
      break;
    default:
      grade satisfies never;
  }
}
