import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { formatInstant, formatMoney } from '#web/lib/format.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button, ButtonLink } from '#web/ui/button.tsx';
import { Disclosure } from '#web/ui/disclosure.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { Section } from '#web/ui/page.tsx';
import { useOrderAct, usePayForSurvey } from './queries.ts';
import { ReasonDialog } from './reason-dialog.tsx';
import { AgreeTimeForm, ProposeTimesForm } from './time-forms.tsx';

function SimpleAct({
  act,
  order,
  label,
}: {
  act: 'accept' | 'begin' | 'acceptReport';
  order: SurveyOrder;
  label: string;
}) {
  const doIt = useOrderAct(act, order.id);
  return (
    <div className="grid gap-3">
      {doIt.isError && <Notice kind="bad">{messageOf(doIt.error)}</Notice>}
      <div>
        <Button
          isPending={doIt.isPending}
          onClick={() => {
            doIt.mutate({});
          }}
        >
          {label}
        </Button>
      </div>
    </div>
  );
}

function Pay({ order }: { order: SurveyOrder }) {
  const pay = usePayForSurvey(order.id);
  return (
    <div className="grid gap-3">
      {pay.isError && <Notice kind="bad">{messageOf(pay.error)}</Notice>}
      <div>
        <Button
          isPending={pay.isPending}
          onClick={() => {
            pay.mutate(undefined, {
              onSuccess: ({ checkoutUrl }) => {
                window.location.assign(checkoutUrl);
              },
            });
          }}
        >
          Pay{order.total ? ` ${formatMoney(order.total)}` : ''} on the card page
        </Button>
      </div>
    </div>
  );
}

const cancelWords = (order: SurveyOrder): string =>
  order.status === 'awaiting-payment'
    ? 'Nothing has been charged, and nothing will be.'
    : `${order.total ? formatMoney(order.total) : 'The money'} goes back whole to the buyer’s card, usually within a few days. The others are told.`;

/** What this person may do to the order now: only what the server says will work. */
export function OrderActions({ order }: { order: SurveyOrder }) {
  const can = (event: string): boolean => order.events.includes(event);
  const isWorking = order.status === 'examining' && order.part === 'surveyor';
  return (
    <div className="grid gap-6">
      {order.status === 'awaiting-payment' && order.part === 'buyer' && <Pay order={order} />}
      {can('accept') && <SimpleAct act="accept" order={order} label="Accept the job" />}
      {can('agreeTime') && <AgreeTimeForm order={order} />}
      {can('begin') && (
        <>
          <Caution title="You are working at a stranger’s premises.">
            Tell somebody where you are and when you will be done. Bring goggles, gloves and a meter; do not
            lift alone what two should lift.
          </Caution>
          <SimpleAct act="begin" order={order} label="Begin the examination" />
        </>
      )}
      {isWorking && (
        <div>
          <ButtonLink to={sitePaths.examination(order.id)}>Go on with the examination</ButtonLink>
        </div>
      )}
      {order.reportId !== null && (
        <div>
          <ButtonLink to={sitePaths.report(order.reportId)} kind={can('acceptReport') ? 'quiet' : 'primary'}>
            Read the report
          </ButtonLink>
        </div>
      )}
      {can('acceptReport') && (
        <SimpleAct act="acceptReport" order={order} label="Accept the report and release the fee" />
      )}
      {can('proposeTimes') &&
        (order.status === 'arranged' ? (
          <Disclosure summary="It cannot be at that time">
            <p className="mb-4">
              Propose other times. The one agreed falls away, and the seller is asked again.
            </p>
            <ProposeTimesForm orderId={order.id} />
          </Disclosure>
        ) : (
          <Section title={order.proposedTimes.length > 0 ? 'Propose times anew' : 'Propose times'}>
            {order.proposedTimes.length > 0 && (
              <p className="mb-4">
                Proposed so far: {order.proposedTimes.map((at) => formatInstant(at)).join('; ')}. New ones
                take their place.
              </p>
            )}
            <ProposeTimesForm orderId={order.id} />
          </Section>
        ))}
      <div className="flex flex-wrap gap-4">
        {can('decline') && (
          <ReasonDialog act="decline" orderId={order.id} label="Decline the job">
            The buyer’s money goes back whole, and they may ask another surveyor.
          </ReasonDialog>
        )}
        {can('abandon') && (
          <ReasonDialog act="abandon" orderId={order.id} label="Give the examination up">
            What you have recorded is kept but not filed, you are not paid, and the buyer’s money goes back
            whole.
          </ReasonDialog>
        )}
        {can('cancel') && (
          <ReasonDialog act="cancel" orderId={order.id} label="Cancel the survey">
            {cancelWords(order)}
          </ReasonDialog>
        )}
      </div>
    </div>
  );
}
