import { Problem } from '#shared/problem.ts';

/** No page has this address: the error screen says so. */
export function Component(): never {
  throw new Problem('not-found');
}
