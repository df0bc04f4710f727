import type { Town } from '#shared/listings/places.ts';
import { Check } from '#web/ui/check.tsx';
import { Field, FieldGroup } from '#web/ui/field.tsx';
import { MoneyInput } from '#web/ui/quantity-input.tsx';
import { errorAt } from './sell-steps.ts';
import type { StepProps } from './step-props.ts';
import { TownInput } from './town-input.tsx';

const lines = [
  { name: 'line1', label: 'Address', autoComplete: 'address-line1', maxLength: 120 },
  { name: 'line2', label: 'Address, second line', autoComplete: 'address-line2', maxLength: 120 },
  { name: 'postcode', label: 'Postcode', autoComplete: 'postal-code', maxLength: 12 },
] as const;

/** Where it is, what is asked for it, and how it may change hands. */
export function StepPlace({ draft, onChange, errors, town }: StepProps & { town: Town | null }) {
  const { address, terms } = draft;
  const setTerms = (change: Partial<typeof terms>) => {
    onChange({ ...draft, terms: { ...terms, ...change } });
  };
  return (
    <div className="grid gap-8">
      <TownInput
        label="Nearest town"
        hint="All that a visitor is told of where it is. Type the first letters."
        town={town}
        error={errorAt(errors, '#/townId')}
        onChoose={({ id }) => {
          onChange({ ...draft, townId: id });
        }}
      />
      <FieldGroup
        legend="Where the surveyor would come"
        hint="Private. Shown to a surveyor only after you have agreed a time with them, and never on the listing."
      >
        <div className="grid gap-4 sm:grid-cols-2">
          {lines.map(({ name, label, autoComplete, maxLength }) => (
            <Field key={name} label={label} error={errorAt(errors, `#/address/${name}`)}>
              {(control) => (
                <input
                  {...control}
                  autoComplete={autoComplete}
                  maxLength={maxLength}
                  value={address[name]}
                  onChange={(event) => {
                    onChange({ ...draft, address: { ...address, [name]: event.target.value } });
                  }}
                />
              )}
            </Field>
          ))}
          <Field label="How to find the door" error={errorAt(errors, '#/address/accessNotes')}>
            {(control) => (
              <input
                {...control}
                maxLength={500}
                value={address.accessNotes}
                onChange={(event) => {
                  onChange({ ...draft, address: { ...address, accessNotes: event.target.value } });
                }}
              />
            )}
          </Field>
        </div>
      </FieldGroup>
      <div className="max-w-xs">
        <MoneyInput
          label="Asking price"
          value={draft.askingMinor}
          error={errorAt(errors, '#/askingMinor')}
          onChange={(askingMinor) => {
            onChange({ ...draft, askingMinor });
          }}
        />
      </div>
      <FieldGroup legend="How it may change hands" error={errorAt(errors, '#/terms/canCollect')}>
        <Check
          label="The buyer collects it"
          checked={terms.canCollect}
          onChange={(event) => {
            setTerms({ canCollect: event.target.checked });
          }}
        />
        <Check
          label="I can send it"
          checked={terms.canCarry}
          onChange={(event) => {
            setTerms({ canCarry: event.target.checked });
          }}
        />
        {terms.canCarry && (
          <Field label="How, and about what it costs">
            {(control) => (
              <input
                {...control}
                maxLength={300}
                value={terms.carriageNote}
                onChange={(event) => {
                  setTerms({ carriageNote: event.target.value });
                }}
              />
            )}
          </Field>
        )}
        <Check
          label="I will hear offers"
          checked={terms.takesOffers}
          onChange={(event) => {
            setTerms({ takesOffers: event.target.checked });
          }}
        />
      </FieldGroup>
    </div>
  );
}
