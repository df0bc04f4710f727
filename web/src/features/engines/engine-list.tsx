import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { Engine } from '#shared/engines/contract.ts';
import { actions } from '#shared/engines/engine.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { formatNumber } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Button } from '#web/ui/button.tsx';
import { Empty, Notice } from '#web/ui/notes.tsx';
import { EngineForm } from './engine-form.tsx';
import { engineQueries, useChangeEngine, useForgetEngine, useKeepEngine } from './queries.ts';

function EngineRow({ engine }: { engine: Engine }) {
  const { show } = useUnits();
  const [doing, setDoing] = useState<'nothing' | 'changing' | 'asking'>('nothing');
  const change = useChangeEngine(engine.id);
  const forget = useForgetEngine(engine.id);
  const { id: _id, ...draft } = engine;
  const close = () => {
    setDoing('nothing');
  };
  if (doing === 'changing')
    return (
      <li className="border-b border-rule py-4">
        <EngineForm engine={draft} save={change.mutateAsync} onDone={close} />
      </li>
    );
  const size = `${show('length', engine.boreMm)} × ${show('length', engine.strokeMm)}`;
  return (
    <li className="border-b border-rule py-3">
      <p className="font-medium">{engine.name}</p>
      <p className="text-pencil">
        {engine.cylinders === 1 ? 'One cylinder' : `${formatNumber(engine.cylinders)} cylinders`}, {size},{' '}
        {actions[engine.action].toLowerCase()}, {formatNumber(engine.speedRpm)} rpm at{' '}
        {show('pressure', engine.pressurePa)}, cut-off {formatNumber(engine.cutOffPercent)} %
      </p>
      {forget.isError && <Notice kind="bad">{messageOf(forget.error)}</Notice>}
      <div className="mt-1 flex flex-wrap gap-x-3">
        {doing === 'asking' ? (
          <>
            <Button
              kind="danger"
              isPending={forget.isPending}
              onClick={() => {
                forget.mutate();
              }}
            >
              Yes, remove it
            </Button>
            <Button kind="plain" onClick={close}>
              Leave it
            </Button>
          </>
        ) : (
          <>
            <Button
              kind="plain"
              aria-label={`Change ${engine.name}`}
              onClick={() => {
                setDoing('changing');
              }}
            >
              Change
            </Button>
            <Button
              kind="plain"
              aria-label={`Remove ${engine.name}`}
              onClick={() => {
                setDoing('asking');
              }}
            >
              Remove
            </Button>
          </>
        )}
      </div>
    </li>
  );
}

/** The engines a member keeps: with them, every listing says whether its boiler drives each. */
export function EngineList() {
  const { data } = useSuspenseQuery(engineQueries.mine());
  const keep = useKeepEngine();
  const [isAdding, setIsAdding] = useState(false);
  return (
    <div className="grid gap-4">
      {data.items.length === 0 && !isAdding ? (
        <Empty title="You keep no engine yet">
          Keep one, and every boiler on offer says whether it will drive it.
        </Empty>
      ) : (
        <ul className="border-t border-rule">
          {data.items.map((engine) => (
            <EngineRow key={engine.id} engine={engine} />
          ))}
        </ul>
      )}
      {isAdding ? (
        <EngineForm
          save={keep.mutateAsync}
          onDone={() => {
            setIsAdding(false);
          }}
        />
      ) : (
        <div>
          <Button
            kind="quiet"
            onClick={() => {
              setIsAdding(true);
            }}
          >
            Add an engine
          </Button>
        </div>
      )}
    </div>
  );
}
