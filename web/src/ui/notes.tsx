import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Mark } from './mark.tsx';

/** A caution where the act is. */
export function Caution({ title, children }: { title: string; children: ReactNode }) {
  return (
    <aside className="border border-l-8 border-ink border-l-brass bg-sheet px-4 py-3 text-[0.9375rem] leading-6">
      <strong className="font-medium">{title}</strong> {children}
    </aside>
  );
}

/** Something went as asked, or did not: said where the person is looking. */
export function Notice({
  kind = 'plain',
  children,
}: {
  kind?: 'plain' | 'good' | 'bad';
  children: ReactNode;
}) {
  const edge = { plain: 'border-l-slate', good: 'border-l-sound', bad: 'border-l-unfit' }[kind];
  return (
    <div
      role={kind === 'bad' ? 'alert' : 'status'}
      className={`border border-l-8 border-rule ${edge} bg-sheet px-4 py-3`}
    >
      {children}
    </div>
  );
}

/** A list with nothing in it says why, and what would put something there. */
export function Empty({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <div className="grid justify-items-start gap-2 border-y border-rule py-8">
      <span className="opacity-50">
        <Mark size={44} />
      </span>
      <p className="text-lg font-medium">{title}</p>
      {children && <div className="max-w-prose text-pencil">{children}</div>}
    </div>
  );
}

export interface Mistake {
  message: string;
  /** Id of the control, or the address of the step, where it is put right. */
  href?: string;
}

/** All that is wrong with a form, each leading to where it is put right. */
export function ErrorSummary({ title, mistakes }: { title: string; mistakes: readonly Mistake[] }) {
  if (mistakes.length === 0) return null;
  return (
    <div role="alert" className="border border-l-8 border-ink border-l-unfit bg-sheet px-4 py-3">
      <p className="font-medium">{title}</p>
      <ul className="mt-1 list-disc pl-5">
        {mistakes.map(({ message, href }) => (
          <li key={(href ?? '') + message}>
            {href === undefined ? (
              message
            ) : href.startsWith('#') ? (
              <a href={href} className="link">
                {message}
              </a>
            ) : (
              <Link to={href} className="link">
                {message}
              </Link>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
