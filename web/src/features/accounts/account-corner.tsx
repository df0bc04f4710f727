import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { accountQueries } from './queries.ts';

/** What the corner has no room for on a phone, for the menu. */
export function AccountPlaces({ onGo }: { onGo: () => void }) {
  const me = useQuery(accountQueries.me()).data?.me;
  if (!me) return null;
  const places = [
    ...(me.roles.includes('office') ? [{ to: sitePaths.officeOrders, label: 'Office' }] : []),
    { to: sitePaths.account, label: `My account (${me.name})` },
  ];
  return places.map(({ to, label }) => (
    <Link key={to} to={to} onClick={onGo} className="flex min-h-11 items-center font-medium">
      {label}
    </Link>
  ));
}

/** The corner of the frame that knows who is here. It keeps its place while it asks. */
export function AccountCorner() {
  const { data } = useQuery(accountQueries.me());
  const me = data?.me;
  if (data === undefined) return <span className="h-11 w-24" />;
  if (!me) {
    return (
      <Link to={sitePaths.signIn} className="flex min-h-11 items-center font-medium">
        Sign in
      </Link>
    );
  }
  return (
    <span className="flex items-center gap-4 text-[0.9375rem]">
      {me.roles.includes('office') && (
        <Link to={sitePaths.officeOrders} className="hidden min-h-11 items-center font-medium sm:flex">
          Office
        </Link>
      )}
      <Link to={sitePaths.desk} className="flex min-h-11 items-center font-medium">
        My desk
      </Link>
      <Link to={sitePaths.account} className="hidden min-h-11 items-center text-pencil sm:flex">
        {me.name}
      </Link>
    </span>
  );
}
