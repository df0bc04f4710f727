import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { authCall } from '#web/features/accounts/auth-client.ts';
import { showProblem } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';

const forgotten = z.object({ email: z.email('Give your e-mail address') });

export function Component() {
  const [isSent, setIsSent] = useState(false);
  const form = useForm({ resolver: zodResolver(forgotten), defaultValues: { email: '' } });
  const { errors, isSubmitting } = form.formState;
  const submit = form.handleSubmit((body) =>
    authCall('POST', '/request-password-reset', body).then(
      () => {
        setIsSent(true);
        return undefined;
      },
      (error: unknown) => {
        showProblem(form, error);
      },
    ),
  );
  return (
    <Page title="Set a new password" isNarrow>
      {isSent ? (
        <Notice kind="good">
          If there is an account with that address, a letter with a link is on its way. The link works for one
          hour.
        </Notice>
      ) : (
        <form noValidate className="grid gap-4" onSubmit={(event) => void submit(event)}>
          {errors.root && <Notice kind="bad">{errors.root.message}</Notice>}
          <Field label="E-mail address" error={errors.email?.message}>
            {(control) => (
              <input {...control} type="email" autoComplete="email" {...form.register('email')} />
            )}
          </Field>
          <div>
            <Button type="submit" isPending={isSubmitting}>
              Send me the link
            </Button>
          </div>
        </form>
      )}
    </Page>
  );
}
