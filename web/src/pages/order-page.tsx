import { useSuspenseQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import { orderStatusLabels } from '#shared/survey-orders/machine.ts';
import { extras, scopes } from '#shared/surveys/scopes.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { nextWords } from '#web/features/survey-orders/next-words.ts';
import { OrderActions } from '#web/features/survey-orders/order-actions.tsx';
import { surveyOrderQueries } from '#web/features/survey-orders/queries.ts';
import { QuotationTable } from '#web/features/survey-orders/quotation-table.tsx';
import { WaitingForPayment } from '#web/features/survey-orders/waiting-for-payment.tsx';
import { formatFromNow, formatInstant } from '#web/lib/format.ts';
import { KeyFigures } from '#web/ui/figures.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';
import { Photo } from '#web/ui/photo.tsx';
import { Timeline } from '#web/ui/timeline.tsx';

/** Before the boiler is examined, where it stands is what the page is for. */
const isAhead = ({ status }: SurveyOrder): boolean => status === 'arranged' || status === 'examining';

function Visit({ order }: { order: SurveyOrder }) {
  if (order.appointmentAt === null) return null;
  const { address } = order;
  return (
    <Section title="The visit">
      <p className="text-lg font-medium">{formatInstant(order.appointmentAt)}</p>
      {address ? (
        <address className="mt-2 not-italic">
          {[address.line1, address.line2, order.listing.town.name, address.postcode]
            .filter(Boolean)
            .join(', ')}
          {address.accessNotes && <span className="block text-pencil">{address.accessNotes}</span>}
        </address>
      ) : (
        <p className="mt-2 text-pencil">
          In {order.listing.town.name}. The address is between seller and surveyor.
        </p>
      )}
      {order.status === 'arranged' && (
        <p className="mt-3">
          <a className="link" href={`/api/survey-orders/${order.id}/calendar.ics`} download>
            Put it in my calendar
          </a>
        </p>
      )}
    </Section>
  );
}

export function Component() {
  useSignedIn();
  const { id = '' } = useParams();
  const [search] = useSearchParams();
  const { data: order } = useSuspenseQuery({ ...surveyOrderQueries.detail(id), refetchInterval: 20_000 });
  const { listing, surveyor, dueAt } = order;
  const isUnpaid = order.status === 'awaiting-payment' && order.part === 'buyer';
  const isBack = search.get('paid') === 'yes' && isUnpaid;
  return (
    <Page
      title={listing.title}
      crumbs={[
        { label: 'Surveys', to: sitePaths.surveys },
        { label: listing.title, to: sitePaths.listing(listing.slug) },
        { label: 'Survey' },
      ]}
      sub={`${scopes[order.scope].label} · ${listing.town.name}`}
    >
      <div className="grid gap-x-12 gap-y-10 lg:grid-cols-[minmax(0,7fr)_minmax(0,5fr)] lg:grid-rows-[auto_1fr]">
        <div>
          <div className="mb-8 border border-ink bg-sheet p-5">
            <output className="block text-xl font-bold">{orderStatusLabels[order.status]}</output>
            <p className="mt-1">{nextWords(order)}</p>
            {dueAt !== null && (
              <p className="mt-1 text-sm text-pencil">
                By {formatInstant(dueAt)} ({formatFromNow(dueAt)})
              </p>
            )}
          </div>
          {search.get('paid') === 'yes' && order.status === 'awaiting-surveyor' && (
            <div className="mb-6">
              <Notice kind="good">Paid, and held. The surveyor has been asked.</Notice>
            </div>
          )}
          {search.get('paid') === 'no' && isUnpaid && (
            <div className="mb-6">
              <Notice>You came back without paying. Nothing has been charged.</Notice>
            </div>
          )}
          {isAhead(order) && (
            <div className="mb-8">
              <Visit order={order} />
            </div>
          )}
          {isBack ? <WaitingForPayment order={order} /> : <OrderActions order={order} />}
          {!isAhead(order) && <Visit order={order} />}
        </div>
        <div className="lg:row-span-2">
          {listing.cover && (
            <div className="mb-8">
              <Photo photo={listing.cover} sizes="(min-width: 64rem) 28rem, 100vw" shape="4/3" isFirst />
            </div>
          )}
          <Section title="The order">
            <KeyFigures
              columns={1}
              items={[
                { label: 'Scope', value: scopes[order.scope].label },
                ...(order.extras.length > 0
                  ? [{ label: 'Besides', value: order.extras.map((extra) => extras[extra].label).join(', ') }]
                  : []),
                { label: 'Buyer', value: order.buyer.name },
                { label: 'Seller', value: order.seller.name },
                { label: 'Surveyor', value: `${surveyor.name}, no. ${surveyor.number}` },
              ]}
            />
          </Section>
          {order.quotation && (
            <Section title="Price">
              <QuotationTable quotation={order.quotation} hasSurveyorPart={order.part !== 'buyer'} />
            </Section>
          )}
        </div>
        <div>
          <Section title="Record">
            <Timeline
              items={order.record.map(({ event, label, at, by, reason }, index) => ({
                id: `${event}${at}${String(index)}`,
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
