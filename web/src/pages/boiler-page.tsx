import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import type { Listing } from '#shared/listings/contract.ts';
import { laggingAnswers } from '#shared/listings/draft.ts';
import { listingStatusLabels } from '#shared/listings/machine.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { rubricVersion } from '#shared/surveys/rubric/index.ts';
import type { KnownBoiler } from '#shared/workings/from-boiler.ts';
import { GeneralArrangement } from '#web/drawings/general-arrangement.tsx';
import { useMe } from '#web/features/accounts/use-me.ts';
import { FittingsAndPapers, Nameplate, Sizes } from '#web/features/listings/facts.tsx';
import { listingQueries } from '#web/features/listings/queries.ts';
import { ReportsList } from '#web/features/listings/reports-list.tsx';
import { SellerActions } from '#web/features/listings/seller-actions.tsx';
import { unknownsOf } from '#web/features/listings/unknowns.ts';
import { TakeDown } from '#web/features/office/take-down.tsx';
import { EngineMatches } from '#web/features/workings/engine-matches.tsx';
import { ImpliedList } from '#web/features/workings/implied-list.tsx';
import { TestsDue } from '#web/features/workings/tests-due.tsx';
import { formatDay, formatInstant, formatMoney, formatRough } from '#web/lib/format.ts';
import { ButtonLink } from '#web/ui/button.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';
import { PhotoViewer } from '#web/ui/photo-viewer.tsx';
import { Timeline } from '#web/ui/timeline.tsx';

function Offer({ listing }: { listing: Listing }) {
  const { asking, terms, viewer, slug, id, status } = listing;
  const ways = [terms.canCollect ? 'collection' : '', terms.canCarry ? 'carriage' : '']
    .filter(Boolean)
    .join(' or ');
  return (
    <div className="border border-ink bg-sheet p-5">
      <p className="text-label text-pencil">Asking</p>
      <p className="text-[2.25rem] leading-tight font-medium tracking-tight">{formatMoney(asking)}</p>
      <p className="text-sm text-pencil">
        By {ways}
        {terms.carriageNote ? `: ${terms.carriageNote}` : ''}
        {terms.takesOffers ? ' Offers are heard.' : ' The price is firm.'}
      </p>
      {status !== 'published' && (
        <p className="mt-3">
          <Notice>{listingStatusLabels[status]}</Notice>
        </p>
      )}
      <div className="mt-4">
        {viewer.isSeller ? (
          <SellerActions id={id} events={viewer.events} />
        ) : (
          viewer.canCommission && (
            <>
              <ButtonLink to={sitePaths.commission(slug)} isWide>
                Commission a survey
              </ButtonLink>
              <p className="mt-2 text-sm leading-5 text-pencil">
                An independent surveyor examines it where it is. Your money is held until the report is in.
              </p>
            </>
          )
        )}
      </div>
    </div>
  );
}

function History({ listing }: { listing: Listing }) {
  const documents = new Map(listing.documents.map((each) => [each.id, each]));
  if (listing.history.length === 0)
    return <p className="text-pencil">The seller knows nothing of its history.</p>;
  return (
    <Timeline
      items={listing.history
        .toSorted((a, b) => a.when.localeCompare(b.when))
        .map(({ id, when, text, documentIds }) => ({
          id,
          when: formatRough(when),
          what: text,
          more: documentIds
            .flatMap((documentId) => documents.get(documentId) ?? [])
            .map((each) => (
              <a key={each.id} className="link mr-3" href={`/api/documents/${each.id}`}>
                {each.filename}
              </a>
            )),
        }))}
    />
  );
}

