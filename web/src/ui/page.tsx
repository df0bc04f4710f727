import { useEffect } from 'react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

export interface Crumb {
  label: string;
  to?: string;
}

interface Props {
  title: string;
  sub?: ReactNode;
  crumbs?: readonly Crumb[];
  /** Stands to the right of the heading on a wide page. */
  aside?: ReactNode;
  children: ReactNode;
  isNarrow?: boolean;
}

/** A page's head and body; sets the document's title. */
export function Page({ title, sub, crumbs, aside, children, isNarrow = false }: Props) {
  useEffect(() => {
    document.title = `${title} · Tubeplate`;
  }, [title]);
  return (
    <div className={`mx-auto w-full px-4 pt-5 pb-16 sm:px-6 ${isNarrow ? 'max-w-2xl' : 'max-w-[76rem]'}`}>
      {crumbs && (
        <nav aria-label="You are here" className="mb-1 text-sm text-pencil">
          <ol className="flex flex-wrap gap-x-2">
            {crumbs.map((crumb, index) => (
              <li key={crumb.label} className="flex min-h-6 items-center gap-2">
                {index > 0 && <span aria-hidden="true">/</span>}
                {crumb.to ? (
                  <Link to={crumb.to} className="py-0.5 underline-offset-4 hover:underline">
                    {crumb.label}
                  </Link>
                ) : (
                  crumb.label
                )}
              </li>
            ))}
          </ol>
        </nav>
      )}
      <div className="mb-6 flex flex-wrap items-end justify-between gap-x-8 gap-y-3">
        <div className="min-w-0 max-w-3xl">
          <h1>{title}</h1>
          {sub && <div className="mt-1.5 text-pencil">{sub}</div>}
        </div>
        {aside}
      </div>
      {children}
    </div>
  );
}

/** A part of a page under its own heading. */
export function Section({
  title,
  children,
  aside,
  id,
}: {
  title: string;
  children: ReactNode;
  aside?: ReactNode;
  id?: string;
}) {
  return (
    <section className="mt-10 first:mt-0" aria-label={title} id={id}>
      <div className="mb-3 flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 border-b border-ink pb-2">
        <h2>{title}</h2>
        {aside}
      </div>
      {children}
    </section>
  );
}
