import type { ReactNode } from 'react';

export interface Column<Row> {
  head: string;
  cell: (row: Row) => ReactNode;
  isNumber?: boolean;
}

interface Props<Row> {
  caption: string;
  isCaptionHidden?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  keyOf: (row: Row, index: number) => string;
  /** Many columns: on a phone they keep their width and are scrolled to, rather than squeezed. */
  isWide?: boolean;
}

/** A table that reads like a parts list; on a phone it scrolls within itself. */
export function Table<Row>({
  caption,
  isCaptionHidden = false,
  columns,
  rows,
  keyOf,
  isWide = false,
}: Props<Row>) {
  return (
    // A region that scrolls must be reachable by keyboard, or its far columns are not.
    // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex
    <section className="overflow-x-auto" tabIndex={0} aria-label={caption}>
      <table className={`w-full border-collapse text-[0.9375rem] leading-6 ${isWide ? 'min-w-[56rem]' : ''}`}>
        <caption className={isCaptionHidden ? 'sr-only' : 'pb-2 text-left text-label text-pencil'}>
          {caption}
        </caption>
        <thead>
          <tr>
            {columns.map(({ head, isNumber }) => (
              <th
                key={head}
                scope="col"
                className={`border-b border-rule py-2 pr-4 text-label text-pencil last:pr-0 ${isNumber ? 'text-right' : 'text-left'}`}
              >
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, index) => (
            <tr key={keyOf(row, index)}>
              {columns.map(({ head, cell, isNumber }) => (
                <td
                  key={head}
                  className={`border-b border-rule py-2.5 pr-4 align-top last:pr-0 ${isNumber ? 'text-right whitespace-nowrap' : ''}`}
                >
                  {cell(row)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