export function Component() {
  const { slug = '' } = useParams();
  const { data: listing } = useSuspenseQuery(listingQueries.detail(slug));
  const { facts, declaration } = listing;
  const unknowns = unknownsOf(facts);
  const me = useMe();
  const isOffice = me?.roles.includes('office') ?? false;
  const boiler: KnownBoiler = { facts, items: [], record: null };
  return (
    <Page
      title={listing.title}
      crumbs={[{ label: 'Boilers', to: sitePaths.boilers }, { label: listing.title }]}
      sub={`${listing.town.name}, ${listing.town.region} · offered by ${listing.seller.name}${listing.publishedAt ? `, listed ${formatDay(listing.publishedAt.slice(0, 10))}` : ''}`}
    >
      <div className="grid gap-8 lg:grid-cols-[minmax(0,7fr)_minmax(0,5fr)]">
        <PhotoViewer photos={listing.photos} title={listing.title} />
        <div className="grid content-start gap-6">
          <Offer listing={listing} />
          {isOffice && <TakeDown id={listing.id} status={listing.status} />}
          <Nameplate facts={facts} />
          <Caution title="No certificate.">
            Nothing on this page says that the boiler may be steamed. Your club’s or insurer’s boiler
            inspector does, under your local code.
          </Caution>
        </div>
      </div>
      <div className="mt-12 grid grid-cols-1 gap-x-12 lg:grid-cols-[minmax(0,7fr)_minmax(0,5fr)]">
        <div>
          <Section title="Survey reports">
            <ReportsList reports={listing.reports} />
          </Section>
          <Section title="General arrangement">
            <GeneralArrangement
              facts={facts}
              rubricVersion={rubricVersion}
              label="General arrangement of this type of boiler, in proportion to the seller’s sizes"
            />
            <p className="mt-2 text-sm text-pencil">
              Of the type, in proportion to the seller’s sizes; not a drawing of this very boiler. The numbers
              are those of the{' '}
              <Link className="link" to={sitePaths.method}>
                survey method
              </Link>
              .
            </p>
          </Section>
          <Section title="The seller says">
            <p className="max-w-prose whitespace-pre-line">{listing.description}</p>
            <dl className="mt-4 grid gap-3 sm:grid-cols-2">
              <div>
                <dt className="text-label text-pencil">Known defects</dt>
                <dd>{declaration.knownDefects}</dd>
              </div>
              <div>
                <dt className="text-label text-pencil">Known repairs</dt>
                <dd>{declaration.knownRepairs}</dd>
              </div>
              <div>
                <dt className="text-label text-pencil">Lagging</dt>
                <dd>{laggingAnswers[declaration.lagging]}</dd>
              </div>
            </dl>
            {declaration.lagging === 'not-known' && (
              <div className="mt-4">
                <Caution title="Old lagging may hold asbestos.">
                  Do not disturb it. Have it looked at by somebody who is licensed to, as your local law asks.
                </Caution>
              </div>
            )}
            {facts.construction === 'soft-soldered' && (
              <div className="mt-4">
                <Caution title="Soft solder in a pressure joint">
                  softens not far above the temperature of steam, and creeps below it. By our method that
                  alone is “Do not steam”.
                </Caution>
              </div>
            )}
          </Section>
          <Section title="Fittings and papers">
            <FittingsAndPapers facts={facts} />
            <TestsDue facts={facts} />
          </Section>
          <Section title="History">
            <History listing={listing} />
          </Section>
        </div>
        <div>
          <Section title="Sizes">
            <Sizes facts={facts} />
          </Section>
          <Section title="What the figures imply">
            <ImpliedList boiler={boiler} />
            <p className="mt-2 text-sm text-pencil">
              Worked out from the seller’s figures, which nobody has checked unless a report says so. Each
              leads to its working. The local code governs.
            </p>
          </Section>
          <Section title="Will it drive my engine">
            <EngineMatches boiler={boiler} isMember={me !== null} />
          </Section>
          <Section title="Not known">
            {unknowns.length === 0 ? (
              <p className="text-pencil">The seller has answered all we ask.</p>
            ) : (
              <ul className="divide-y divide-rule border-y border-rule">
                {unknowns.map(({ what, why }) => (
                  <li key={what} className="py-2">
                    {what}
                    <span className="block text-sm text-pencil">{why}</span>
                  </li>
                ))}
              </ul>
            )}
          </Section>
          <Section title="Record">
            <Timeline
              items={listing.record.map(({ event, label, at, by, reason }) => ({
                id: `${event}${at}`,
                when: formatInstant(at),
                what: label,
                more: [by, reason].filter(Boolean).join(': '),
              }))}
            />
          </Section>
        </div>
      </div>
    </Page>
  );
}
