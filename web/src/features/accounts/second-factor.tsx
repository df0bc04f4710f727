import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Me } from '#shared/accounts/contract.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { useSkipEnrolment, useStartTotp } from './queries.ts';
import { QrCode } from './qr-code.tsx';
import { TotpForm } from './totp-form.tsx';

function Enrol() {
  const start = useStartTotp();
  const navigate = useNavigate();
  const [password, setPassword] = useState('');
  if (start.data) {
    const { totpURI, backupCodes } = start.data;
    const secret = new URL(totpURI).searchParams.get('secret') ?? '';
    return (
      <div className="grid gap-5">
        <p>
          Scan this with an authenticator app, or type the key into it. Then give the six digits it shows.
        </p>
        <QrCode text={totpURI} />
        <p>
          Key: <code className="break-all">{secret}</code>
        </p>
        <div>
          <p>Keep these codes where you keep keys. Each lets you in once if the phone is lost.</p>
          <ul className="mt-2 grid grid-cols-2 gap-x-6 font-mono sm:grid-cols-3">
            {backupCodes.map((code) => (
              <li key={code}>{code}</li>
            ))}
          </ul>
        </div>
        <TotpForm onDone={() => void navigate(sitePaths.desk)} />
      </div>
    );
  }
  return (
    <form
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        start.mutate({ password });
      }}
    >
      <Field label="Your password" error={start.isError ? messageOf(start.error) : undefined}>
        {(control) => (
          <input
            {...control}
            type="password"
            autoComplete="current-password"
            value={password}
            onChange={(event) => {
              setPassword(event.target.value);
            }}
          />
        )}
      </Field>
      <div>
        <Button kind="quiet" type="submit" isPending={start.isPending} disabled={password === ''}>
          Set up a second factor
        </Button>
      </div>
    </form>
  );
}

/** A code from a phone beside the password. The office does not work without one. */
export function SecondFactor({ me }: { me: Me }) {
  const skip = useSkipEnrolment();
  const navigate = useNavigate();
  if (me.hasSecondFactor) return <p>Set up. You are asked for a code when you sign in.</p>;
  return (
    <div className="grid gap-4">
      {me.mustEnrol ? (
        <p>Your office role is held back until a second factor is set up.</p>
      ) : (
        <p>A code from your phone beside your password keeps others out even if the password is known.</p>
      )}
      <Enrol />
      {me.canSkipEnrolment && (
        <div>
          <Button
            kind="plain"
            isPending={skip.isPending}
            onClick={() => {
              skip.mutate(undefined, { onSuccess: () => void navigate(sitePaths.desk) });
            }}
          >
            Go on without it for now
          </Button>
          <p className="text-sm text-pencil">This is a demonstration; a live site does not offer that.</p>
        </div>
      )}
    </div>
  );
}
