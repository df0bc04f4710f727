import { partsOf, weakestOf } from '#shared/surveys/parts.ts';
import type { BoilerPart } from '#shared/surveys/parts.ts';
import { jointOfBoiler, partsInputs } from '#shared/workings/from-boiler.ts';
import type { KnownBoiler } from '#shared/workings/from-boiler.ts';
import { jointSays } from '#shared/workings/joint-words.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Table } from '#web/ui/table.tsx';
import { WorkingLink } from './working-link.tsx';

/** What each pressure part stands against the claimed working pressure, and which governs. */
export function PartsTable({ boiler }: { boiler: KnownBoiler }) {
  const { show } = useUnits();
  const { facts } = boiler;
  const parts = partsOf(facts, boiler.items);
  const weakest = weakestOf(parts);
  const stands = ({ standsPa }: BoilerPart) =>
    standsPa === null ? 'Cannot say' : show('pressure', standsPa);
  const gaps = parts.filter(({ refusal }) => refusal !== null);
  return (
    <div className="grid gap-3">
      <Table
        caption="Pressure by parts"
        isCaptionHidden
        rows={parts}
        keyOf={({ id }) => id}
        columns={[
          {
            head: 'Part',
            cell: (part) => (
              <>
                {part.title}
                {part.id === weakest?.id && <span className="text-pencil"> (governs)</span>}
              </>
            ),
          },
          {
            head: 'Thickness or diameter',
            isNumber: true,
            cell: ({ thicknessMm }) => show('length', thicknessMm),
          },
          {
            head: 'Taken from',
            cell: ({ thicknessMm, isMeasured }) =>
              thicknessMm === null ? '–' : isMeasured ? 'Measured' : 'The seller',
          },
          { head: 'By calculation', isNumber: true, cell: stands },
        ]}
      />
      {gaps.length > 0 && (
        <ul>
          {gaps.map(({ id, title, refusal }) => (
            <li key={id}>
              {title}: {refusal?.text}
            </li>
          ))}
        </ul>
      )}
      <p>Joints: {jointSays({ jointMetal: jointOfBoiler(boiler), workingPa: facts.workingPressurePa })}</p>
      <p className="text-sm text-pencil">
        For {show('pressure', facts.workingPressurePa)} claimed. A calculation is no test: it speaks of
        figures, not of joints.{' '}
        <WorkingLink calculator="pressure-by-parts" inputs={partsInputs(boiler)} of="Pressure by parts">
          See every line
        </WorkingLink>
      </p>
    </div>
  );
}
