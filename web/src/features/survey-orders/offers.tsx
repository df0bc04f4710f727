import type { Surveyor } from '#shared/surveyors/contract.ts';
import type { Quotation } from '#shared/survey-orders/pricing.ts';
import { formatSum } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Choices } from '#web/ui/check.tsx';
import { Empty } from '#web/ui/notes.tsx';

export interface Offer {
  surveyor: Surveyor;
  quotation: Quotation;
}

interface Props {
  offers: readonly Offer[];
  /** Id of the surveyor chosen. */
  chosen: string | null;
  onChoose: (surveyorId: string) => void;
}

/** Surveyors who could come, with how far they come and what it costs by each. */
export function Offers({ offers, chosen, onChoose }: Props) {
  const { show } = useUnits();
  if (offers.length === 0) {
    return (
      <Empty title="No surveyor can take this one at present">
        A surveyor has to be insured, competent for this type and material, within range, offer the extras you
        want, and have had no dealings with you or the seller. Try fewer extras, or come back in a week.
      </Empty>
    );
  }
  return (
    <Choices
      name="surveyor"
      value={chosen}
      options={offers.map(({ surveyor, quotation }) => ({
        id: surveyor.id,
        label: (
          <span className="flex flex-wrap justify-between gap-x-4">
            <span>
              {surveyor.name}, no. {surveyor.number}
            </span>
            <span>{formatSum(quotation.total)}</span>
          </span>
        ),
        hint: (
          <>
            {surveyor.town.name}, {show('distance', quotation.distanceKm)} away · {surveyor.reportsFiled}{' '}
            {surveyor.reportsFiled === 1 ? 'report' : 'reports'} filed
            <span className="mt-1 block">{surveyor.about}</span>
          </>
        ),
      }))}
      onChange={onChoose}
    />
  );
}
