import { pressureEvidence } from '#shared/boilers/boiler.ts';
import type { Dimensions } from '#shared/boilers/boiler.ts';
import { boilerTypeOf } from '#shared/boilers/boiler-types.ts';
import { Field } from '#web/ui/field.tsx';
import { Caution } from '#web/ui/notes.tsx';
import { QuantityInput, readNumber } from '#web/ui/quantity-input.tsx';
import { Select } from '#web/ui/select.tsx';
import { errorAt } from './sell-steps.ts';
import { withFacts } from './step-props.ts';
import type { StepProps } from './step-props.ts';

type LengthName = Exclude<keyof Dimensions, 'tubeCount' | 'heatingSurfaceM2' | 'weightKg'>;

const lengths: { name: LengthName; label: string; hint: string; isNeeded?: boolean; trait?: string }[] = [
  {
    name: 'barrelOutsideDiameterMm',
    label: 'Barrel, outside diameter',
    hint: 'Calipers, or a strip of paper round it divided by 3.14; not over the lagging',
    isNeeded: true,
  },
  { name: 'barrelLengthMm', label: 'Barrel, length', hint: 'Between the end plates', isNeeded: true },
  {
    name: 'barrelThicknessMm',
    label: 'Barrel, thickness',
    hint: 'Where an edge shows, at a bush or from the drawing',
  },
  { name: 'endPlateThicknessMm', label: 'End plates, thickness', hint: 'At an edge, or from the drawing' },
  { name: 'flueDiameterMm', label: 'Flue, inside diameter', hint: 'Across the open end', trait: 'flue' },
  { name: 'flueThicknessMm', label: 'Flue, thickness', hint: 'At the open end', trait: 'flue' },
  { name: 'tubeDiameterMm', label: 'Tubes, outside diameter', hint: 'At the tubeplate', trait: 'tubes' },
  { name: 'tubeThicknessMm', label: 'Tubes, wall', hint: 'At the tube end', trait: 'tubes' },
  {
    name: 'overallHeightMm',
    label: 'Height over all',
    hint: 'With the chimney, for whoever has to carry it',
  },
];

/** Sizes, the claimed working pressure and what it rests on, water capacity. What is not known is left empty. */
export function StepSizes({ draft, onChange, errors }: StepProps) {
  const { facts } = draft;
  const traits: readonly string[] = facts.type ? boilerTypeOf(facts.type).traits : ['flue', 'fire-tubes'];
  const hasTubes = traits.includes('fire-tubes') || traits.includes('water-tubes');
  const shown = lengths.filter(
    ({ trait }) => trait === undefined || (trait === 'tubes' ? hasTubes : traits.includes(trait)),
  );
  const setSize = (change: Partial<ListingSizes>) => {
    onChange(withFacts(draft, { dimensions: { ...facts.dimensions, ...change } }));
  };
  return (
    <div className="grid gap-8">
      <div className="grid gap-6 sm:grid-cols-2">
        <QuantityInput
          label="Claimed working pressure"
          quantity="pressure"
          value={facts.workingPressurePa}
          hint="The most it is said to work at"
          error={errorAt(errors, '#/facts/workingPressurePa')}
          onChange={(workingPressurePa) => {
            onChange(withFacts(draft, { workingPressurePa }));
          }}
        />
        <Select
          label="The figure rests on"
          value={facts.pressureEvidence}
          options={pressureEvidence}
          error={errorAt(errors, '#/facts/pressureEvidence')}
          onChange={(evidence) => {
            onChange(withFacts(draft, { pressureEvidence: evidence }));
          }}
        />
        <QuantityInput
          label="Water capacity, full"
          quantity="volume"
          value={facts.waterCapacityL}
          hint="Fill it from a jug and note what went in"
          error={errorAt(errors, '#/facts/waterCapacityL')}
          onChange={(waterCapacityL) => {
            onChange(withFacts(draft, { waterCapacityL }));
          }}
        />
      </div>
      <Caution title="Measure it cold and empty of pressure.">
        Take nothing apart that holds pressure to get at a size. Leave empty what you cannot measure: a buyer
        would sooner know that it is not known.
      </Caution>
      <div className="grid gap-6 sm:grid-cols-2">
        {shown.map(({ name, label, hint, isNeeded }) => (
          <QuantityInput
            key={name}
            label={label}
            hint={hint}
            isOptional={!isNeeded}
            quantity="length"
            value={facts.dimensions[name]}
            error={errorAt(errors, `#/facts/dimensions/${name}`)}
            onChange={(value) => {
              setSize({ [name]: value });
            }}
          />
        ))}
        {hasTubes && (
          <Field label="Number of tubes" isOptional error={errorAt(errors, '#/facts/dimensions/tubeCount')}>
            {(control) => (
              <input
                {...control}
                inputMode="numeric"
                maxLength={3}
                value={facts.dimensions.tubeCount ?? ''}
                onChange={(event) => {
                  const digits = event.target.value.replaceAll(/\D/g, '');
                  setSize({ tubeCount: digits === '' ? null : Number(digits) });
                }}
              />
            )}
          </Field>
        )}
        <Field
          label="Heating surface, m²"
          isOptional
          hint="From the drawing"
          error={errorAt(errors, '#/facts/dimensions/heatingSurfaceM2')}
        >
          {(control) => (
            <input
              {...control}
              inputMode="decimal"
              defaultValue={facts.dimensions.heatingSurfaceM2 ?? ''}
              onChange={(event) => {
                setSize({ heatingSurfaceM2: readNumber(event.target.value) });
              }}
            />
          )}
        </Field>
        <QuantityInput
          label="Weight, empty"
          isOptional
          quantity="mass"
          value={facts.dimensions.weightKg}
          error={errorAt(errors, '#/facts/dimensions/weightKg')}
          onChange={(weightKg) => {
            setSize({ weightKg });
          }}
        />
      </div>
    </div>
  );
}

type ListingSizes = StepProps['draft']['facts']['dimensions'];
