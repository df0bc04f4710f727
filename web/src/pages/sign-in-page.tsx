import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { accountQueries, useSignIn } from '#web/features/accounts/queries.ts';
import { SignInForm } from '#web/features/accounts/sign-in-form.tsx';
import { TotpForm } from '#web/features/accounts/totp-form.tsx';
import { messageOf } from '#web/lib/form-problem.ts';
import { Notice } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';

/** Only an address of this site may be gone on to. */
const ownPath = (to: string | null): string => (to !== null && /^\/(?![/\\])/.test(to) ? to : sitePaths.desk);

export function Component() {
  const { data: site } = useSuspenseQuery(accountQueries.site());
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const [asksForCode, setAsksForCode] = useState(false);
  const signIn = useSignIn();
  // Its own, so that what goes wrong with a press is said beside the presses, and not beside the form too.
  const press = useSignIn();
  const to = ownPath(search.get('to'));
  const client = useQueryClient();
  const goOn = async () => {
    const { me } = await client.fetchQuery(accountQueries.me());
    await navigate(me?.mustEnrol ? sitePaths.account : to, { replace: true });
  };
  const enter = async (by: typeof signIn, body: { email: string; password: string }) => {
    const { twoFactorRedirect } = await by.mutateAsync(body);
    if (twoFactorRedirect) setAsksForCode(true);
    else await goOn();
  };

  return (
    <Page title="Sign in" isNarrow>
      {asksForCode ? (
        <TotpForm onDone={() => void goOn()} />
      ) : (
        <div className="grid gap-8">
          <SignInForm onSubmit={(body) => enter(signIn, body)} />
          <p className="flex flex-wrap gap-x-6 gap-y-2">
            <Link className="link" to={`${sitePaths.signUp}?to=${encodeURIComponent(to)}`}>
              Join Tubeplate
            </Link>
            <Link className="link" to={sitePaths.forgotten}>
              I have forgotten my password
            </Link>
          </p>
          {site.isDemo && (
            <section aria-label="Demonstration accounts" className="border border-ink bg-sheet p-4">
              <h2 className="text-lg">Demonstration accounts</h2>
              <p className="mt-1 text-sm text-pencil">One press signs you in.</p>
              <ul className="mt-3 divide-y divide-rule">
                {site.demoAccounts.map(({ email, name, part, password }) => (
                  <li key={email}>
                    <button
                      type="button"
                      disabled={press.isPending}
                      className="flex min-h-12 w-full flex-wrap items-baseline justify-between gap-x-4 py-2 text-left hover:bg-wash disabled:opacity-60"
                      onClick={() => {
                        // The mutation keeps the error and the page shows it below.
                        enter(press, { email, password }).catch(() => undefined);
                      }}
                    >
                      <span className="font-medium text-copper underline underline-offset-4">{part}</span>
                      <span className="text-sm text-pencil">
                        {name} · {email}
                      </span>
                    </button>
                  </li>
                ))}
              </ul>
              {press.isError && <Notice kind="bad">{messageOf(press.error)}</Notice>}
            </section>
          )}
        </div>
      )}
    </Page>
  );
}
