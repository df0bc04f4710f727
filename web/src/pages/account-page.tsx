import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { NameForm } from '#web/features/accounts/name-form.tsx';
import { accountQueries, useResendVerification, useSignOut } from '#web/features/accounts/queries.ts';
import { SecondFactor } from '#web/features/accounts/second-factor.tsx';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { EngineList } from '#web/features/engines/engine-list.tsx';
import { formatInstant } from '#web/lib/format.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button, ButtonLink } from '#web/ui/button.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { Page, Section } from '#web/ui/page.tsx';
import { Table } from '#web/ui/table.tsx';

function Address() {
  const me = useSignedIn();
  const resend = useResendVerification();
  if (me.emailVerified) return <p>{me.email}, confirmed.</p>;
  return (
    <div className="grid gap-3">
      <p>{me.email} is not confirmed yet. Until it is, you cannot list a boiler or commission a survey.</p>
      <div>
        <Button
          kind="quiet"
          isPending={resend.isPending}
          onClick={() => {
            resend.mutate({ email: me.email });
          }}
        >
          Send the letter again
        </Button>
      </div>
      {resend.isSuccess && <Notice kind="good">A letter is on its way.</Notice>}
      {resend.isError && <Notice kind="bad">{messageOf(resend.error)}</Notice>}
    </div>
  );
}

function Devices() {
  const { data: sessions } = useSuspenseQuery(accountQueries.sessions());
  const signOut = useSignOut();
  const navigate = useNavigate();
  const [isAsking, setIsAsking] = useState(false);
  const leave = (isEverywhere: boolean) => {
    signOut.mutate({ isEverywhere }, { onSettled: () => void navigate(sitePaths.home) });
  };
  return (
    <div className="grid gap-4">
      <Table
        caption="Devices signed in as you"
        rows={sessions}
        keyOf={({ token }) => token}
        columns={[
          { head: 'Since', cell: ({ createdAt }) => formatInstant(createdAt) },
          { head: 'Browser', cell: ({ userAgent }) => (userAgent ?? 'Not known').slice(0, 80) },
        ]}
      />
      <div className="flex flex-wrap gap-4">
        <Button
          kind="quiet"
          isPending={signOut.isPending}
          onClick={() => {
            leave(false);
          }}
        >
          Sign out
        </Button>
        {isAsking ? (
          <Button
            kind="danger"
            isPending={signOut.isPending}
            onClick={() => {
              leave(true);
            }}
          >
            Yes, sign out everywhere
          </Button>
        ) : (
          <Button
            kind="plain"
            onClick={() => {
              setIsAsking(true);
            }}
          >
            Sign out everywhere
          </Button>
        )}
      </div>
    </div>
  );
}

export function Component() {
  const me = useSignedIn();
  return (
    <Page
      title="Account"
      isNarrow
      aside={
        me.roles.includes('surveyor') ? (
          <ButtonLink kind="quiet" to={sitePaths.surveyorTerms}>
            My terms as a surveyor
          </ButtonLink>
        ) : undefined
      }
    >
      <Section title="Name">
        <NameForm me={me} />
      </Section>
      <Section title="E-mail address">
        <Address />
      </Section>
      <Section title="My engines">
        <EngineList />
      </Section>
      <Section title="Second factor">
        <SecondFactor me={me} />
      </Section>
      <Section title="Devices">
        <Devices />
      </Section>
    </Page>
  );
}
