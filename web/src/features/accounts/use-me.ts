import { useSuspenseQuery } from '@tanstack/react-query';
import type { Me } from '#shared/accounts/contract.ts';
import { Problem } from '#shared/problem.ts';
import { accountQueries } from './queries.ts';

/** Who is signed in; null for a visitor. */
export const useMe = (): Me | null => useSuspenseQuery(accountQueries.me()).data.me;

/** Who is signed in. A visitor is sent to sign in by the page's error screen. @throws Problem not-signed-in. */
export function useSignedIn(): Me {
  const me = useMe();
  if (!me) throw new Problem('not-signed-in', 'This page is for somebody who is signed in.');
  return me;
}
