import type { ReactNode } from 'react';

/** What happened, in order, down a centre line. */
export function Timeline({
  items,
}: {
  items: readonly { id: string; when: string; what: ReactNode; more?: ReactNode }[];
}) {
  return (
    <ol className="ml-1.5 border-l border-copper">
      {items.map(({ id, when, what, more }) => (
        <li key={id} className="relative pb-4 pl-5 last:pb-0">
          <span
            aria-hidden="true"
            className="absolute top-2 -left-[5px] size-[9px] rounded-full border border-copper bg-paper"
          />
          <span className="block text-label text-pencil">{when}</span>
          <span className="block">{what}</span>
          {more && <span className="block text-sm text-pencil">{more}</span>}
        </li>
      ))}
    </ol>
  );
}
