import { Link } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { Page } from '#web/ui/page.tsx';

export function Component() {
  return (
    <Page title="There is nothing here" isNarrow>
      <p>
        No page has this address. It may be mistyped, or the page may have moved. Look through the{' '}
        <Link className="link" to={sitePaths.boilers}>
          boilers
        </Link>
        .
      </p>
    </Page>
  );
}
