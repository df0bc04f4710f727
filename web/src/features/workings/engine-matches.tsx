import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { matches } from '#shared/engineering/engine-demand.ts';
import type { EngineFacts } from '#shared/engines/engine.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { engineInputs } from '#shared/workings/from-boiler.ts';
import type { KnownBoiler } from '#shared/workings/from-boiler.ts';
import { matchOnBoiler } from '#shared/workings/match.ts';
import { engineQueries } from '#web/features/engines/queries.ts';
import { formatNumber } from '#web/lib/format.ts';
import { WorkingLink } from './working-link.tsx';

function Match({ boiler, engine }: { boiler: KnownBoiler; engine: EngineFacts & { name: string } }) {
  const found = matchOnBoiler(boiler, engine);
  return (
    <li className="border-b border-rule py-2">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <span className="font-medium">{engine.name}</span>
        <WorkingLink calculator="engine" inputs={engineInputs(boiler, engine)} of={engine.name}>
          {found === null ? 'Cannot say' : matches[found.id]}
        </WorkingLink>
      </div>
      <p className="text-sm text-pencil">
        {found === null
          ? 'The steam it makes is not known: no heating surface is given.'
          : `At ${formatNumber(engine.speedRpm)} rpm. The fastest it could keep: ${formatNumber(Math.floor(found.speed.low.result.value))} to ${formatNumber(Math.floor(found.speed.high.result.value))} rpm.`}
      </p>
    </li>
  );
}

const example: EngineFacts = {
  boreMm: 19.05,
  strokeMm: 19.05,
  cylinders: 1,
  action: 'double',
  speedRpm: 400,
  cutOffPercent: 75,
  pressurePa: 300_000,
};

/** This boiler against each engine the reader keeps; without one, against any engine they type. */
export function EngineMatches({ boiler, isMember }: { boiler: KnownBoiler; isMember: boolean }) {
  const { data } = useQuery({ ...engineQueries.mine(), enabled: isMember });
  const engines = data?.items ?? [];
  return (
    <div>
      {engines.length > 0 && (
        <ul className="border-t border-rule">
          {engines.map((engine) => (
            <Match key={engine.id} boiler={boiler} engine={engine} />
          ))}
        </ul>
      )}
      <p className="mt-2 text-pencil">
        <WorkingLink calculator="engine" inputs={engineInputs(boiler, example)} of="Any engine">
          Try {engines.length > 0 ? 'another' : 'an'} engine on it
        </WorkingLink>
        {engines.length === 0 && (
          <>
            , or{' '}
            <Link className="link" to={isMember ? sitePaths.account : sitePaths.signIn}>
              keep your engines
            </Link>{' '}
            and see it for every boiler
          </>
        )}
        .
      </p>
    </div>
  );
}
