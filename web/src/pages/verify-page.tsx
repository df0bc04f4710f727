import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { accountQueries, verificationQuery } from '#web/features/accounts/queries.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Loading } from '#web/ui/mark.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';

export function Component() {
  const [search] = useSearchParams();
  const client = useQueryClient();
  const { isPending, isSuccess, error } = useQuery(verificationQuery(search.get('token') ?? ''));
  useEffect(() => {
    if (isSuccess) void client.invalidateQueries({ queryKey: accountQueries.me().queryKey });
  }, [client, isSuccess]);
  return (
    <Page title="Confirm your address" isNarrow>
      {isPending && <Loading what="Confirming" />}
      {isSuccess && (
        <Notice kind="good">
          Your address is confirmed. You can list boilers and commission surveys.{' '}
          <Link className="link" to={sitePaths.desk}>
            My desk
          </Link>
        </Notice>
      )}
      {error && (
        <Notice kind="bad">
          {messageOf(error)}{' '}
          <Link className="link" to={sitePaths.account}>
            Send the letter again
          </Link>
        </Notice>
      )}
    </Page>
  );
}
