import { Link } from 'react-router-dom';
import { materials } from '#shared/boilers/boiler.ts';
import { boilerTypeOf } from '#shared/boilers/boiler-types.ts';
import type { ListingSummary } from '#shared/listings/contract.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { formatMoney } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Photo } from '#web/ui/photo.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

/** One boiler in a list: its picture first, then what a buyer asks. */
export function ListingEntry({ listing, isFirst = false }: { listing: ListingSummary; isFirst?: boolean }) {
  const { show } = useUnits();
  const { slug, title, type, material, cover, asking, town, verdict, condition, evidence } = listing;
  return (
    <article className="group relative grid content-start gap-3 border-t border-rule pt-3">
      {cover ? (
        <Photo
          photo={{ ...cover, alt: '' }}
          shape="4/3"
          isFirst={isFirst}
          sizes="(min-width: 64rem) 24rem, (min-width: 40rem) 46vw, 100vw"
        />
      ) : (
        <div className="aspect-[4/3] bg-rule" />
      )}
      <div>
        <h3>
          <Link
            to={sitePaths.listing(slug)}
            className="after:absolute after:inset-0 group-hover:underline group-hover:underline-offset-4"
          >
            {title}
          </Link>
        </h3>
        <p className="text-sm text-pencil">
          {boilerTypeOf(type).label}, {materials[material].toLowerCase()} · {town.name}
        </p>
      </div>
      <dl className="grid grid-cols-3 gap-x-4 text-sm">
        <div>
          <dt className="text-pencil">Asking</dt>
          <dd className="text-lg font-medium">{formatMoney(asking)}</dd>
        </div>
        <div>
          <dt className="text-pencil">Claimed</dt>
          <dd className="text-lg font-medium">{show('pressure', listing.workingPressurePa)}</dd>
        </div>
        <div>
          <dt className="text-pencil">Holds</dt>
          <dd className="text-lg font-medium">{show('volume', listing.waterCapacityL)}</dd>
        </div>
      </dl>
      <p className="flex flex-wrap items-baseline justify-between gap-x-4 border-t border-rule pt-2 text-sm">
        <VerdictMark verdict={verdict} />
        {verdict !== null && (
          <span className="text-pencil">
            Condition {condition ?? '–'}, evidence {evidence ?? 0} %
          </span>
        )}
      </p>
    </article>
  );
}

/** Holds the place of an entry while it is fetched. */
export function EntrySkeleton() {
  return (
    <div aria-hidden="true" className="grid content-start gap-3 border-t border-rule pt-3">
      <div className="aspect-[4/3] bg-rule/60" />
      <div className="h-[3.1rem] w-3/4 bg-rule/60" />
      <div className="h-12 bg-rule/60" />
      <div className="h-8 border-t border-rule" />
    </div>
  );
}
