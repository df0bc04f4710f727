import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
import { useId } from 'react';
import { formatNumber } from '#web/lib/format.ts';
import { useWidth } from '#web/lib/use-width.ts';
import { Disclosure } from './disclosure.tsx';
import { Table } from './table.tsx';

export type Point = readonly [x: number, y: number];
interface Axis {
  label: string;
  unit: string;
}
interface Props {
  title: string;
  x: Axis;
  y: Axis;
  series: readonly { label: string; points: readonly Point[] }[];
  /** Points of the reader's own on the curves. */
  marks?: readonly { label: string; x: number; y: number }[];
  /** Heights to compare with. */
  levels?: readonly { label: string; y: number }[];
  /** A stretch of the x axis to look at. */
  stretch?: { label: string; from: number; to: number };
  /** The points were read, not worked out: each is shown, and each is in the table. */
  isRead?: boolean;
}

const margin = { top: 14, right: 14, bottom: 46, left: 58 };
const dashes = ['', '7 4', '2 4'];

const named = ({ label, unit }: Axis): string => (unit === '' ? label : `${label}, ${unit}`);

/** Rows of a table that says what the plot shows: every curve at the same dozen places. */
function rowsOf(series: Props['series'], isRead: boolean): { x: number; ys: (number | null)[] }[] {
  const first = series[0]?.points ?? [];
  const step = isRead ? 1 : Math.max(1, Math.round(first.length / 12));
  return first
    .filter((_, index) => index % step === 0 || index === first.length - 1)
    .map(([x]) => ({
      x,
      ys: series.map(({ points }) => points.find(([at]) => at === x)?.[1] ?? null),
    }));
}

/** Four figures are as many as a reader wants of a point on a curve. */
const figure = (value: number): string => formatNumber(Number(value.toPrecision(4)), 4);

