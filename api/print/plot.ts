import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
import { figureText } from '#shared/engineering/quantities.ts';
import { ink } from './ink.ts';
import type { Sheets } from './sheets.ts';

type Point = readonly [x: number, y: number];

export interface PrintedPlot {
  title: string;
  x: string;
  y: string;
  points: readonly Point[];
  levels: readonly { label: string; y: number }[];
  /** A stretch of the curve to look at, in x. */
  stretch?: { label: string; from: number; to: number } | null;
}

const height = 190;
const margin = { left: 44, right: 8, top: 16, bottom: 34 };

/** Draws a plot as vectors. The figures stand in a table beside it. */
export function drawPlot({ doc, left, width, tag, need }: Sheets, plot: PrintedPlot): void {
  if (plot.points.length === 0) return;
  need(height + 10);
  const y0 = doc.y;
  const xs = plot.points.map((point) => point[0]);
  const ys = [...plot.points.map((point) => point[1]), ...plot.levels.map((level) => level.y)];
  const across = scaleLinear(
    [Math.min(...xs), Math.max(...xs, Math.min(...xs) + 1)],
    [left + margin.left, left + width - margin.right],
  );
  const up = scaleLinear([0, Math.max(...ys)], [y0 + height - margin.bottom, y0 + margin.top]).nice();
  const bottom = y0 + height - margin.bottom;
  const right = left + width - margin.right;
  const label = (text: string, x: number, y: number, align: 'left' | 'right' | 'center', w = 60) => {
    const at = align === 'right' ? x - w : align === 'center' ? x - w / 2 : x;
    doc.text(text, at, y, { width: w, align, lineBreak: false, features: ['tnum'] });
  };
  const draw = () => {
    if (plot.stretch) {
      const from = across(plot.stretch.from);
      doc
        .rect(from, y0 + margin.top, across(plot.stretch.to) - from, bottom - y0 - margin.top)
        .fillColor('#f3e4d3')
        .fill();
    }
    doc.font('regular').fontSize(7).fillColor(ink.pencil).lineWidth(0.35).strokeColor(ink.rule);
    for (const tick of across.ticks(8)) {
      doc
        .moveTo(across(tick), y0 + margin.top)
        .lineTo(across(tick), bottom)
        .stroke();
      label(figureText(tick), across(tick), bottom + 4, 'center');
    }
    for (const tick of up.ticks(5)) {
      doc
        .moveTo(left + margin.left, up(tick))
        .lineTo(right, up(tick))
        .stroke();
      label(figureText(tick), left + margin.left - 5, up(tick) - 4, 'right', 36);
    }
    label(plot.x, (left + margin.left + right) / 2, bottom + 16, 'center', 160);
    label(plot.y, left, y0, 'left', 120);
    doc
      .moveTo(left + margin.left, y0 + margin.top)
      .lineTo(left + margin.left, bottom)
      .lineTo(right, bottom)
      .lineWidth(0.5)
      .strokeColor(ink.ink)
      .stroke();
    for (const [index, level] of plot.levels.entries()) {
      doc.moveTo(left + margin.left, up(level.y)).lineTo(right, up(level.y));
      doc.lineWidth(0.7).strokeColor(ink.copper).dash(6, { space: 3 }).stroke().undash();
      doc.fillColor(ink.copper).font('medium');
      // Two heights close together are named at opposite ends.
      if (index % 2 === 0) label(level.label, right - 3, up(level.y) + 2, 'right', 160);
      else label(level.label, left + margin.left + 4, up(level.y) - 9, 'left', 160);
    }
    const path = line<Point>(
      (point) => across(point[0]),
      (point) => up(point[1]),
    )(plot.points);
    doc
      .lineWidth(1.2)
      .strokeColor(ink.ink)
      .lineJoin('round')
      .path(path ?? '')
      .stroke();
    for (const point of plot.points)
      doc.circle(across(point[0]), up(point[1]), 1.8).fillColor(ink.ink).fill();
  };
  tag('Figure', draw, `${plot.title}: ${plot.y} against ${plot.x}. The same figures are in the table below.`);
  doc.x = left;
  doc.y = y0 + height;
}
