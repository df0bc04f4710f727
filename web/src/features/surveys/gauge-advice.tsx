import { ownGaugeAdvice, testGaugeFaults } from '#shared/surveys/test-steps.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import { Notice } from '#web/ui/notes.tsx';

interface Props {
  wantedPa: number;
  record: SurveyRecord;
}

const ownScaleOf = ({ findings }: SurveyRecord): number | null => {
  const value = findings
    .find(({ criterionId }) => criterionId === 'safety.gauge')
    ?.measurements.find(({ quantity }) => quantity === 'fullScalePa')?.value;
  return typeof value === 'number' ? value : null;
};

/** What to do with the boiler's own gauge, and whether the test gauge will serve. */
export function GaugeAdvice({ wantedPa, record }: Props) {
  const own = ownGaugeAdvice(wantedPa, ownScaleOf(record));
  const faults = testGaugeFaults(wantedPa, record.instruments, record.examinedOn);
  return (
    <div className="grid gap-3">
      {own !== null && <Notice>{own}</Notice>}
      {faults.length > 0 && (
        <Notice kind="bad">
          <ul>
            {faults.map((text) => (
              <li key={text}>{text}</li>
            ))}
          </ul>
        </Notice>
      )}
    </div>
  );
}
