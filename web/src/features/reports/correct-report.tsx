import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { correctionReason } from '#shared/surveys/corrections-contract.ts';
import type { ReportVersions } from '#shared/surveys/corrections-contract.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button, ButtonLink } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useStartCorrection } from './queries.ts';

interface Props {
  reportId: string;
  viewer: ReportVersions['viewer'];
}

/** For the surveyor who filed the report: begin a correction, or go on with the one that is open. */
export function CorrectReport({ reportId, viewer }: Props) {
  const [isOpen, setIsOpen] = useState(false);
  const [reason, setReason] = useState('');
  const [fault, setFault] = useState<string>();
  const navigate = useNavigate();
  const start = useStartCorrection(reportId);
  if (viewer.correctingOrderId !== null)
    return (
      <div className="mb-6">
        <Notice>
          <p className="mb-3">You have begun a correction. Nobody sees it until you sign and file it.</p>
          <ButtonLink to={sitePaths.examination(viewer.correctingOrderId)}>
            Go on with the correction
          </ButtonLink>
        </Notice>
      </div>
    );
  if (!viewer.canCorrect) return null;
  return (
    <div className="mb-6">
      <Button
        kind="quiet"
        onClick={() => {
          setIsOpen(true);
        }}
      >
        Correct this report
      </Button>
      <Dialog
        title="Correct this report"
        isOpen={isOpen}
        onClose={() => {
          setIsOpen(false);
        }}
      >
        <form
          className="grid gap-4"
          noValidate
          onSubmit={(event) => {
            event.preventDefault();
            const read = correctionReason.safeParse(reason);
            setFault(read.error?.issues[0]?.message);
            if (!read.success) return;
            start.mutate(
              { reason: read.data },
              { onSuccess: ({ orderId }) => void navigate(sitePaths.examination(orderId)) },
            );
          }}
        >
          <p>
            You mend a copy of what you filed, and sign it again as a new version. This one stays readable,
            marked as superseded. The buyer and the seller are told.
          </p>
          {start.isError && <Notice kind="bad">{messageOf(start.error)}</Notice>}
          <Field
            label="What was wrong"
            hint="Published with both versions, 10 to 600 characters"
            error={fault}
          >
            {(control) => (
              <textarea
                {...control}
                rows={4}
                maxLength={600}
                value={reason}
                onChange={({ target }) => {
                  setReason(target.value);
                }}
              />
            )}
          </Field>
          <div>
            <Button type="submit" isPending={start.isPending}>
              Open a copy
            </Button>
          </div>
        </form>
      </Dialog>
    </div>
  );
}
