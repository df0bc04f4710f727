import { useQuery } from '@tanstack/react-query';
import type { Surveyor } from '#shared/surveyors/contract.ts';
import type { Quotation } from '#shared/survey-orders/pricing.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';
import { formatMoney } from '#web/lib/format.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Button } from '#web/ui/button.tsx';
import { Choices } from '#web/ui/check.tsx';
import { Loading } from '#web/ui/mark.tsx';
import { Empty, Notice } from '#web/ui/notes.tsx';
import { surveyOrderQueries } from './queries.ts';

export interface Offer {
  surveyor: Surveyor;
  quotation: Quotation;
}

interface Props {
  listingId: string;
  scope: ScopeId;
  extras: ExtraId[];
  chosen: string | null;
  onChoose: (offer: Offer) => void;
}

/** Surveyors who could come, with how far they come and what it costs by each. */
export function Offers({ listingId, scope, extras, chosen, onChoose }: Props) {
  const { show } = useUnits();
  const { data, error, isPending, refetch } = useQuery(
    surveyOrderQueries.quotes(listingId, { scope, extras }),
  );
  if (isPending) return <Loading what="Asking who could come" />;
  if (error) {
    return (
      <Notice kind="bad">
        {messageOf(error)}{' '}
        <Button kind="plain" onClick={() => void refetch()}>
          Try again
        </Button>
      </Notice>
    );
  }
  if (data.items.length === 0) {
    return (
      <Empty title="No surveyor can take this one at present">
        None who is insured, competent for this type and material, and independent of both of you is in range
        with these extras. Try fewer extras, or another day.
      </Empty>
    );
  }
  return (
    <Choices
      name="surveyor"
      value={chosen}
      options={data.items.map(({ surveyor, quotation }) => ({
        id: surveyor.id,
        label: (
          <span className="flex flex-wrap justify-between gap-x-4">
            <span>
              {surveyor.name}, no. {surveyor.number}
            </span>
            <span>{formatMoney(quotation.total)}</span>
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
      onChange={(id) => {
        const found = data.items.find(({ surveyor }) => surveyor.id === id);
        if (found) onChoose(found);
      }}
    />
  );
}
