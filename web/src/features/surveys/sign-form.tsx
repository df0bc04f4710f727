import { useState } from 'react';
import { Problem } from '#shared/problem.ts';
import type { Report } from '#shared/surveys/contract.ts';
import { signOff } from '#shared/surveys/record.ts';
import type { SurveyResult } from '#shared/surveys/result.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Check } from '#web/ui/check.tsx';
import { Field } from '#web/ui/field.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { useFileSurvey } from './queries.ts';
import type { Draft } from './use-draft.ts';

interface Props {
  orderId: string;
  draft: Draft;
  /** The result shown above; the server must come to the same. */
  result: SurveyResult;
  onFiled: (report: Report) => void;
}

/** The declaration, and the surveyor's name under it. */
export function SignForm({ orderId, draft, result, onFiled }: Props) {
  const [name, setName] = useState('');
  const [independent, setIndependent] = useState(false);
  const [limitsUnderstood, setLimitsUnderstood] = useState(false);
  const [faults, setFaults] = useState<ReadonlyMap<string, string>>(new Map());
  const [trouble, setTrouble] = useState<string[]>([]);
  const [isSaving, setIsSaving] = useState(false);
  const filing = useFileSurvey(orderId);

  const submit = async () => {
    const signed = signOff.safeParse({
      name,
      signedAt: new Date().toISOString(),
      independent,
      limitsUnderstood,
    });
    setFaults(new Map(signed.error?.issues.map(({ path, message }) => [String(path[0]), message])));
    setTrouble([]);
    if (!signed.success) return;
    setIsSaving(true);
    const isSaved = await draft.store.flush();
    setIsSaving(false);
    if (!isSaved) {
      setTrouble([
        'Your last entries could not be saved, so nothing was filed. Try again when there is a signal.',
      ]);
      return;
    }
    const { version } = draft.store.getState();
    filing.mutate(
      { version, signOff: signed.data, result },
      {
        onSuccess: onFiled,
        onError: (error) => {
          const errors = error instanceof Problem ? error.errors.map(({ detail }) => detail) : [];
          setTrouble([messageOf(error), ...errors]);
        },
      },
    );
  };

  return (
    <form
      aria-label="Sign and file"
      className="grid gap-4 border-t border-ink pt-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <h2>Sign and file</h2>
      <Caution title="A filed report is never changed.">
        It is no certificate, and says nothing of any day but the day of examination. Whether the boiler may
        be steamed is for the boiler inspector, under the local code.
      </Caution>
      <Check
        label="I am independent of the seller and of the buyer, and gain nothing by the sale."
        checked={independent}
        error={faults.get('independent')}
        onChange={({ target }) => {
          setIndependent(target.checked);
        }}
      />
      <Check
        label="I examined this boiler myself, recorded what I found, and understand the limits of the report."
        checked={limitsUnderstood}
        error={faults.get('limitsUnderstood')}
        onChange={({ target }) => {
          setLimitsUnderstood(target.checked);
        }}
      />
      <Field label="Your full name, as your signature" error={faults.get('name')}>
        {(control) => (
          <input
            {...control}
            autoComplete="name"
            maxLength={120}
            value={name}
            onChange={({ target }) => {
              setName(target.value);
            }}
          />
        )}
      </Field>
      {trouble.length > 0 && (
        <Notice kind="bad">
          {trouble.map((sentence) => (
            <p key={sentence}>{sentence}</p>
          ))}
        </Notice>
      )}
      <Button type="submit" isWide isPending={isSaving || filing.isPending}>
        File the report
      </Button>
    </form>
  );
}
