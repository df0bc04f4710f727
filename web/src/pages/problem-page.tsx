import { useParams } from 'react-router-dom';
import { Problem, problems } from '#shared/problem.ts';
import type { ProblemSlug } from '#shared/problem.ts';
import { Page } from '#web/ui/page.tsx';

const meanings: Record<ProblemSlug, string> = {
  'invalid-input':
    'The answer lists each mistake under “errors”, with a JSON pointer to where it is. Nothing was changed.',
  'bad-request': 'The body is not JSON, or a signature does not fit. Nothing was changed.',
  'not-signed-in': 'The operation is for somebody who is signed in.',
  'second-factor-required': 'The office works only with a second factor. Set one up under your account.',
  'not-permitted': 'You are known, but this is not yours to do.',
  'wrong-origin': 'A change must come from a page of this site; the Origin header says otherwise.',
  'not-found': 'There is no such thing, or it is not open to you. The two are not told apart.',
  'wrong-state': 'The thing is at a stage where this cannot be done.',
  'changed-meanwhile': 'Somebody else acted first. Read it again and decide anew.',
  'not-complete': 'The list under “errors” says what is missing.',
  'result-differs':
    'The server scored the findings and came to another result than the one sent. Nothing was filed.',
  'stale-version': 'You saved over a version that somebody has saved since. Nothing was overwritten.',
  'too-large': 'The limit is named in the answer.',
  'wrong-kind': 'The answer says which kinds can be used.',
  'too-many': 'Wait as long as the Retry-After header says.',
  'payment-service': 'The card service did not answer as expected. No money moved twice; try again.',
  unexpected: 'A fault of ours. It is logged under the number in “instance”.',
};

export function Component() {
  const { slug = '' } = useParams();
  if (!Object.hasOwn(problems, slug)) throw new Problem('not-found');
  const known = slug as ProblemSlug;
  return (
    <Page
      title={problems[known].title}
      sub={`Problem “${known}”, HTTP status ${String(problems[known].status)}`}
      isNarrow
    >
      <p>{meanings[known]}</p>
    </Page>
  );
}
