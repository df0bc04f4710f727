import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { accountQueries } from '#web/features/accounts/queries.ts';
import { useTheme } from '#web/lib/theme.ts';
import type { Theme } from '#web/lib/theme.ts';
import { useUnits } from '#web/lib/units.tsx';

const themes: Record<Theme, string> = { system: 'As the system', light: 'Light', dark: 'Lamp-black' };

/** What holds everywhere, and how a person likes to read. */
export function Footer() {
  const { units, setUnits } = useUnits();
  const [theme, setTheme] = useTheme();
  const { data: site } = useQuery(accountQueries.site());
  return (
    <footer className="border-t border-ink text-[0.9375rem]">
      <div className="mx-auto grid max-w-[76rem] gap-6 px-4 py-8 sm:px-6 md:grid-cols-[3fr_2fr]">
        <div className="max-w-prose text-pencil">
          <p>
            Tubeplate issues no certificate of any kind. A report says what was found on one day. Before a
            boiler is steamed, your club’s or insurer’s boiler inspector must test it under your local code.
          </p>
          <p className="mt-3 flex flex-wrap gap-x-6 gap-y-2">
            <Link className="link" to={sitePaths.check}>
              Check a report
            </Link>
            <a className="link" href="/api/openapi.json">
              The API
            </a>
            {site?.isDemo && (
              <Link className="link" to={sitePaths.letters}>
                Letters of this demonstration
              </Link>
            )}
          </p>
          {site?.isDemo && (
            <p className="mt-3">
              Demonstration: people, clubs and boilers are invented, pictures are computer-made, no money
              moves.
            </p>
          )}
          <p className="mt-3">Places: GeoNames, CC BY 4.0.</p>
        </div>
        <div className="flex flex-wrap gap-4 md:justify-end">
          <label className="grid content-start gap-1">
            Units
            <select
              className="control"
              value={units}
              onChange={(event) => {
                setUnits(event.target.value === 'metric' ? 'metric' : 'imperial');
              }}
            >
              <option value="imperial">psi and inches</option>
              <option value="metric">bar and millimetres</option>
            </select>
          </label>
          <label className="grid content-start gap-1">
            Paper
            <select
              className="control"
              value={theme}
              onChange={(event) => {
                setTheme(event.target.value as Theme);
              }}
            >
              {Object.entries(themes).map(([id, label]) => (
                <option key={id} value={id}>
                  {label}
                </option>
              ))}
            </select>
          </label>
        </div>
      </div>
    </footer>
  );
}
