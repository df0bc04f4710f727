import type { ReactNode } from 'react';

/** A large figure with its label; a dash where there is none. */
export function Figure({
  label,
  value,
  of,
  share,
}: {
  label: string;
  value: ReactNode;
  of?: string;
  share?: number | null;
}) {
  return (
    <div className="grid gap-1">
      <span className="text-label text-pencil">{label}</span>
      <span className="text-[2.75rem] leading-none font-medium tracking-tight">
        {value}
        {of && <span className="ml-1 text-xl font-normal tracking-normal text-pencil">{of}</span>}
      </span>
      {share !== undefined && (
        <svg viewBox="0 0 100 6" preserveAspectRatio="none" className="mt-1 h-1.5 w-full" aria-hidden="true">
          <rect width={100} height={6} className="fill-rule" />
          <rect width={Math.max(0, Math.min(100, share ?? 0))} height={6} className="fill-ink" />
        </svg>
      )}
    </div>
  );
}

/** Key figures as on a nameplate. Empty ones are left out by the caller. */
export function KeyFigures({
  items,
  columns = 2,
}: {
  items: readonly { label: string; value: ReactNode }[];
  columns?: 1 | 2 | 3;
}) {
  const across = { 1: '', 2: 'sm:grid-cols-2', 3: 'sm:grid-cols-2 lg:grid-cols-3' }[columns];
  return (
    <dl className={`grid gap-x-8 ${across}`}>
      {items.map(({ label, value }) => (
        <div key={label} className="flex items-baseline justify-between gap-4 border-b border-rule py-2">
          <dt className="text-pencil">{label}</dt>
          <dd className="text-right font-medium">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

/** The title block of a sheet, as on a drawing. */
export function TitleBlock({ items }: { items: readonly { label: string; value: ReactNode }[] }) {
  return (
    <dl className="mt-10 grid border border-ink bg-sheet sm:auto-cols-fr sm:grid-flow-col">
      {items.map(({ label, value }) => (
        <div
          key={label}
          className="border-t border-ink px-3.5 py-2 first:border-t-0 sm:border-t-0 sm:border-l sm:first:border-l-0"
        >
          <dt className="text-label text-pencil">{label}</dt>
          <dd className="leading-5 font-medium">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
