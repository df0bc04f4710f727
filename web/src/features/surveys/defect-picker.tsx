import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { bandOf } from '#shared/surveys/allowance.ts';
import type { Finding } from '#shared/surveys/record.ts';
import type { Criterion } from '#shared/surveys/rubric/types.ts';
import { DefectDetails } from './defect-details.tsx';
import { changeDefect, toggleDefect } from './record-edits.ts';
import type { Edit } from './record-edits.ts';
import { ChipGroup, ToggleChip } from './toggle-chip.tsx';

interface Props {
  criterion: Criterion;
  finding: Finding | undefined;
  facts: BoilerFacts;
  edit: (change: Edit) => void;
}

/** The catalogue of an item: one tap names a defect; what it usually means is shown, and may be overridden. */
export function DefectPicker({ criterion, finding, facts, edit }: Props) {
  const found = finding?.defects ?? [];
  return (
    <div className="grid gap-3">
      <ChipGroup legend="Defects">
        {criterion.defects.map((spec) => (
          <ToggleChip
            key={spec.code}
            isOn={found.some(({ code }) => code === spec.code)}
            onToggle={() => {
              edit(toggleDefect(criterion.id, spec));
            }}
          >
            {spec.label}
          </ToggleChip>
        ))}
      </ChipGroup>
      {criterion.defects.map((spec) => {
        const defect = found.find(({ code }) => code === spec.code);
        if (defect === undefined) return null;
        return (
          <DefectDetails
            key={spec.code}
            spec={spec}
            defect={defect}
            band={bandOf(spec, facts.material)}
            onChange={(change) => {
              edit(changeDefect(criterion.id, spec.code, change));
            }}
          />
        );
      })}
    </div>
  );
}
