import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { displayName } from '#shared/accounts/contract.ts';
import type { Me } from '#shared/accounts/contract.ts';
import { showProblem } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useUpdateMe } from './queries.ts';

const naming = z.object({ name: displayName });

export function NameForm({ me }: { me: Me }) {
  const update = useUpdateMe();
  const form = useForm({ resolver: zodResolver(naming), defaultValues: { name: me.name } });
  const { errors } = form.formState;
  const submit = form.handleSubmit((body) =>
    update.mutateAsync(body).then(
      () => undefined,
      (error: unknown) => {
        showProblem(form, error);
      },
    ),
  );
  return (
    <form noValidate className="grid gap-4" onSubmit={(event) => void submit(event)}>
      {errors.root && <Notice kind="bad">{errors.root.message}</Notice>}
      <Field label="Name shown to people you deal with" error={errors.name?.message}>
        {(control) => <input {...control} autoComplete="name" {...form.register('name')} />}
      </Field>
      <div className="flex items-center gap-4">
        <Button kind="quiet" type="submit" isPending={update.isPending}>
          Save
        </Button>
        {update.isSuccess && <output>Saved</output>}
      </div>
    </form>
  );
}
