import type { SurveyRecord } from '#shared/surveys/record.ts';
import type { Edit } from './record-edits.ts';
import { WordsInput } from './words-input.tsx';

/** What the surveyor would say to the buyer's face. */
export function SummaryScreen({ record, edit }: { record: SurveyRecord; edit: (change: Edit) => void }) {
  return (
    <WordsInput
      label="To the buyer, in your own words"
      hint="What you would tell somebody who stood beside you. The verdict and the figures come from the findings."
      most={3_000}
      rows={9}
      value={record.summary}
      onChange={(summary) => {
        edit((so) => ({ ...so, summary }));
      }}
    />
  );
}
