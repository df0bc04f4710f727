import type { Finding } from '#shared/surveys/record.ts';
import type { Criterion } from '#shared/surveys/rubric/types.ts';
import { toggleWay } from './record-edits.ts';
import type { Edit } from './record-edits.ts';
import { ChipGroup, ToggleChip } from './toggle-chip.tsx';

interface Props {
  criterion: Criterion;
  finding: Finding | undefined;
  edit: (change: Edit) => void;
}

/** How it was examined, weakest way first; more than one makes surer. */
export function WayPicker({ criterion, finding, edit }: Props) {
  return (
    <ChipGroup legend="Examined">
      {criterion.ways.map((way) => (
        <ToggleChip
          key={way.id}
          isOn={finding?.ways.includes(way.id) ?? false}
          onToggle={() => {
            edit(toggleWay(criterion.id, way.id));
          }}
        >
          {way.label}
        </ToggleChip>
      ))}
    </ChipGroup>
  );
}
