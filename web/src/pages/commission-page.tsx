import { keepPreviousData, useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { Problem } from '#shared/problem.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { orderClocks } from '#shared/survey-orders/machine.ts';
import { extras as extraWords, scopes } from '#shared/surveys/scopes.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { listingQueries } from '#web/features/listings/queries.ts';
import { Offers } from '#web/features/survey-orders/offers.tsx';
import { surveyOrderQueries, usePlaceSurveyOrder } from '#web/features/survey-orders/queries.ts';
import { QuotationTable } from '#web/features/survey-orders/quotation-table.tsx';
import { formatSum } from '#web/lib/format.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button, ButtonLink } from '#web/ui/button.tsx';
import { Check, Choices } from '#web/ui/check.tsx';
import { Loading } from '#web/ui/mark.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';

const scopeOptions = (Object.keys(scopes) as ScopeId[]).map((id) => ({
  id,
  label: scopes[id].label,
  hint: scopes[id].covers,
}));
const extraIds = Object.keys(extraWords) as ExtraId[];

function Terms() {
  return (
    <ul className="grid list-disc gap-1 pl-5 text-[0.9375rem]">
      <li>
        Your money is held. The surveyor is paid only after the report is in and you have had{' '}
        {orderClocks.reviewDays} days to read it.
      </li>
      <li>
        The surveyor accepts or declines within {orderClocks.acceptHours} hours; if not, everything comes back
        to you.
      </li>
      <li>You may cancel at any time before the examination begins, and everything comes back to you.</li>
      <li>
        If the seller or the surveyor cancels, or the surveyor gives the examination up, everything comes back
        to you.
      </li>
      <li>The verdict speaks of the day of examination. It is no certificate.</li>
    </ul>
  );
}

function Refusal({ error }: { error: Error }) {
  return (
    <Notice kind="bad">
      {messageOf(error)}
      {error instanceof Problem && error.slug === 'wrong-state' && (
        <>
          {' '}
          <Link className="link" to={sitePaths.surveys}>
            My surveys
          </Link>
        </>
      )}
    </Notice>
  );
}

export function Component() {
  const me = useSignedIn();
  const { slug = '' } = useParams();
  const { data: listing } = useSuspenseQuery(listingQueries.detail(slug));
  const [scope, setScope] = useState<ScopeId>('full');
  const [extras, setExtras] = useState<ExtraId[]>([]);
  const [surveyorId, setSurveyorId] = useState<string | null>(null);
  const [isAsked, setIsAsked] = useState(false);
  const [mustAsk, setMustAsk] = useState(false);
  const request = useRef<HTMLInputElement>(null);
  const place = usePlaceSurveyOrder();
  const quotes = useQuery({
    ...surveyOrderQueries.quotes(listing.id, { scope, extras }),
    placeholderData: keepPreviousData,
  });
  // Prices shown while new ones are on their way are not to be paid.
  const offer = quotes.isPlaceholderData
    ? undefined
    : quotes.data?.items.find(({ surveyor }) => surveyor.id === surveyorId);

  const pay = () => {
    if (!offer) return;
    if (!isAsked) {
      setMustAsk(true);
      request.current?.focus();
      return;
    }
    place.mutate(
      {
        listingId: listing.id,
        surveyorId: offer.surveyor.id,
        scope,
        extras,
        expectedTotal: offer.quotation.total,
        beginsWithinCancellationPeriod: true,
      },
      {
        onSuccess: ({ checkoutUrl }) => {
          window.location.assign(checkoutUrl);
        },
        onError: (error) => {
          // The price or the surveyor is no longer as shown: show how it is now, and ask again.
          if (error instanceof Problem && error.slug === 'invalid-input') void quotes.refetch();
        },
      },
    );
  };

  if (listing.viewer.isSeller) {
    return (
      <Page title="Commission a survey" isNarrow>
        <Notice>
          This boiler is yours. A survey is commissioned by a buyer, so that the surveyor owes you nothing.
        </Notice>
      </Page>
    );
  }
  return (
    <Page
      title="Commission a survey"
      crumbs={[
        { label: 'Boilers', to: sitePaths.boilers },
        { label: listing.title, to: sitePaths.listing(slug) },
        { label: 'Survey' },
      ]}
      sub={`${listing.title}, ${listing.town.name}`}
      isNarrow
    >
      {!me.emailVerified && (
        <div className="mb-6">
          <Notice kind="bad">
            Confirm your e-mail address before you commission a survey: open the letter we sent when you
            joined.
            <span className="mt-2 block">
              <ButtonLink to={sitePaths.account} kind="quiet">
                My account
              </ButtonLink>
            </span>
          </Notice>
        </div>
      )}
      <Section title="What is to be examined">
        <Choices
          name="scope"
          value={scope}
          options={scopeOptions}
          onChange={(next) => {
            place.reset();
            setScope(next);
          }}
        />
        <h3 className="mt-6 mb-1">Besides</h3>
        {extraIds.map((id) => (
          <Check
            key={id}
            label={extraWords[id].label}
            hint={extraWords[id].covers}
            checked={extras.includes(id)}
            onChange={(event) => {
              place.reset();
              setExtras(
                event.target.checked ? [...extras, id].toSorted() : extras.filter((each) => each !== id),
              );
            }}
          />
        ))}
      </Section>
      <Section title="By whom">
        {quotes.isPending && <Loading what="Asking who could come" />}
        {quotes.error && (
          <Notice kind="bad">
            {messageOf(quotes.error)}{' '}
            <Button kind="plain" onClick={() => void quotes.refetch()}>
              Try again
            </Button>
          </Notice>
        )}
        {quotes.data && (
          <div aria-busy={quotes.isPlaceholderData} className={quotes.isPlaceholderData ? 'opacity-60' : ''}>
            <Offers
              offers={quotes.data.items}
              chosen={surveyorId}
              onChoose={(id) => {
                place.reset();
                setSurveyorId(id);
              }}
            />
          </div>
        )}
      </Section>
      {place.isError && !offer && <Refusal error={place.error} />}
      {offer && (
        <Section title="What it costs">
          <QuotationTable quotation={offer.quotation} />
          <h3 className="mt-6 mb-2">What you agree to</h3>
          <Terms />
          <div className="mt-4">
            <Check
              label="Please begin as soon as can be arranged"
              hint="A contract made at a distance may be cancelled for fourteen days. I ask for the work to begin within them, and know that once the report is filed I can no longer cancel."
              checked={isAsked}
              ref={request}
              error={mustAsk && !isAsked ? 'Ask for the work to begin, or wait fourteen days' : undefined}
              onChange={(event) => {
                setIsAsked(event.target.checked);
              }}
            />
          </div>
          <div className="mt-4 grid gap-4">
            <Caution title="Nobody is to light this boiler for you before the surveyor comes.">
              A photograph under steam proves nothing and may hurt somebody.
            </Caution>
            {place.isError && <Refusal error={place.error} />}
            <Button isPending={place.isPending} disabled={!me.emailVerified} onClick={pay}>
              Pay {formatSum(offer.quotation.total)} on the card page
            </Button>
          </div>
        </Section>
      )}
    </Page>
  );
}
