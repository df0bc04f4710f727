import { useId } from 'react';
import { grades } from '#shared/surveys/record.ts';
import type { Grade } from '#shared/surveys/record.ts';
import { GradeMark } from '#web/ui/grade-mark.tsx';

interface Props {
  grade: Grade | null;
  onChange: (grade: Grade) => void;
}

const inSight = ['sound', 'serviceable', 'attention', 'unfit'] as const satisfies readonly Grade[];
/** Long words break where a person would break them. */
const narrow: Partial<Record<Grade, string>> = { serviceable: 'Service\u00ADable' };

/** The four grades, one tap each, big enough for a gloved thumb. */
export function GradePicker({ grade, onChange }: Props) {
  const name = useId();
  return (
    <fieldset>
      <legend className="sr-only">Grade</legend>
      <div className="grid grid-cols-4 border border-ink bg-sheet">
        {inSight.map((each) => (
          <label
            key={each}
            className="relative grid min-h-[74px] cursor-pointer content-start justify-items-center gap-1 border-l border-rule px-0.5 py-2 text-center text-[13px] leading-4 font-medium first:border-l-0 has-checked:bg-paper has-checked:shadow-[inset_0_0_0_3px_currentcolor] has-focus-visible:outline-3 has-focus-visible:outline-copper"
          >
            <input
              type="radio"
              className="absolute inset-0 cursor-pointer opacity-0"
              name={name}
              value={each}
              checked={grade === each}
              onChange={() => {
                onChange(each);
              }}
            />
            <GradeMark grade={each} size={24} />
            <span lang="en" className="hyphens-manual">
              {narrow[each] ?? grades[each]}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
