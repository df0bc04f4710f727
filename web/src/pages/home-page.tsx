import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { HowCommission, HowDecide, HowExamine, HowList } from '#web/drawings/how.tsx';
import { EntrySkeleton, ListingEntry } from '#web/features/listings/entry.tsx';
import { listingQueries } from '#web/features/listings/queries.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { ButtonLink } from '#web/ui/button.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';

const steps = [
  {
    Drawing: HowList,
    title: 'A seller lists it',
    text: 'Sizes, papers, history, and photographs of the parts that matter.',
  },
  {
    Drawing: HowCommission,
    title: 'You commission a survey',
    text: 'You see every line of the price first. The money is held, not paid.',
  },
  {
    Drawing: HowExamine,
    title: 'A surveyor examines it',
    text: 'Where it stands, by a published method: cold, under water, under steam.',
  },
  {
    Drawing: HowDecide,
    title: 'You decide',
    text: 'A verdict with its reasons, and what it would cost to put right.',
  },
];

function Newest() {
  const { data, error } = useQuery(listingQueries.newest(3));
  if (error) return <Notice kind="bad">{messageOf(error)}</Notice>;
  return (
    <div className="grid gap-x-8 gap-y-10 sm:grid-cols-2 lg:grid-cols-3">
      {data
        ? data.items.map((listing, index) => (
            <ListingEntry key={listing.id} listing={listing} isFirst={index === 0} />
          ))
        : [0, 1, 2].map((index) => <EntrySkeleton key={index} />)}
    </div>
  );
}

export function Component() {
  return (
    <Page
      title="Secondhand model boilers, examined before you pay for them"
      sub="An independent surveyor tests the boiler where it is. Your money is held until you have the report."
    >
      <p className="mb-10 flex flex-wrap gap-4">
        <ButtonLink to={sitePaths.boilers}>See the boilers</ButtonLink>
        <ButtonLink to={sitePaths.sellStart} kind="quiet">
          Sell one
        </ButtonLink>
      </p>
      <Section
        title="Lately listed"
        aside={
          <Link className="link" to={sitePaths.boilers}>
            All boilers
          </Link>
        }
      >
        <Newest />
      </Section>
      <Section
        title="How a survey works"
        aside={
          <Link className="link" to={sitePaths.method}>
            The method, in full
          </Link>
        }
      >
        <ol className="grid gap-x-8 gap-y-8 sm:grid-cols-2 lg:grid-cols-4">
          {steps.map(({ Drawing, title, text }, index) => (
            <li key={title}>
              <div className="border border-rule bg-sheet p-3">
                <Drawing />
              </div>
              <h3 className="mt-3">
                {index + 1}. {title}
              </h3>
              <p className="text-pencil">{text}</p>
            </li>
          ))}
        </ol>
      </Section>
      <div className="mt-10 max-w-prose">
        <Caution title="A pressure vessel can kill.">
          Tubeplate issues no certificate. A report says what was found on one day; your club’s or insurer’s
          boiler inspector decides whether a boiler may be steamed, under your local code.
        </Caution>
      </div>
    </Page>
  );
}
