/* oxlint-disable jsx-a11y/prefer-tag-over-role, jsx-a11y/click-events-have-key-events -- the ARIA combobox pattern: keys go through the input */
import { useId, useState } from 'react';
import { Field } from './field.tsx';

interface Option {
  id: string;
  label: string;
}

interface Props {
  label: string;
  hint?: string;
  error?: string | undefined;
  /** Words of what is chosen now. */
  chosen: string;
  options: readonly Option[];
  onType: (text: string) => void;
  onChoose: (id: string) => void;
}

/** A box to type in with a list to choose from, by mouse or keyboard (ARIA combobox pattern). */
export function Combobox({ label, hint, error, chosen, options, onType, onChoose }: Props) {
  const listId = useId();
  const [typed, setTyped] = useState<string>();
  const [active, setActive] = useState(0);
  const isOpen = typed !== undefined && options.length > 0;
  const choose = (option: Option | undefined) => {
    if (!option) return;
    onChoose(option.id);
    setTyped(undefined);
  };
  return (
    <Field label={label} hint={hint} error={error}>
      {(control) => (
        <div className="relative">
          <input
            {...control}
            role="combobox"
            aria-expanded={isOpen}
            aria-controls={listId}
            aria-autocomplete="list"
            aria-activedescendant={isOpen ? `${listId}-${String(active)}` : undefined}
            autoComplete="off"
            value={typed ?? chosen}
            onChange={(event) => {
              setTyped(event.target.value);
              setActive(0);
              onType(event.target.value);
            }}
            onBlur={() => {
              setTyped(undefined);
            }}
            onKeyDown={(event) => {
              if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
                event.preventDefault();
                const by = event.key === 'ArrowDown' ? 1 : -1;
                setActive((at) => (options.length === 0 ? 0 : (at + by + options.length) % options.length));
              } else if (event.key === 'Enter' && isOpen) {
                event.preventDefault();
                choose(options[active]);
              } else if (event.key === 'Escape') setTyped(undefined);
            }}
          />
          {isOpen && (
            // A select cannot be typed in and a datalist cannot be styled or followed by a screen reader.
            <div
              id={listId}
              role="listbox"
              aria-label={label}
              className="absolute z-20 mt-1 max-h-72 w-full overflow-y-auto border border-ink bg-sheet"
            >
              {options.map((option, index) => (
                // The keyboard reaches options through the input, as the pattern asks.
                <div
                  key={option.id}
                  id={`${listId}-${String(index)}`}
                  role="option"
                  tabIndex={-1}
                  aria-selected={index === active}
                  className={`min-h-11 cursor-pointer px-3 py-2 ${index === active ? 'bg-wash' : ''}`}
                  onMouseDown={(event) => {
                    event.preventDefault();
                  }}
                  onClick={() => {
                    choose(option);
                  }}
                >
                  {option.label}
                </div>
              ))}
            </div>
          )}
        </div>
      )}
    </Field>
  );
}
