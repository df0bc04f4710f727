import { useSuspenseQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { orderStatusLabels } from '#shared/survey-orders/machine.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { surveyOrderQueries } from '#web/features/survey-orders/queries.ts';
import { formatFromNow, formatInstant } from '#web/lib/format.ts';
import { ButtonLink } from '#web/ui/button.tsx';
import { Empty } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';
import { Photo } from '#web/ui/photo.tsx';

const parts = {
  buyer: 'You are the buyer',
  seller: 'You are the seller',
  surveyor: 'You are the surveyor',
  office: 'Office',
};

export function Component() {
  const me = useSignedIn();
  const { data } = useSuspenseQuery(surveyOrderQueries.list());
  return (
    <Page
      title="Surveys"
      sub="Those you have a part in, newest first."
      aside={
        me.roles.includes('surveyor') ? (
          <ButtonLink kind="quiet" to={sitePaths.surveyorTerms}>
            My terms as a surveyor
          </ButtonLink>
        ) : undefined
      }
    >
      {data.items.length === 0 ? (
        <Empty title="No surveys yet">
          Commission one from the page of any{' '}
          <Link className="link" to={sitePaths.boilers}>
            boiler
          </Link>
          : an independent surveyor examines it where it is.
        </Empty>
      ) : (
        <ul className="divide-y divide-rule border-y border-rule">
          {data.items.map((order) => (
            <li
              key={order.id}
              className="relative grid gap-x-8 gap-y-1 py-4 sm:grid-cols-[4.5rem_minmax(0,5fr)_minmax(0,3fr)_14rem]"
            >
              <div className="hidden sm:block">
                {order.listing.cover && <Photo photo={order.listing.cover} sizes="72px" shape="1/1" />}
              </div>
              <div>
                <h2 className="text-lg">
                  <Link className="after:absolute after:inset-0" to={sitePaths.order(order.id)}>
                    {order.listing.title}
                  </Link>
                </h2>
                <p className="text-sm text-pencil">
                  {scopes[order.scope].label} · {order.listing.town.name} · {parts[order.part]}
                </p>
              </div>
              <p>{orderStatusLabels[order.status]}</p>
              <p className="text-sm text-pencil sm:text-right">
                {order.appointmentAt === null
                  ? `Placed ${formatInstant(order.placedAt)}`
                  : `Visit ${formatInstant(order.appointmentAt)}`}
                {order.dueAt !== null && (
                  <span className="block font-medium text-attention">Due {formatFromNow(order.dueAt)}</span>
                )}
              </p>
            </li>
          ))}
        </ul>
      )}
    </Page>
  );
}
