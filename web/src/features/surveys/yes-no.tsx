import { useId } from 'react';

interface Props {
  label: string;
  value: boolean | null;
  onChange: (value: boolean | null) => void;
  yes?: string;
  no?: string;
}

/** Yes, no, or not tried: the third is what stands until somebody says. */
export function YesNo({ label, value, onChange, yes = 'Yes', no = 'No' }: Props) {
  const name = useId();
  const choices = [
    { id: 'yes', words: yes, means: true },
    { id: 'no', words: no, means: false },
    { id: 'none', words: 'Not tried', means: null },
  ];
  return (
    <fieldset>
      <legend className="mb-1 font-medium">{label}</legend>
      <div className="grid grid-cols-3 rounded border border-ink bg-sheet">
        {choices.map(({ id, words, means }) => (
          <label
            key={id}
            className="relative grid min-h-11 place-items-center border-l border-rule px-1 text-center text-[0.9375rem] leading-5 first:border-l-0 has-checked:bg-ink has-checked:text-sheet has-focus-visible:outline-3 has-focus-visible:outline-copper"
          >
            <input
              type="radio"
              name={name}
              className="absolute inset-0 cursor-pointer opacity-0"
              checked={value === means}
              onChange={() => {
                onChange(means);
              }}
            />
            {words}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
