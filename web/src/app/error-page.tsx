import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { Link, useLocation, useRouteError } from 'react-router-dom';
import { Problem } from '#shared/problem.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { Button } from '#web/ui/button.tsx';
import { Page } from '#web/ui/page.tsx';

function wordsFor(error: unknown): { title: string; detail: string; instance: string | undefined } {
  if (error instanceof Problem) {
    if (error.slug === 'not-found') {
      return {
        title: 'There is nothing here',
        detail:
          'The address may be mistyped, or what was here is not open to you. If it should be, sign in as the person it belongs to.',
        instance: undefined,
      };
    }
    return {
      title: error.slug === 'not-signed-in' ? 'Sign in first' : 'This page could not be shown',
      detail: error.message,
      instance: error.instance,
    };
  }
  // A new version of the site has taken the place of the one this tab was opened with.
  if (error instanceof TypeError && /dynamically imported module|module script/i.test(error.message)) {
    return {
      title: 'The site has been renewed',
      detail: 'Reload the page to go on with the new version.',
      instance: undefined,
    };
  }
  return {
    title: 'This page met a fault of its own',
    detail: 'Reload it. What you had saved is still there.',
    instance: undefined,
  };
}

/** What a page shows when it cannot be shown. */
export function ErrorPage({ isWhole = false }: { isWhole?: boolean }) {
  const error = useRouteError();
  const location = useLocation();
  const client = useQueryClient();
  const { title, detail, instance } = wordsFor(error);
  const slug = error instanceof Problem ? error.slug : undefined;
  const mustSignIn = slug === 'not-signed-in';
  const mustEnrol = slug === 'second-factor-required';
  useEffect(() => {
    // A failed answer must not be shown again from memory when the person comes back.
    client.removeQueries({ predicate: (query) => query.state.status === 'error' });
  }, [client]);
  const page = (
    <Page title={title} isNarrow>
      <p>{detail}</p>
      {instance && <p className="mt-2 text-sm text-pencil">If you write to us about it, quote {instance}.</p>}
      <p className="mt-6 flex flex-wrap gap-4">
        {mustSignIn ? (
          <Link
            className="link"
            to={`${sitePaths.signIn}?to=${encodeURIComponent(location.pathname + location.search)}`}
          >
            Sign in
          </Link>
        ) : mustEnrol ? (
          <Link className="link" to={sitePaths.secondFactor}>
            Set up a second factor
          </Link>
        ) : (
          <Button
            kind="quiet"
            onClick={() => {
              window.location.reload();
            }}
          >
            Reload the page
          </Button>
        )}
        <Link className="link self-center" to={sitePaths.boilers}>
          Boilers
        </Link>
      </p>
    </Page>
  );
  return isWhole ? <main id="main">{page}</main> : page;
}
