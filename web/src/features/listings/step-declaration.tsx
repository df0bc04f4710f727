import { laggingAnswers } from '#shared/listings/draft.ts';
import { Check } from '#web/ui/check.tsx';
import { Field } from '#web/ui/field.tsx';
import { Caution } from '#web/ui/notes.tsx';
import { Select } from '#web/ui/select.tsx';
import { errorAt } from './sell-steps.ts';
import type { StepProps } from './step-props.ts';

/** What the seller declares: it stands beside the surveyor's findings for good. */
export function StepDeclaration({ draft, onChange, errors }: StepProps) {
  const { declaration } = draft;
  const set = (change: Partial<typeof declaration>) => {
    onChange({ ...draft, declaration: { ...declaration, ...change } });
  };
  return (
    <div className="grid gap-6">
      <Field
        label="Defects you know of"
        hint="Or write: none known"
        error={errorAt(errors, '#/declaration/knownDefects')}
      >
        {(control) => (
          <textarea
            {...control}
            rows={3}
            maxLength={2_000}
            value={declaration.knownDefects}
            onChange={(event) => {
              set({ knownDefects: event.target.value });
            }}
          />
        )}
      </Field>
      <Field
        label="Repairs you know of"
        hint="Or write: none known"
        error={errorAt(errors, '#/declaration/knownRepairs')}
      >
        {(control) => (
          <textarea
            {...control}
            rows={3}
            maxLength={2_000}
            value={declaration.knownRepairs}
            onChange={(event) => {
              set({ knownRepairs: event.target.value });
            }}
          />
        )}
      </Field>
      <Select
        label="Lagging"
        value={declaration.lagging}
        options={laggingAnswers}
        error={errorAt(errors, '#/declaration/lagging')}
        onChange={(lagging) => {
          set({ lagging });
        }}
      />
      {declaration.lagging === 'not-known' && (
        <Caution title="Old lagging may hold asbestos.">
          Do not disturb it to find out. Leave it as it is, and say here that you do not know.
        </Caution>
      )}
      <div>
        <Check
          label="It is mine to sell"
          checked={declaration.ownsIt}
          error={errorAt(errors, '#/declaration/ownsIt')}
          onChange={(event) => {
            set({ ownsIt: event.target.checked });
          }}
        />
        <Check
          label="What I have written is true as far as I know"
          checked={declaration.isTruthful}
          error={errorAt(errors, '#/declaration/isTruthful')}
          onChange={(event) => {
            set({ isTruthful: event.target.checked });
          }}
        />
      </div>
    </div>
  );
}
