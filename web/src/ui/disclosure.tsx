import type { ReactNode } from 'react';

/** More to read for who wants it. */
export function Disclosure({ summary, children }: { summary: ReactNode; children: ReactNode }) {
  return (
    <details className="border-b border-rule">
      <summary className="min-h-11 py-2.5 font-medium marker:text-copper">{summary}</summary>
      <div className="pb-4">{children}</div>
    </details>
  );
}