/** A plot drawn like one on a sheet, with the same figures in a table below for those who cannot see it. */
export function Plot({ title, x, y, series, marks = [], levels = [], stretch, isRead = false }: Props) {
  const [box, width] = useWidth<HTMLDivElement>(640);
  const id = useId();
  const height = Math.round(Math.min(420, Math.max(260, width * 0.55)));
  const points = series.flatMap((each) => each.points);
  const xs = [...points.map((point) => point[0]), ...marks.map((mark) => mark.x)];
  const ys = [
    ...points.map((point) => point[1]),
    ...marks.map((mark) => mark.y),
    ...levels.map((level) => level.y),
  ];
  if (points.length === 0) return null;
  const [leastX, mostX, leastY, mostY] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  // A curve that is nowhere near nought would be a line along the top if it were drawn from there.
  const floor = leastY > mostY * 0.55 ? leastY - (mostY - leastY) * 0.1 : Math.min(0, leastY);
  const across = scaleLinear([leastX, mostX], [margin.left, width - margin.right]);
  const up = scaleLinear([floor, mostY], [height - margin.bottom, margin.top]).nice();
  const path = line<Point>(
    (point) => across(point[0]),
    (point) => up(point[1]),
  );
  const ticksX = across.ticks(Math.max(3, Math.round(width / 110)));
  const ticksY = up.ticks(5);
  const [bottom, right] = [height - margin.bottom, width - margin.right];
  return (
    <figure className="break-inside-avoid">
      <figcaption className="mb-1 font-medium">{title}</figcaption>
      <div ref={box}>
        <svg width={width} height={height} role="img" aria-labelledby={`${id}-title`} className="max-w-full">
          <title id={`${id}-title`}>
            {`${title}: ${named(y)} against ${named(x)}. The figures are in the table below.`}
          </title>
          <g className="fill-pencil text-[0.75rem]">
            {ticksX.map((tick) => (
              <g key={tick}>
                <line
                  x1={across(tick)}
                  x2={across(tick)}
                  y1={margin.top}
                  y2={bottom}
                  className="stroke-rule"
                />
                <text x={across(tick)} y={bottom + 16} textAnchor="middle">
                  {figure(tick)}
                </text>
              </g>
            ))}
            {ticksY.map((tick) => (
              <g key={tick}>
                <line x1={margin.left} x2={right} y1={up(tick)} y2={up(tick)} className="stroke-rule" />
                <text x={margin.left - 7} y={up(tick) + 4} textAnchor="end">
                  {figure(tick)}
                </text>
              </g>
            ))}
            <text x={(margin.left + right) / 2} y={height - 8} textAnchor="middle">
              {named(x)}
            </text>
            <text
              transform={`translate(13 ${String((margin.top + bottom) / 2)}) rotate(-90)`}
              textAnchor="middle"
            >
              {named(y)}
            </text>
          </g>
          {stretch && (
            <rect
              x={across(stretch.from)}
              y={margin.top}
              width={Math.max(0, across(stretch.to) - across(stretch.from))}
              height={bottom - margin.top}
              className="fill-wash"
            />
          )}
          {stretch && (
            <text
              x={(across(stretch.from) + across(stretch.to)) / 2}
              y={bottom - 8}
              textAnchor="middle"
              className="fill-ink text-[0.8125rem]"
            >
              {stretch.label}
            </text>
          )}
          <path
            d={`M${String(margin.left)} ${String(margin.top)}V${String(bottom)}H${String(right)}`}
            className="fill-none stroke-ink"
          />
          {levels.map((level, index) => (
            <g key={level.label}>
              <line
                x1={margin.left}
                x2={right}
                y1={up(level.y)}
                y2={up(level.y)}
                strokeWidth={1.5}
                strokeDasharray={index === 0 ? '10 4' : '3 3'}
                className="stroke-copper"
              />
              <text
                x={index % 2 === 0 ? right - 4 : margin.left + 4}
                // Of two near one another, the first is named from below.
                y={up(level.y) + (index === 0 && levels.length > 1 ? 15 : -5)}
                textAnchor={index % 2 === 0 ? 'end' : 'start'}
                className="fill-copper text-[0.8125rem] font-medium"
              >
                {level.label}
              </text>
            </g>
          ))}
          {series.map((each, index) => (
            <path
              key={each.label}
              d={path(each.points) ?? ''}
              strokeWidth={2}
              strokeDasharray={dashes[index % dashes.length]}
              strokeLinejoin="round"
              className="fill-none stroke-ink"
            />
          ))}
          {isRead &&
            series.flatMap((each) =>
              each.points.map((point) => (
                <circle
                  key={`${each.label}${String(point[0])}`}
                  cx={across(point[0])}
                  cy={up(point[1])}
                  r={3}
                  className="fill-ink"
                />
              )),
            )}
          {marks.map((mark) => (
            <g key={mark.label}>
              <circle
                cx={across(mark.x)}
                cy={up(mark.y)}
                r={6}
                strokeWidth={2}
                className="fill-sheet stroke-copper"
              />
              <circle cx={across(mark.x)} cy={up(mark.y)} r={2} className="fill-copper" />
              <text
                x={across(mark.x) + (across(mark.x) > (margin.left + right) / 2 ? -11 : 11)}
                y={up(mark.y) + (up(mark.y) > bottom - 30 ? -10 : 18)}
                textAnchor={across(mark.x) > (margin.left + right) / 2 ? 'end' : 'start'}
                className="fill-ink text-[0.8125rem] font-medium"
              >
                {mark.label}
              </text>
            </g>
          ))}
        </svg>
      </div>
      {series.length > 1 && (
        <ul className="flex flex-wrap gap-x-6 text-sm">
          {series.map(({ label }, index) => (
            <li key={label} className="flex items-center gap-2">
              <svg width={32} height={8} aria-hidden="true">
                <path
                  d="M0 4H32"
                  strokeWidth={2}
                  strokeDasharray={dashes[index % dashes.length]}
                  className="stroke-ink"
                />
              </svg>
              {label}
            </li>
          ))}
        </ul>
      )}
      <div className="no-print mt-2">
        <Disclosure summary="The same in figures">
          <Table
            caption={title}
            isCaptionHidden
            rows={rowsOf(series, isRead)}
            keyOf={(row) => String(row.x)}
            columns={[
              { head: named(x), isNumber: true, cell: (row) => figure(row.x) },
              ...series.map(({ label }, index) => ({
                head: series.length > 1 ? `${label}, ${y.unit}` : named(y),
                isNumber: true,
                cell: (row: { ys: (number | null)[] }) => {
                  const value = row.ys[index] ?? null;
                  return value === null ? '–' : figure(value);
                },
              })),
            ]}
          />
          {(marks.length > 0 || levels.length > 0) && (
            <ul className="mt-2 text-sm">
              {marks.map((mark) => (
                <li key={mark.label}>
                  {mark.label}: {figure(mark.x)} {x.unit}, {figure(mark.y)} {y.unit}
                </li>
              ))}
              {levels.map((level) => (
                <li key={level.label}>
                  {level.label}: {figure(level.y)} {y.unit}
                </li>
              ))}
            </ul>
          )}
        </Disclosure>
      </div>
    </figure>
  );
}
