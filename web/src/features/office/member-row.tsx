import { useState } from 'react';
import type { z } from 'zod';
import { roles } from '#shared/accounts/roles.ts';
import type { Role } from '#shared/accounts/roles.ts';
import type { officeMember } from '#shared/office/contract.ts';
import { formatDay } from '#web/lib/format.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { ReasonForm } from '#web/ui/reason-form.tsx';
import { useChangeRole } from './queries.ts';

type Member = z.infer<typeof officeMember>;

/** A member, and the roles that can be granted or withdrawn, each with a reason for the record. */
export function MemberRow({ member }: { member: Member }) {
  const [asked, setAsked] = useState<{ role: Role; change: 'grant' | 'withdraw' }>();
  const [reason, setReason] = useState('');
  const changeRole = useChangeRole(member.id);
  const close = () => {
    setAsked(undefined);
    setReason('');
    changeRole.reset();
  };
  const words = asked
    ? `${asked.change === 'grant' ? 'Grant' : 'Withdraw'} the role ${roles[asked.role].toLowerCase()}`
    : '';
  return (
    <li className="grid gap-x-8 gap-y-2 py-4 sm:grid-cols-[minmax(0,1fr)_auto]">
      <div>
        <h2 className="text-lg">{member.name}</h2>
        <p className="text-sm text-pencil">
          {member.email} · joined {formatDay(member.joinedAt.slice(0, 10))} ·{' '}
          {member.roles.length > 0 ? member.roles.map((role) => roles[role]).join(', ') : 'Member'}
        </p>
      </div>
      <div className="flex flex-wrap gap-2">
        {(Object.keys(roles) as Role[]).map((role) => {
          const change = member.roles.includes(role) ? 'withdraw' : 'grant';
          return (
            <Button
              key={role}
              kind={change === 'withdraw' ? 'danger' : 'quiet'}
              onClick={() => {
                setAsked({ role, change });
              }}
            >
              {change === 'withdraw' ? 'Withdraw' : 'Grant'} {roles[role].toLowerCase()}
              <span className="sr-only"> for {member.name}</span>
            </Button>
          );
        })}
      </div>
      <Dialog title={words} isOpen={asked !== undefined} onClose={close}>
        <ReasonForm
          hint="Kept in the record"
          label={words}
          kind={asked?.change === 'withdraw' ? 'danger' : 'primary'}
          reason={reason}
          onReason={setReason}
          isPending={changeRole.isPending}
          error={changeRole.error}
          onSubmit={() => {
            if (asked) changeRole.mutate({ ...asked, reason }, { onSuccess: close });
          }}
        >
          {member.name}. It takes effect at their next request.
        </ReasonForm>
      </Dialog>
    </li>
  );
}
