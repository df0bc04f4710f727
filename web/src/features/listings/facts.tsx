import {
  constructions,
  firings,
  fittings,
  materials,
  paperKinds,
  pressureEvidence,
  yearSureness,
} from '#shared/boilers/boiler.ts';
import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { boilerTypeOf } from '#shared/boilers/boiler-types.ts';
import { formatDay, formatNumber } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { KeyFigures } from '#web/ui/figures.tsx';

/** What the seller says the boiler is, as on a nameplate. */
export function Nameplate({ facts }: { facts: BoilerFacts }) {
  const { show } = useUnits();
  const year =
    facts.builtYear === null
      ? null
      : `${String(facts.builtYear)}, ${yearSureness[facts.builtYearSureness].toLowerCase()}`;
  return (
    <KeyFigures
      columns={1}
      items={[
        { label: 'Type', value: boilerTypeOf(facts.type).label },
        { label: 'Material', value: materials[facts.material] },
        { label: 'Joints', value: constructions[facts.construction] },
        { label: 'Claimed working pressure', value: show('pressure', facts.workingPressurePa) },
        { label: 'Which rests on', value: pressureEvidence[facts.pressureEvidence] },
        { label: 'Water capacity', value: show('volume', facts.waterCapacityL) },
        { label: 'Firing', value: firings[facts.firing] },
        { label: 'Builder', value: facts.builder ?? 'Not known' },
        { label: 'Built', value: year ?? 'Not known' },
      ]}
    />
  );
}

const sizes = [
  ['barrelOutsideDiameterMm', 'Barrel, outside'],
  ['barrelLengthMm', 'Barrel, length'],
  ['barrelThicknessMm', 'Barrel, thickness'],
  ['endPlateThicknessMm', 'End plates, thickness'],
  ['flueDiameterMm', 'Flue, inside'],
  ['flueThicknessMm', 'Flue, thickness'],
  ['tubeDiameterMm', 'Tubes, outside'],
  ['tubeThicknessMm', 'Tubes, thickness'],
  ['overallHeightMm', 'Height over all'],
] as const;

/** Sizes that are known, in the reader's units. */
export function Sizes({ facts }: { facts: BoilerFacts }) {
  const { show } = useUnits();
  const { dimensions } = facts;
  const lengths = sizes
    .filter(([name]) => dimensions[name] !== null)
    .map(([name, label]) => ({ label, value: show('length', dimensions[name]) }));
  return (
    <KeyFigures
      items={[
        ...lengths,
        ...(dimensions.tubeCount === null
          ? []
          : [{ label: 'Tubes', value: formatNumber(dimensions.tubeCount) }]),
        ...(dimensions.heatingSurfaceM2 === null
          ? []
          : [{ label: 'Heating surface', value: show('surface', dimensions.heatingSurfaceM2) }]),
        ...(dimensions.weightKg === null
          ? []
          : [{ label: 'Weight', value: show('mass', dimensions.weightKg) }]),
      ]}
    />
  );
}

/** Fittings and papers as the seller states them. A paper is of a date; only the inspector says what it is good for. */
export function FittingsAndPapers({ facts }: { facts: BoilerFacts }) {
  return (
    <div className="grid gap-8 md:grid-cols-2">
      <div>
        <h3 className="mb-2">Fittings</h3>
        {facts.fittings.length === 0 ? (
          <p className="text-pencil">None with it.</p>
        ) : (
          <ul className="columns-2 gap-6">
            {facts.fittings.map((id) => (
              <li key={id}>{fittings[id]}</li>
            ))}
          </ul>
        )}
      </div>
      <div>
        <h3 className="mb-2">Papers</h3>
        {facts.papers.length === 0 ? (
          <p className="text-pencil">None.</p>
        ) : (
          <ul className="divide-y divide-rule border-y border-rule">
            {facts.papers.map(({ kind, datedOn, by }) => (
              <li key={`${kind}${datedOn ?? ''}${by}`} className="py-2">
                <span className="font-medium">{paperKinds[kind]}</span>
                <span className="block text-sm text-pencil">
                  {[datedOn === null ? 'No date' : formatDay(datedOn), by].filter(Boolean).join(', ')}
                </span>
              </li>
            ))}
          </ul>
        )}
      </div>
    </div>
  );
}
