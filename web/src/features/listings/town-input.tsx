import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { Town } from '#shared/listings/places.ts';
import { Combobox } from '#web/ui/combobox.tsx';
import { listingQueries } from './queries.ts';

interface Props {
  label: string;
  hint?: string;
  error?: string | undefined;
  /** The town chosen before, to be shown by name. */
  town: Town | null;
  onChoose: (town: Town) => void;
}

const nameOf = ({ name, region }: Town): string => (region ? `${name}, ${region}` : name);

/** A town of the gazetteer, by the beginning of its name. */
export function TownInput({ label, hint, error, town, onChoose }: Props) {
  const [text, setText] = useState('');
  const [chosen, setChosen] = useState<Town>();
  const { data } = useQuery({ ...listingQueries.towns(text), placeholderData: keepPreviousData });
  const towns = text.trim().length >= 2 ? (data?.items ?? []) : [];
  const shown = chosen ?? town;
  return (
    <Combobox
      label={label}
      hint={hint ?? 'Type the first letters'}
      error={error}
      chosen={shown ? nameOf(shown) : ''}
      options={towns.map((each) => ({ id: String(each.id), label: nameOf(each) }))}
      onType={setText}
      onChoose={(id) => {
        const found = towns.find((each) => String(each.id) === id);
        if (!found) return;
        setChosen(found);
        onChoose(found);
      }}
    />
  );
}
