import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { showProblem } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';

const credentials = z.object({
  email: z.email('Give your e-mail address'),
  password: z.string().min(1, 'Give your password'),
});

/** E-mail and password. What was typed stays when the server says no. */
export function SignInForm({ onSubmit }: { onSubmit: (body: z.infer<typeof credentials>) => Promise<void> }) {
  const form = useForm({ resolver: zodResolver(credentials), defaultValues: { email: '', password: '' } });
  const { errors, isSubmitting } = form.formState;
  const submit = form.handleSubmit((body) =>
    onSubmit(body).catch((error: unknown) => {
      showProblem(form, error);
    }),
  );
  return (
    <form noValidate className="grid gap-4" onSubmit={(event) => void submit(event)}>
      {errors.root && <Notice kind="bad">{errors.root.message}</Notice>}
      <Field label="E-mail address" error={errors.email?.message}>
        {(control) => <input {...control} type="email" autoComplete="username" {...form.register('email')} />}
      </Field>
      <Field label="Password" error={errors.password?.message}>
        {(control) => (
          <input
            {...control}
            type="password"
            autoComplete="current-password"
            {...form.register('password')}
          />
        )}
      </Field>
      <div>
        <Button type="submit" isPending={isSubmitting}>
          Sign in
        </Button>
      </div>
    </form>
  );
}
