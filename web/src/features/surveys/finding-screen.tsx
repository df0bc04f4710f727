import type { Survey } from '#shared/surveys/contract.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { lookForOn } from '#shared/surveys/rubric/index.ts';
import type { Criterion } from '#shared/surveys/rubric/types.ts';
import { Button } from '#web/ui/button.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { cautionFor } from './cautions.ts';
import { DefectPicker } from './defect-picker.tsx';
import { FindingPhotos } from './finding-photos.tsx';
import { GradePicker } from './grade-picker.tsx';
import { MeasurementFields } from './measurement-fields.tsx';
import type { PhotoUpload, PhotoUploads } from './photo-uploads.ts';
import { clearExamined, clearFinding, editFinding, findingOf, setGrade } from './record-edits.ts';
import type { Edit } from './record-edits.ts';
import { WayPicker } from './way-picker.tsx';
import { WordsInput } from './words-input.tsx';

interface Props {
  survey: Pick<Survey, 'orderId' | 'facts' | 'photos'>;
  criterion: Criterion;
  record: SurveyRecord;
  uploads: readonly PhotoUpload[];
  photoUploads: PhotoUploads;
  edit: (change: Edit) => void;
}

/** One item: what to look for, the grade in one tap, and under it everything that backs the grade. */
export function FindingScreen({ survey, criterion, record, uploads, photoUploads, edit }: Props) {
  const finding = findingOf(record, criterion.id);
  const grade = finding?.grade ?? null;
  const isAbsent = grade === 'notExamined' || grade === 'notFitted';
  const hasMore =
    finding !== undefined &&
    (finding.defects.length > 0 || finding.measurements.length > 0 || finding.ways.length > 0);
  const caution = cautionFor(criterion.id);
  const isThin =
    criterion.safetyCritical &&
    (grade === 'sound' || grade === 'serviceable') &&
    criterion.ways.length > 1 &&
    finding?.ways.every((id) => id === criterion.ways[0]?.id);
  return (
    <div className="grid gap-6">
      <div>
        {lookForOn(criterion, survey.facts.type).map((line) => (
          <p key={line} className="text-[0.9375rem] leading-6 text-pencil">
            {line}
          </p>
        ))}
      </div>
      {caution && <Caution title={caution.title}>{caution.text}</Caution>}
      <div className="grid gap-2">
        <GradePicker
          grade={grade}
          onChange={(next) => {
            edit(setGrade(criterion.id, next));
          }}
        />
        <div className="-ml-4 flex flex-wrap">
          <Button
            kind="plain"
            aria-pressed={grade === 'notFitted'}
            onClick={() => {
              edit(setGrade(criterion.id, 'notFitted'));
            }}
          >
            {grade === 'notFitted' ? 'Marked not fitted' : 'It is not fitted'}
          </Button>
          {finding && (
            <Button
              kind="plain"
              onClick={() => {
                edit(clearFinding(criterion.id));
              }}
            >
              Clear this item
            </Button>
          )}
        </div>
      </div>
      {(grade === 'notExamined' || isThin) && finding && (
        <WordsInput
          label={grade === 'notExamined' ? 'Why it was not examined' : 'Why this way alone is enough'}
          hint={
            grade === 'notExamined'
              ? 'The reader sees this'
              : 'An item that bears on the verdict counts for half when it rests on its weakest way with no reason'
          }
          most={400}
          rows={2}
          value={finding.reason}
          onChange={(reason) => {
            edit(editFinding(criterion.id, (so) => ({ ...so, reason })));
          }}
        />
      )}
      {isAbsent && hasMore && (
        <Notice>
          <p>Something is recorded of this item, though it is marked as not examined or not fitted.</p>
          <Button
            kind="plain"
            onClick={() => {
              edit(clearExamined(criterion.id));
            }}
          >
            Take that off
          </Button>
        </Notice>
      )}
      {!isAbsent && (
        <>
          <DefectPicker criterion={criterion} finding={finding} facts={survey.facts} edit={edit} />
          <WayPicker criterion={criterion} finding={finding} edit={edit} />
        </>
      )}
      <FindingPhotos
        orderId={survey.orderId}
        criterion={criterion}
        finding={finding}
        photos={survey.photos}
        uploads={uploads.filter(({ criterionId }) => criterionId === criterion.id)}
        photoUploads={photoUploads}
        edit={edit}
      />
      {!isAbsent && <MeasurementFields criterion={criterion} finding={finding} edit={edit} />}
      <WordsInput
        label="Note"
        most={2_000}
        rows={3}
        value={finding?.note ?? ''}
        onChange={(note) => {
          edit(editFinding(criterion.id, (so) => ({ ...so, note })));
        }}
      />
    </div>
  );
}
