import { Link } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { groups } from '#shared/workings/calculator.ts';
import type { GroupId } from '#shared/workings/calculator.ts';
import { calculators } from '#shared/workings/index.ts';
import { Caution } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';

const groupIds = Object.keys(groups) as GroupId[];

/** Every calculator, open to everyone. */
export function Component() {
  return (
    <Page
      title="Workings"
      sub="The engineering behind a survey, open to everyone: every formula, where it comes from, and how sure we are of it."
    >
      <Caution title="A calculation is not a test.">
        It speaks of figures, not of metal. Nothing here says that a boiler may be steamed: your boiler
        inspector does, under your local code.
      </Caution>
      <div className="mt-8 grid gap-x-12 lg:grid-cols-2">
        {groupIds.map((group) => (
          <div key={group} className="mb-10">
            <Section title={groups[group]}>
              <ul className="-mt-3">
                {calculators
                  .filter((calculator) => calculator.group === group)
                  .map(({ id, title, about }) => (
                    <li key={id} className="border-b border-rule">
                      <Link to={sitePaths.working(id)} className="group block py-3">
                        <span className="block font-medium text-copper underline-offset-4 group-hover:underline">
                          {title}
                        </span>
                        <span className="block text-pencil">{about}</span>
                      </Link>
                    </li>
                  ))}
              </ul>
            </Section>
          </div>
        ))}
      </div>
      <Section title="From a program of your own">
        <p className="max-w-prose">
          The same functions answer at <code>POST /api/workings/…</code>, one address for each calculator,
          with value, unit and working;{' '}
          <a className="link" href="/api/workings">
            /api/workings
          </a>{' '}
          lists them, and what each takes is in the{' '}
          <a className="link" href="/api/openapi.json">
            description of the API
          </a>
          .
        </p>
      </Section>
    </Page>
  );
}
