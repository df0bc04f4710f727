import { firings, fittings } from '#shared/boilers/boiler.ts';
import type { FittingId } from '#shared/boilers/boiler.ts';
import { Check, Choices } from '#web/ui/check.tsx';
import { FieldGroup } from '#web/ui/field.tsx';
import { Caution } from '#web/ui/notes.tsx';
import { errorAt } from './sell-steps.ts';
import { withFacts } from './step-props.ts';
import type { StepProps } from './step-props.ts';

/** What is fitted, and how it is fired. */
export function StepFittings({ draft, onChange, errors }: StepProps) {
  const { facts } = draft;
  const toggle = (id: FittingId, isFitted: boolean) => {
    onChange(
      withFacts(draft, {
        fittings: isFitted ? [...facts.fittings, id] : facts.fittings.filter((each) => each !== id),
      }),
    );
  };
  return (
    <div className="grid gap-8">
      <FieldGroup
        legend="Fitted now"
        hint="Tick what goes with it. Which criteria a survey looks at follows from this."
      >
        <div className="grid gap-x-8 sm:grid-cols-2">
          {(Object.keys(fittings) as FittingId[]).map((id) => (
            <Check
              key={id}
              label={fittings[id]}
              checked={facts.fittings.includes(id)}
              onChange={(event) => {
                toggle(id, event.target.checked);
              }}
            />
          ))}
        </div>
      </FieldGroup>
      <FieldGroup legend="Fired by" error={errorAt(errors, '#/facts/firing')}>
        <Choices
          name="firing"
          value={facts.firing}
          options={(Object.keys(firings) as (keyof typeof firings)[]).map((id) => ({
            id,
            label: firings[id],
          }))}
          onChange={(firing) => {
            onChange(withFacts(draft, { firing }));
          }}
        />
      </FieldGroup>
      {facts.firing === 'gas' && (
        <Caution title="Gas makes carbon monoxide and gathers low.">
          Do not light it indoors to take a photograph. A surveyor tries it outdoors with a meter.
        </Caution>
      )}
    </div>
  );
}
