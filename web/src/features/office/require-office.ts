import type { Me } from '#shared/accounts/contract.ts';
import { Problem } from '#shared/problem.ts';

/** @throws Problem second-factor-required, not-permitted, shown by the page's error screen. */
export function requireOffice(me: Me): void {
  if (me.roles.includes('office')) return;
  if (me.mustEnrol)
    throw new Problem(
      'second-factor-required',
      'The office works only with a second factor. Set one up under your account.',
    );
  throw new Problem('not-permitted', 'This page is for the office.');
}
