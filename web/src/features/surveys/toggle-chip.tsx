import type { ReactNode } from 'react';

interface Props {
  isOn: boolean;
  onToggle: () => void;
  children: ReactNode;
}

/** One of several that may be on together. */
export function ToggleChip({ isOn, onToggle, children }: Props) {
  return (
    <label className="relative inline-flex min-h-11 items-center gap-2 rounded border border-ink bg-sheet px-3 py-1.5 text-[0.9375rem] leading-5 has-checked:bg-ink has-checked:text-sheet has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-copper">
      <input
        type="checkbox"
        className="absolute inset-0 cursor-pointer opacity-0"
        checked={isOn}
        onChange={onToggle}
      />
      {isOn && <span aria-hidden="true">✓</span>}
      {children}
    </label>
  );
}

/** A few that may be on together, under one question. */
export function ChipGroup({ legend, children }: { legend: string; children: ReactNode }) {
  return (
    <fieldset>
      <legend className="mb-2 font-medium">{legend}</legend>
      <div className="flex flex-wrap gap-2">{children}</div>
    </fieldset>
  );
}
