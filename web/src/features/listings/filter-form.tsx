import { boilerTypeIds, boilerTypeOf } from '#shared/boilers/boiler-types.ts';
import { sorts } from '#shared/listings/contract.ts';
import { verdictId, verdicts } from '#shared/surveys/verdicts.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { MoneyInput } from '#web/ui/quantity-input.tsx';
import type { Filter } from './queries.ts';

const verdictChoices = [...verdictId.options, 'not-surveyed'] as const;

interface Props {
  filter: Filter;
  onChange: (filter: Filter) => void;
}

/** What to look for. Every change shows at once and is kept in the address. */
export function FilterForm({ filter, onChange }: Props) {
  const isEmpty = Object.values(filter).every((value) => value === undefined);
  const isCrossed =
    filter.priceMinMinor !== undefined &&
    filter.priceMaxMinor !== undefined &&
    filter.priceMinMinor > filter.priceMaxMinor;
  return (
    <form
      className="grid gap-4 sm:grid-cols-2 lg:grid-cols-1"
      onSubmit={(event) => {
        event.preventDefault();
      }}
    >
      <Field label="Type">
        {(control) => (
          <select
            {...control}
            value={filter.type ?? ''}
            onChange={(event) => {
              onChange({ ...filter, type: boilerTypeIds.find((id) => id === event.target.value) });
            }}
          >
            <option value="">Any</option>
            {boilerTypeIds.map((id) => (
              <option key={id} value={id}>
                {boilerTypeOf(id).label}
              </option>
            ))}
          </select>
        )}
      </Field>
      <Field label="Verdict">
        {(control) => (
          <select
            {...control}
            value={filter.verdict ?? ''}
            onChange={(event) => {
              onChange({ ...filter, verdict: verdictChoices.find((id) => id === event.target.value) });
            }}
          >
            <option value="">Any</option>
            {Object.entries(verdicts).map(([id, label]) => (
              <option key={id} value={id}>
                {label}
              </option>
            ))}
            <option value="not-surveyed">Not surveyed</option>
          </select>
        )}
      </Field>
      <MoneyInput
        label="Price from"
        value={filter.priceMinMinor ?? null}
        onChange={(minor) => {
          onChange({ ...filter, priceMinMinor: minor ?? undefined });
        }}
      />
      <MoneyInput
        label="Price to"
        value={filter.priceMaxMinor ?? null}
        error={isCrossed ? 'The higher price is below the lower one' : undefined}
        onChange={(minor) => {
          onChange({ ...filter, priceMaxMinor: minor ?? undefined });
        }}
      />
      <Field label="Order">
        {(control) => (
          <select
            {...control}
            value={filter.sort ?? 'newest'}
            onChange={(event) => {
              onChange({ ...filter, sort: event.target.value as Filter['sort'] });
            }}
          >
            {Object.entries(sorts).map(([id, label]) => (
              <option key={id} value={id}>
                {label}
              </option>
            ))}
          </select>
        )}
      </Field>
      {!isEmpty && (
        <div className="self-end">
          <Button
            kind="plain"
            onClick={() => {
              onChange({});
            }}
          >
            Clear all
          </Button>
        </div>
      )}
    </form>
  );
}
