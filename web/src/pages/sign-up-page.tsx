import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { displayName } from '#shared/accounts/contract.ts';
import { newPassword } from '#shared/accounts/password.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { useSignUp } from '#web/features/accounts/queries.ts';
import { showProblem } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';

const joining = z.object({
  name: displayName,
  email: z.email('Give your e-mail address'),
  password: newPassword,
});

export function Component() {
  const signUp = useSignUp();
  const navigate = useNavigate();
  const form = useForm({
    resolver: zodResolver(joining),
    defaultValues: { name: '', email: '', password: '' },
  });
  const { errors } = form.formState;
  const submit = form.handleSubmit((body) =>
    signUp.mutateAsync(body).then(
      () => void navigate(sitePaths.desk),
      (error: unknown) => {
        showProblem(form, error);
      },
    ),
  );
  return (
    <Page
      title="Join Tubeplate"
      sub="Buying and selling need nothing more. Surveyors apply to the office afterwards."
      isNarrow
    >
      <form noValidate className="grid gap-4" onSubmit={(event) => void submit(event)}>
        {errors.root && <Notice kind="bad">{errors.root.message}</Notice>}
        <Field label="Your name" hint="Shown to people you deal with" error={errors.name?.message}>
          {(control) => <input {...control} autoComplete="name" {...form.register('name')} />}
        </Field>
        <Field
          label="E-mail address"
          hint="A letter comes there to be confirmed"
          error={errors.email?.message}
        >
          {(control) => <input {...control} type="email" autoComplete="email" {...form.register('email')} />}
        </Field>
        <Field
          label="Password"
          hint="Twelve characters or more; a few words in a row do well"
          error={errors.password?.message}
        >
          {(control) => (
            <input {...control} type="password" autoComplete="new-password" {...form.register('password')} />
          )}
        </Field>
        <div className="flex flex-wrap items-center gap-6">
          <Button type="submit" isPending={signUp.isPending}>
            Join
          </Button>
          <Link className="link" to={sitePaths.signIn}>
            I have an account
          </Link>
        </div>
      </form>
    </Page>
  );
}
