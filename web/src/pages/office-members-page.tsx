import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useDeferredValue, useState } from 'react';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { MemberRow } from '#web/features/office/member-row.tsx';
import { OfficeFrame } from '#web/features/office/office-frame.tsx';
import { officeQueries } from '#web/features/office/queries.ts';
import { requireOffice } from '#web/features/office/require-office.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Field } from '#web/ui/field.tsx';
import { Loading } from '#web/ui/mark.tsx';
import { Empty, Notice } from '#web/ui/notes.tsx';

export function Component() {
  requireOffice(useSignedIn());
  const [text, setText] = useState('');
  const { data, error } = useQuery({
    ...officeQueries.members(useDeferredValue(text)),
    placeholderData: keepPreviousData,
  });
  return (
    <OfficeFrame
      title="Members"
      sub="Everyone may sell and buy. Surveyor and office are roles granted on top."
    >
      <div className="mb-4 max-w-sm">
        <Field label="Name or e-mail address">
          {(control) => (
            <input
              {...control}
              type="search"
              maxLength={80}
              value={text}
              onChange={(event) => {
                setText(event.target.value);
              }}
            />
          )}
        </Field>
      </div>
      {error && <Notice kind="bad">{messageOf(error)}</Notice>}
      {!data && !error && <Loading />}
      {data?.items.length === 0 && <Empty title="Nobody by that name" />}
      <ul className="divide-y divide-rule border-y border-rule">
        {data?.items.map((member) => (
          <MemberRow key={member.id} member={member} />
        ))}
      </ul>
    </OfficeFrame>
  );
}
