import { useState } from 'react';
import { newReply } from '#shared/surveys/replies-contract.ts';
import type { ReportReplies } from '#shared/surveys/replies-contract.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { formatDay } from '#web/lib/format.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useReplyToFinding } from './queries.ts';

interface Props {
  reportId: string;
  /** The version on the page. */
  version: number;
  criterion: { id: string; title: string };
  replies: ReportReplies;
}

/** Under a finding: what the seller answered, or, for the seller, room to answer once. */
export function FindingReply({ reportId, version, criterion, replies }: Props) {
  const reply = replies.replies.find(({ criterionId }) => criterionId === criterion.id);
  if (reply !== undefined)
    return (
      <div className="border-l-2 border-brass pl-3">
        <p className="text-sm text-pencil">
          The seller answered on {formatDay(reply.at.slice(0, 10))}
          {reply.version !== version && `, to version ${String(reply.version)}`}
        </p>
        <p className="whitespace-pre-line">{reply.text}</p>
      </div>
    );
  return replies.viewer.canReply ? (
    <details className="print:hidden">
      <summary className="min-h-11 py-2.5 text-sm leading-6 font-medium marker:text-copper">
        Answer this<span className="sr-only">: {criterion.title}</span>
      </summary>
      <ReplyForm reportId={reportId} criterionId={criterion.id} />
    </details>
  ) : null;
}

function ReplyForm({ reportId, criterionId }: { reportId: string; criterionId: string }) {
  const [text, setText] = useState('');
  const [fault, setFault] = useState<string>();
  const answer = useReplyToFinding(reportId);
  return (
    <form
      className="grid gap-3"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        const read = newReply.safeParse({ criterionId, text });
        setFault(read.error?.issues[0]?.message);
        if (read.success) answer.mutate(read.data);
      }}
    >
      {answer.isError && <Notice kind="bad">{messageOf(answer.error)}</Notice>}
      <Field
        label="Your answer"
        hint="Everyone reads it. You answer once and cannot change it after; the grade stays. At most 600 characters."
        error={fault}
      >
        {(control) => (
          <textarea
            {...control}
            rows={4}
            maxLength={600}
            value={text}
            onChange={({ target }) => {
              setText(target.value);
            }}
          />
        )}
      </Field>
      <div>
        <Button type="submit" kind="quiet" isPending={answer.isPending}>
          Publish the answer
        </Button>
      </div>
    </form>
  );
}
