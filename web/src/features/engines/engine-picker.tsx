import { useQuery } from '@tanstack/react-query';
import { engineFacts } from '#shared/engines/engine.ts';
import type { EngineFacts } from '#shared/engines/engine.ts';
import { Select } from '#web/ui/select.tsx';
import { engineQueries } from './queries.ts';

/** Takes the figures of an engine the reader keeps. Nothing where they keep none. */
export function EnginePicker({ onPick }: { onPick: (engine: EngineFacts) => void }) {
  const { data } = useQuery(engineQueries.mine());
  const engines = data?.items ?? [];
  if (engines.length === 0) return null;
  return (
    <Select
      label="Fill in one of my engines"
      value={null}
      options={Object.fromEntries(engines.map(({ id, name }) => [id, name]))}
      onChange={(id) => {
        const engine = engines.find((each) => each.id === id);
        if (engine) onPick(engineFacts.strip().parse(engine));
      }}
    />
  );
}
