import { useState } from 'react';
import { Problem } from '#shared/problem.ts';
import { mostRepairs, newRepair } from '#shared/surveys/replies-contract.ts';
import type { ReportReplies } from '#shared/surveys/replies-contract.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { formatDay } from '#web/lib/format.ts';
import { Button } from '#web/ui/button.tsx';
import { Disclosure } from '#web/ui/disclosure.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useListRepair } from './queries.ts';

/** What the seller says was done since the examination; the seller may add to it. */
export function RepairsSince({ reportId, replies }: { reportId: string; replies: ReportReplies }) {
  const { repairs, viewer } = replies;
  return (
    <div className="grid gap-3">
      <p className="max-w-prose text-pencil">
        The seller’s word. No surveyor has looked at these, and the grades stay as found on the day.
      </p>
      {repairs.length > 0 && (
        <ul className="divide-y divide-rule border-y border-rule">
          {repairs.map(({ id, text, doneOn, at }) => (
            <li key={id} className="grid gap-x-6 py-3 sm:grid-cols-[11rem_minmax(0,1fr)]">
              <span className="font-medium">{formatDay(doneOn)}</span>
              <span>
                <span className="whitespace-pre-line">{text}</span>
                <span className="block text-sm text-pencil">Listed {formatDay(at.slice(0, 10))}</span>
              </span>
            </li>
          ))}
        </ul>
      )}
      {viewer.canReply && repairs.length < mostRepairs && (
        <div className="print:hidden">
          <Disclosure summary="List a repair">
            <RepairForm reportId={reportId} />
          </Disclosure>
        </div>
      )}
    </div>
  );
}

function RepairForm({ reportId }: { reportId: string }) {
  const [text, setText] = useState('');
  const [doneOn, setDoneOn] = useState('');
  const [faults, setFaults] = useState<ReadonlyMap<string, string>>(new Map());
  const list = useListRepair(reportId);
  const refused = list.error instanceof Problem ? list.error.errors : [];
  const faultOf = (field: string) =>
    faults.get(field) ?? refused.find(({ pointer }) => pointer === `#/${field}`)?.detail;
  return (
    <form
      className="grid max-w-prose gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        const read = newRepair.safeParse({ text, doneOn });
        setFaults(new Map(read.error?.issues.map(({ path, message }) => [String(path[0]), message])));
        if (!read.success) return;
        list.mutate(read.data, {
          onSuccess: () => {
            setText('');
            setDoneOn('');
          },
        });
      }}
    >
      {list.isError && refused.length === 0 && <Notice kind="bad">{messageOf(list.error)}</Notice>}
      <Field
        label="What was done"
        hint="Everyone reads it, and it cannot be changed after. At most 600 characters."
        error={faultOf('text')}
      >
        {(control) => (
          <textarea
            {...control}
            rows={3}
            maxLength={600}
            value={text}
            onChange={({ target }) => {
              setText(target.value);
            }}
          />
        )}
      </Field>
      <div className="w-56">
        <Field label="Done on" error={faultOf('doneOn')}>
          {(control) => (
            <input
              {...control}
              type="date"
              value={doneOn}
              onChange={({ target }) => {
                setDoneOn(target.value);
              }}
            />
          )}
        </Field>
      </div>
      <div>
        <Button type="submit" kind="quiet" isPending={list.isPending}>
          List the repair
        </Button>
      </div>
    </form>
  );
}
