import { useState } from 'react';
import { Link } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { differencesBetween } from '#shared/surveys/method.ts';
import type { MethodData } from '#shared/surveys/method.ts';
import { rubricOf } from '#shared/surveys/rubric/index.ts';
import { formatDay } from '#web/lib/format.ts';
import { Select } from '#web/ui/select.tsx';
import { criterionAnchor } from './criterion-entry.tsx';

/** Every version ever published, what each brought, and the differences between any two. */
export function Versions({ method }: { method: MethodData }) {
  const { versions, rubric, current } = method;
  return (
    <div className="grid gap-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]">
      <div>
        <ul className="divide-y divide-rule border-y border-rule">
          {versions.toReversed().map(({ version, publishedOn, changes }) => (
            <li key={version} className="py-3">
              <p className="flex flex-wrap justify-between gap-x-4">
                <span className="font-medium">
                  {version}, {formatDay(publishedOn)}
                  {version === current && ', the current one'}
                </span>
                {version === rubric.version ? (
                  <span className="text-pencil">Shown on this page</span>
                ) : (
                  <Link
                    className="link"
                    to={version === current ? sitePaths.method : sitePaths.methodVersion(version)}
                  >
                    Read version {version}
                  </Link>
                )}
              </p>
              <ul className="mt-1 list-disc pl-5">
                {changes.map((text) => (
                  <li key={text}>{text}</li>
                ))}
              </ul>
            </li>
          ))}
        </ul>
        <p className="mt-3 max-w-prose text-pencil">
          A published version is never changed. A report keeps the version it was scored with.
        </p>
      </div>
      {versions.length > 1 ? (
        <Compare versions={versions.map(({ version }) => version)} />
      ) : (
        <p className="text-pencil">Only one version is published, so there is none to set it against.</p>
      )}
    </div>
  );
}

/** The items of the method that differ between two versions, from the older to the newer. */
function Compare({ versions }: { versions: readonly string[] }) {
  const [picked, setPicked] = useState({ from: versions.at(-2) ?? '', to: versions.at(-1) ?? '' });
  const options = Object.fromEntries(versions.map((version) => [version, version]));
  const [older, newer] = [picked.from, picked.to].toSorted(
    (a, b) => versions.indexOf(a) - versions.indexOf(b),
  );
  if (older === undefined || newer === undefined) return null;
  const differences = differencesBetween(rubricOf(older), rubricOf(newer));
  return (
    <div className="grid content-start gap-4">
      <h3>What differs between two versions</h3>
      <div className="grid grid-cols-2 gap-4">
        <Select
          label="One version"
          value={picked.from}
          options={options}
          onChange={(from) => {
            if (from !== null) setPicked({ ...picked, from });
          }}
        />
        <Select
          label="The other"
          value={picked.to}
          options={options}
          onChange={(to) => {
            if (to !== null) setPicked({ ...picked, to });
          }}
        />
      </div>
      <div aria-live="polite">
        {older === newer ? (
          <p>That is the same version twice.</p>
        ) : differences.length === 0 ? (
          <p>
            No item differs between {older} and {newer}: what differs is in the changes named above.
          </p>
        ) : (
          <>
            <p className="text-pencil">
              From {older} to {newer}: {differences.length}{' '}
              {differences.length === 1 ? 'item differs' : 'items differ'}.
            </p>
            <ul className="mt-1 divide-y divide-rule border-y border-rule">
              {differences.map(({ criterionId, what, text }) => (
                <li key={criterionId + what} className="py-2">
                  <a
                    className="underline decoration-rule underline-offset-4"
                    href={`#${criterionAnchor(criterionId)}`}
                  >
                    {text}
                  </a>
                </li>
              ))}
            </ul>
          </>
        )}
      </div>
    </div>
  );
}
