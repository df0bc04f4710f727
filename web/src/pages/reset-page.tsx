import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link, useSearchParams } from 'react-router-dom';
import { z } from 'zod';
import { newPassword } from '#shared/accounts/password.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { authCall } from '#web/features/accounts/auth-client.ts';
import { showProblem } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';

const resetting = z.object({ password: newPassword });

export function Component() {
  const [search] = useSearchParams();
  const token = search.get('token') ?? '';
  const form = useForm({ resolver: zodResolver(resetting), defaultValues: { password: '' } });
  const { errors, isSubmitting, isSubmitSuccessful } = form.formState;
  const submit = form.handleSubmit(({ password }) =>
    authCall('POST', '/reset-password', { newPassword: password, token }).catch((error: unknown) => {
      showProblem(form, error);
    }),
  );
  return (
    <Page title="Set a new password" isNarrow>
      {isSubmitSuccessful && !errors.root ? (
        <Notice kind="good">
          Your password is set, and every device has been signed out.{' '}
          <Link className="link" to={sitePaths.signIn}>
            Sign in
          </Link>
        </Notice>
      ) : (
        <form noValidate className="grid gap-4" onSubmit={(event) => void submit(event)}>
          {errors.root && <Notice kind="bad">{errors.root.message}</Notice>}
          <Field
            label="New password"
            hint="Twelve characters or more; a few words in a row do well"
            error={errors.password?.message}
          >
            {(control) => (
              <input
                {...control}
                type="password"
                autoComplete="new-password"
                {...form.register('password')}
              />
            )}
          </Field>
          <div className="flex flex-wrap items-center gap-6">
            <Button type="submit" isPending={isSubmitting}>
              Set it
            </Button>
            <Link className="link" to={sitePaths.forgotten}>
              Ask for a new link
            </Link>
          </div>
        </form>
      )}
    </Page>
  );
}
