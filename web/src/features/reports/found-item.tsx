import type { ReactNode } from 'react';
import type { Photo } from '#shared/listings/pictures.ts';
import { remedies } from '#shared/surveys/record.ts';
import type { Measurement, Remedy } from '#shared/surveys/record.ts';
import type { AllowanceLine } from '#shared/surveys/result.ts';
import { measuredWords } from '#shared/surveys/figure-words.ts';
import { defectOf } from '#shared/surveys/rubric/index.ts';
import type { MeasurementSpec } from '#shared/surveys/rubric/types.ts';
import { formatBand } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { GradeMark } from '#web/ui/grade-mark.tsx';
import { PhotoViewer } from '#web/ui/photo-viewer.tsx';
import type { Found } from '#shared/surveys/found.ts';

/** Where an item stands on the page. */
export const foundId = (criterionId: string): string => `item-${criterionId.replace('.', '-')}`;

const waysText = ({ criterion, finding }: Found): string =>
  criterion.ways
    .filter(({ id }) => finding.ways.includes(id))
    .map(({ label }) => label)
    .join(', ')
    .toLowerCase();

interface FoundItemProps {
  found: Found;
  photos: readonly Photo[];
  /** What another feature says of the item. */
  under?: ReactNode;
}

/** One item as examined: grade, how it was examined, what is wrong, what was measured, and the photographs. */
export function FoundItem({ found, photos, under }: FoundItemProps) {
  const { criterion, finding, lines } = found;
  const own = finding.photoIds.flatMap((id) => photos.find((photo) => photo.id === id) ?? []);
  const ways = waysText(found);
  return (
    <article
      id={foundId(criterion.id)}
      className="scroll-mt-6 break-inside-avoid border-b border-rule py-4 target:bg-wash"
    >
      <div className="flex flex-wrap items-start justify-between gap-x-6 gap-y-1">
        <h4 className="font-medium">
          <span className="mr-3 inline-block min-w-6 text-pencil">{criterion.number}</span>
          {criterion.title}
        </h4>
        <span className="flex-none">
          <GradeMark grade={finding.grade} hasLabel />
        </span>
      </div>
      <div className="mt-1 grid gap-2 sm:pl-9">
        {finding.reason !== '' && <p>{finding.reason}</p>}
        {finding.defects.map((defect) => (
          <DefectLine
            key={defect.code}
            label={defectOf(criterion, defect.code)?.label ?? defect.code}
            defect={defect}
            line={lines.find(({ defectCode }) => defectCode === defect.code)}
          />
        ))}
        {finding.note !== '' && <p>{finding.note}</p>}
        <Measured specs={criterion.measurements} measurements={finding.measurements} />
        {ways !== '' && <p className="text-sm text-pencil">Examined {ways}.</p>}
        {own.length > 0 && (
          <div className="mt-1">
            <PhotoViewer photos={own} title={criterion.title} layout="row" />
          </div>
        )}
        {under}
      </div>
    </article>
  );
}

interface DefectProps {
  label: string;
  defect: Found['finding']['defects'][number];
  line: AllowanceLine | undefined;
}

function DefectLine({ label, defect, line }: DefectProps) {
  const remedy = line === undefined ? null : remedies[line.remedy as Remedy];
  return (
    <p>
      <span className="font-medium">{label}</span>
      {defect.where !== '' && `, ${defect.where}`}.{defect.note !== '' && ` ${defect.note}`}
      {remedy !== null && (
        <span className="text-pencil">
          {' '}
          {remedy}
          {line !== undefined && line.highMinor > 0 && `, ${formatBand(line.lowMinor, line.highMinor)}`}
          {line?.isOverridden === true && ' by the surveyor’s own figure'}.
        </span>
      )}
    </p>
  );
}

function Measured({
  specs,
  measurements,
}: {
  specs: readonly MeasurementSpec[];
  measurements: readonly Measurement[];
}) {
  const { units } = useUnits();
  const rows = specs
    .map((spec) => ({
      spec,
      values: measurements.filter(({ quantity }) => quantity === spec.quantity).map(({ value }) => value),
    }))
    .filter(({ values }) => values.length > 0);
  if (rows.length === 0) return null;
  return (
    <dl className="grid gap-x-8 sm:grid-cols-2">
      {rows.map(({ spec, values }) => (
        <div key={spec.quantity} className="flex justify-between gap-4 border-b border-rule py-1">
          <dt className="text-pencil">{spec.label}</dt>
          <dd className="text-right">
            {values.map((value) => measuredWords(spec, value, units)).join(', ')}
          </dd>
        </div>
      ))}
    </dl>
  );
}
