import { constructions, materials, yearSureness } from '#shared/boilers/boiler.ts';
import { boilerTypeIds, boilerTypeOf } from '#shared/boilers/boiler-types.ts';
import { Choices } from '#web/ui/check.tsx';
import { Field, FieldGroup } from '#web/ui/field.tsx';
import { Select } from '#web/ui/select.tsx';
import { errorAt } from './sell-steps.ts';
import { withFacts } from './step-props.ts';
import type { StepProps } from './step-props.ts';

/** Type, material, how it is joined, who built it and when. */
export function StepWhat({ draft, onChange, errors }: StepProps) {
  const { facts } = draft;
  return (
    <div className="grid gap-6">
      <Field
        label="Title"
        hint="What it is, in a line: type, material, size"
        error={errorAt(errors, '#/title')}
      >
        {(control) => (
          <input
            {...control}
            maxLength={120}
            value={draft.title}
            onChange={(event) => {
              onChange({ ...draft, title: event.target.value });
            }}
          />
        )}
      </Field>
      <FieldGroup legend="Type" error={errorAt(errors, '#/facts/type')}>
        <Choices
          name="type"
          value={facts.type}
          options={boilerTypeIds.map((id) => ({
            id,
            label: boilerTypeOf(id).label,
            hint: boilerTypeOf(id).about,
          }))}
          onChange={(type) => {
            onChange(withFacts(draft, { type }));
          }}
        />
      </FieldGroup>
      <div className="grid gap-6 sm:grid-cols-2">
        <Select
          label="Material"
          value={facts.material}
          options={materials}
          error={errorAt(errors, '#/facts/material')}
          onChange={(material) => {
            onChange(withFacts(draft, { material }));
          }}
        />
        <Select
          label="How it is joined"
          hint="Soft solder melts far below what silver solder does; say which if you know"
          value={facts.construction}
          options={constructions}
          error={errorAt(errors, '#/facts/construction')}
          onChange={(construction) => {
            onChange(withFacts(draft, { construction }));
          }}
        />
        <Field label="Builder" isOptional error={errorAt(errors, '#/facts/builder')}>
          {(control) => (
            <input
              {...control}
              maxLength={120}
              value={facts.builder ?? ''}
              onChange={(event) => {
                onChange(
                  withFacts(draft, { builder: event.target.value === '' ? null : event.target.value }),
                );
              }}
            />
          )}
        </Field>
        <div className="grid grid-cols-2 gap-4">
          <Field label="Year" isOptional error={errorAt(errors, '#/facts/builtYear')}>
            {(control) => (
              <input
                {...control}
                inputMode="numeric"
                maxLength={4}
                value={facts.builtYear ?? ''}
                onChange={(event) => {
                  const digits = event.target.value.replaceAll(/\D/g, '');
                  onChange(withFacts(draft, { builtYear: digits === '' ? null : Number(digits) }));
                }}
              />
            )}
          </Field>
          <Select
            label="How sure"
            value={facts.builtYearSureness}
            options={yearSureness}
            onChange={(builtYearSureness) => {
              if (builtYearSureness !== null) onChange(withFacts(draft, { builtYearSureness }));
            }}
          />
        </div>
      </div>
      <Field
        label="Describe it"
        hint="How you came by it, what it has driven, what you would want to know if you were buying it"
        error={errorAt(errors, '#/description')}
      >
        {(control) => (
          <textarea
            {...control}
            rows={7}
            maxLength={6_000}
            value={draft.description}
            onChange={(event) => {
              onChange({ ...draft, description: event.target.value });
            }}
          />
        )}
      </Field>
    </div>
  );
}
