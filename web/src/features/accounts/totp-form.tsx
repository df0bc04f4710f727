import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { showProblem } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useVerifyTotp } from './queries.ts';

const totpCode = z.object({
  code: z
    .string()
    .trim()
    .regex(/^\d{6}$/, 'Give the six digits the app shows now'),
});

/** The six digits of the second factor. */
export function TotpForm({ onDone }: { onDone: () => void }) {
  const verify = useVerifyTotp();
  const form = useForm({ resolver: zodResolver(totpCode), defaultValues: { code: '' } });
  const { errors } = form.formState;
  const submit = form.handleSubmit((body) =>
    verify.mutateAsync(body).then(onDone, (error: unknown) => {
      showProblem(form, error);
    }),
  );
  return (
    <form noValidate className="grid gap-4" onSubmit={(event) => void submit(event)}>
      {errors.root && <Notice kind="bad">{errors.root.message}</Notice>}
      <Field
        label="Six-digit code"
        hint="From the authenticator app on your phone"
        error={errors.code?.message}
      >
        {(control) => (
          <input {...control} inputMode="numeric" autoComplete="one-time-code" {...form.register('code')} />
        )}
      </Field>
      <div>
        <Button type="submit" isPending={verify.isPending}>
          Go on
        </Button>
      </div>
    </form>
  );
}
