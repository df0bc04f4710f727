import { useSuspenseQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { deskQueries } from '#web/features/desk/queries.ts';
import { formatFromNow } from '#web/lib/format.ts';
import { Empty } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';

export function Component() {
  const me = useSignedIn();
  const { data } = useSuspenseQuery(deskQueries.items());
  return (
    <Page title="My desk" sub={`${me.name}: what waits for you, most pressing first.`}>
      {data.items.length === 0 ? (
        <Empty title="Nothing waits for you">
          Look through the{' '}
          <Link className="link" to={sitePaths.boilers}>
            boilers
          </Link>
          , or{' '}
          <Link className="link" to={sitePaths.sellStart}>
            list one
          </Link>
          .
        </Empty>
      ) : (
        <ol className="divide-y divide-rule border-y border-rule">
          {data.items.map(({ id, todo, about, why, path, dueAt, since }) => (
            <li key={id} className="relative grid gap-x-8 gap-y-1 py-4 sm:grid-cols-[minmax(0,1fr)_auto]">
              <div>
                <h2 className="text-lg">
                  <Link className="after:absolute after:inset-0 hover:underline" to={path}>
                    {todo}
                  </Link>
                </h2>
                <p>{about}</p>
                <p className="text-sm text-pencil">{why}</p>
              </div>
              <p
                className={`text-sm sm:text-right ${dueAt === null ? 'text-pencil' : 'font-medium text-attention'}`}
              >
                {dueAt === null ? `Came up ${formatFromNow(since)}` : `Due ${formatFromNow(dueAt)}`}
              </p>
            </li>
          ))}
        </ol>
      )}
    </Page>
  );
}
