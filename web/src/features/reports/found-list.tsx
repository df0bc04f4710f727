import type { ReactNode } from 'react';
import type { Report } from '#shared/surveys/contract.ts';
import { foundGroups, groupFound } from '#shared/surveys/found.ts';
import type { Found, FoundGroup } from '#shared/surveys/found.ts';
import { FoundItem } from './found-item.tsx';

const abouts: Partial<Record<FoundGroup, string>> = {
  must: 'Nothing else makes up for these.',
  notExamined: 'Nobody can say how these are.',
};

/** Everything that applies to this boiler, the most pressing first. */
export function FoundList({ report, under }: { report: Report; under?: (found: Found) => ReactNode }) {
  return (
    <div className="grid gap-8">
      {[...groupFound(report)]
        .filter(([, items]) => items.length > 0)
        .map(([group, items]) => (
          <section key={group} aria-label={foundGroups[group]}>
            <h3 className="border-b border-rule pb-1">
              {foundGroups[group]} <span className="font-normal text-pencil">{items.length}</span>
            </h3>
            {abouts[group] !== undefined && <p className="pt-1 text-sm text-pencil">{abouts[group]}</p>}
            <div className={group === 'well' ? 'gap-x-10 lg:columns-2' : ''}>
              {items.map((found) => (
                <FoundItem
                  key={found.criterion.id}
                  found={found}
                  photos={report.photos}
                  under={under?.(found)}
                />
              ))}
            </div>
          </section>
        ))}
    </div>
  );
}
