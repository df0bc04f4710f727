import { balloonRadius, drawingOf } from '#shared/drawings/index.ts';
import type { StrokeKind } from '#shared/drawings/drawing.ts';
import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import type { Grade } from '#shared/surveys/record.ts';
import { rubricOf } from '#shared/surveys/rubric/index.ts';
import { ink } from './ink.ts';
import type { Ink } from './ink.ts';
import { drawMark } from './marks.ts';
import type { Sheets } from './sheets.ts';

const pens: Readonly<Record<StrokeKind, { weight: number; colour: Ink; dash?: number }>> = {
  outline: { weight: 1.6, colour: 'ink' },
  thin: { weight: 0.9, colour: 'ink' },
  hidden: { weight: 0.9, colour: 'ink', dash: 5 },
  centre: { weight: 0.7, colour: 'copper', dash: 8 },
  cut: { weight: 1.1, colour: 'ink' },
  water: { weight: 0.9, colour: 'slate' },
};
/** Cut metal, washed with copper where the screen hatches it. */
const cutWash = '#e6c9b4';

/** The general arrangement with the grade of each item in its balloon, as vectors. */
export function printDrawing(
  { doc, left, width, need, tag }: Sheets,
  facts: BoilerFacts,
  rubricVersion: string,
  grades: ReadonlyMap<string, Grade>,
): void {
  const drawing = drawingOf(facts, rubricOf(rubricVersion));
  const scale = width / drawing.width;
  need(drawing.height * scale + 8);
  const y0 = doc.y;
  const draw = () => {
    doc.save().translate(left, y0).scale(scale);
    doc.lineJoin('round').lineCap('round');
    for (const { d, kind } of drawing.strokes) {
      const { weight, colour, dash } = pens[kind];
      doc.lineWidth(weight).strokeColor(ink[colour]);
      if (dash !== undefined) doc.dash(dash, { space: dash / 3 });
      doc.path(d);
      if (kind === 'cut') doc.fillColor(cutWash).fillAndStroke('even-odd');
      else doc.stroke();
      if (dash !== undefined) doc.undash();
    }
    for (const { x, y, to } of drawing.balloons)
      if (to !== null) {
        doc.moveTo(x, y).lineTo(to[0], to[1]).lineWidth(0.5).strokeColor(ink.pencil).stroke();
        doc.circle(to[0], to[1], 1.8).fillColor(ink.pencil).fill();
      }
    for (const { criterionId, number, x, y } of drawing.balloons) {
      doc
        .circle(x, y, balloonRadius)
        .lineWidth(0.9)
        .fillColor('#ffffff')
        .strokeColor(ink.ink)
        .fillAndStroke();
      doc.font('medium').fontSize(11).fillColor(ink.ink);
      doc.text(String(number), x - balloonRadius, y - 6.5, {
        width: 2 * balloonRadius,
        align: 'center',
        lineBreak: false,
      });
      const grade = grades.get(criterionId);
      if (grade === undefined) continue;
      const markX = x + (x < drawing.width / 2 ? -11 : 11);
      doc
        .circle(markX, y + 10, 7)
        .fillColor('#ffffff')
        .fill();
      drawMark(doc, grade, markX, y + 10, 5.5);
    }
    doc.restore();
  };
  tag('Figure', draw, 'General arrangement with the grade of each item; the items are listed below.');
  doc.x = left;
  doc.y = y0 + drawing.height * scale + 6;
}
