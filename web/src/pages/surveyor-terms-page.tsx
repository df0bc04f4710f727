import { useSuspenseQuery } from '@tanstack/react-query';
import { Problem } from '#shared/problem.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { TownInput } from '#web/features/listings/town-input.tsx';
import { surveyorQueries, useStartPayoutSetUp } from '#web/features/surveyors/queries.ts';
import { TermsForm } from '#web/features/surveyors/terms-form.tsx';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';

function Payouts({ hasTerms, isReady }: { hasTerms: boolean; isReady: boolean }) {
  const start = useStartPayoutSetUp();
  if (isReady) return <p>Set up. Fees go there when a report is accepted.</p>;
  if (!hasTerms) return <p className="text-pencil">Save your particulars first.</p>;
  return (
    <div className="grid gap-3">
      <p>
        Your fees are kept for you until you say where they go. The payment service asks for your bank account
        on its own page; we never see it.
      </p>
      {start.isError && <Notice kind="bad">{messageOf(start.error)}</Notice>}
      <div>
        <Button
          kind="quiet"
          isPending={start.isPending}
          onClick={() => {
            start.mutate(undefined, {
              onSuccess: ({ url }) => {
                window.location.assign(url);
              },
            });
          }}
        >
          Set up where fees are paid
        </Button>
      </div>
    </div>
  );
}

export function Component() {
  const me = useSignedIn();
  if (!me.roles.includes('surveyor'))
    throw new Problem('not-permitted', 'This page is for surveyors. The office grants that role.');
  const { data } = useSuspenseQuery(surveyorQueries.mine());
  return (
    <Page
      title="My terms as a surveyor"
      crumbs={[{ label: 'Surveys', to: sitePaths.surveys }, { label: 'Terms' }]}
      sub={
        data.number === null
          ? 'Until these are given you are not offered to buyers.'
          : `Surveyor no. ${data.number}`
      }
      isNarrow
    >
      <Section title="Payouts">
        <Payouts hasTerms={data.terms !== null} isReady={data.payoutsReady} />
      </Section>
      <Section title="Particulars">
        <TermsForm
          terms={data.terms}
          townInput={(onChoose, error) => (
            <TownInput
              label="Your nearest town"
              town={data.town}
              error={error}
              onChoose={({ id }) => {
                onChoose(id);
              }}
            />
          )}
        />
      </Section>
    </Page>
  );
}
