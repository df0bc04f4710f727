import { useState } from 'react';
import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import { Problem } from '#shared/problem.ts';
import { formatInstant } from '#web/lib/format.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Choices } from '#web/ui/check.tsx';
import { Field, FieldGroup } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useOrderAct } from './queries.ts';

const zone = () => Intl.DateTimeFormat().resolvedOptions().timeZone;

/** One to five times, in the surveyor's own zone; sent as instants. */
export function ProposeTimesForm({ orderId }: { orderId: string }) {
  const propose = useOrderAct('proposeTimes', orderId);
  const [times, setTimes] = useState(['', '', '']);
  const [isEmpty, setIsEmpty] = useState(false);
  const filled = times.flatMap((text, index) =>
    text === '' ? [] : [{ at: new Date(text).toISOString(), index }],
  );
  const faults = propose.error instanceof Problem ? propose.error.errors : [];
  // Empty boxes are not sent, so the server counts only those that are filled.
  const faultOf = (index: number): string | undefined => {
    if (isEmpty && filled.length === 0 && index === 0) return 'Propose at least one time';
    const place = filled.findIndex((each) => each.index === index);
    return place < 0
      ? undefined
      : faults.find(({ pointer }) => pointer === `#/times/${String(place)}`)?.detail;
  };
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        setIsEmpty(filled.length === 0);
        if (filled.length === 0) return;
        propose.mutate(
          { times: filled.map(({ at }) => at) },
          {
            onSuccess: () => {
              setTimes(['', '', '']);
            },
          },
        );
      }}
    >
      {propose.isError && <Notice kind="bad">{messageOf(propose.error)}</Notice>}
      <div className="grid gap-4 sm:grid-cols-2">
        {times.map((text, index) => (
          <Field key={index} label={`Time ${String(index + 1)}`} error={faultOf(index)}>
            {(control) => (
              <input
                {...control}
                type="datetime-local"
                value={text}
                onChange={(event) => {
                  setTimes(times.with(index, event.target.value));
                }}
              />
            )}
          </Field>
        ))}
      </div>
      <p className="text-sm text-pencil">Your own clock: {zone()}. The seller sees theirs.</p>
      <div className="flex flex-wrap gap-4">
        <Button type="submit" isPending={propose.isPending}>
          Propose {filled.length === 1 ? 'this time' : 'these times'}
        </Button>
        {times.length < 5 && (
          <Button
            kind="plain"
            onClick={() => {
              setTimes([...times, '']);
            }}
          >
            One more
          </Button>
        )}
      </div>
    </form>
  );
}

/** The seller takes one of the times proposed. */
export function AgreeTimeForm({ order }: { order: SurveyOrder }) {
  const agree = useOrderAct('agreeTime', order.id);
  const [chosen, setChosen] = useState<string | null>(null);
  const [isUndecided, setIsUndecided] = useState(false);
  if (order.proposedTimes.length === 0)
    return <p>The surveyor has not proposed a time yet. You get a letter when they do.</p>;
  return (
    <form
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        setIsUndecided(chosen === null);
        if (chosen !== null) agree.mutate({ startsAt: chosen });
      }}
    >
      {agree.isError && <Notice kind="bad">{messageOf(agree.error)}</Notice>}
      <FieldGroup
        legend="Times the surveyor proposes"
        hint="Your address is shown to the surveyor when you agree one, and not before."
        error={isUndecided && chosen === null ? 'Choose one of the times' : undefined}
      >
        <Choices
          name="time"
          value={chosen}
          options={order.proposedTimes.map((at) => ({ id: at, label: formatInstant(at) }))}
          onChange={setChosen}
        />
      </FieldGroup>
      <div>
        <Button type="submit" isPending={agree.isPending}>
          Agree this time
        </Button>
      </div>
    </form>
  );
}
