import { zodResolver } from '@hookform/resolvers/zod';
import { Controller, useForm } from 'react-hook-form';
import type { z } from 'zod';
import { actions, engineDraft } from '#shared/engines/engine.ts';
import type { EngineDraft } from '#shared/engines/engine.ts';
import { showProblem } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { QuantityInput } from '#web/ui/quantity-input.tsx';
import { Select } from '#web/ui/select.tsx';

const figures = [
  { name: 'boreMm', label: 'Bore', quantity: 'length' },
  { name: 'strokeMm', label: 'Stroke', quantity: 'length' },
  {
    name: 'cylinders',
    label: 'Cylinders',
    quantity: 'count',
    hint: 'Of a compound, the high-pressure ones only',
  },
  { name: 'speedRpm', label: 'Speed', quantity: 'speed' },
  { name: 'cutOffPercent', label: 'Cut-off, share of the stroke', quantity: 'percent' },
  { name: 'pressurePa', label: 'Steam pressure at the engine', quantity: 'pressure' },
] as const;

/** What is not known yet is empty, not nought: the form says what it wants. */
type Typed = Partial<EngineDraft>;
const asTyped = engineDraft as z.ZodType<EngineDraft, Typed>;

interface Props {
  engine?: EngineDraft;
  save: (draft: EngineDraft) => Promise<unknown>;
  onDone: () => void;
}

/** An engine's particulars, as far as its thirst for steam goes. */
export function EngineForm({ engine, save, onDone }: Props) {
  const form = useForm<Typed, unknown, EngineDraft>({
    resolver: zodResolver(asTyped),
    defaultValues: engine ?? { name: '', action: 'double', cylinders: 1, cutOffPercent: 75 },
  });
  const { errors, isSubmitting } = form.formState;
  const submit = form.handleSubmit(async (draft) => {
    try {
      await save(draft);
      onDone();
    } catch (error) {
      showProblem(form, error);
    }
  });
  return (
    <form noValidate aria-label="Engine" className="grid gap-4" onSubmit={(event) => void submit(event)}>
      {errors.root && <Notice kind="bad">{errors.root.message}</Notice>}
      <Field label="What you call it" error={errors.name?.message}>
        {(control) => <input {...control} autoComplete="off" {...form.register('name')} />}
      </Field>
      <div className="grid gap-4 sm:grid-cols-2">
        {figures.map(({ name, label, quantity, ...more }) => (
          <Controller
            key={name}
            control={form.control}
            name={name}
            render={({ field, fieldState }) => (
              <QuantityInput
                label={label}
                quantity={quantity}
                value={field.value ?? null}
                error={fieldState.error?.message}
                onChange={(value) => {
                  field.onChange(value ?? undefined);
                }}
                {...more}
              />
            )}
          />
        ))}
        <Controller
          control={form.control}
          name="action"
          render={({ field, fieldState }) => (
            <Select
              label="Action"
              value={field.value ?? null}
              options={actions}
              error={fieldState.error?.message}
              onChange={(value) => {
                field.onChange(value ?? undefined);
              }}
            />
          )}
        />
      </div>
      <div className="flex flex-wrap gap-3">
        <Button type="submit" isPending={isSubmitting}>
          Keep this engine
        </Button>
        <Button kind="plain" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
