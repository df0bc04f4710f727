import { mostWithValveLiftingPa } from '#shared/engineering/safety-valve.ts';
import { testProfileOf } from '#shared/engineering/test-profiles.ts';
import type { Report } from '#shared/surveys/contract.ts';
import { limits } from '#shared/surveys/limits.ts';
import { leakClasses, leakPlaces } from '#shared/surveys/record.ts';
import type { HydraulicTest } from '#shared/surveys/record.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import { useUnits } from '#web/lib/units.tsx';
import { KeyFigures } from '#web/ui/figures.tsx';
import { Table } from '#web/ui/table.tsx';
import { ReadingsPlot } from '#web/ui/readings-plot.tsx';

type Tested = Pick<Report, 'facts' | 'record' | 'scope' | 'result'>;

const orDash = (value: number | null, unit: string): string =>
  value === null ? '–' : `${String(value)}\u00A0${unit}`;
const yesNo = (value: boolean | null): string => (value === null ? 'Not tried' : value ? 'Yes' : 'No');

/** The cold water test as it was made: what was wanted, what was read, and what leaked. */
export function HydraulicRecord({ report }: { report: Tested }) {
  const { record, scope, result } = report;
  const { hydraulic: test } = record;
  if (test === null)
    return <p>{noneText(scopes[scope].hydraulic, record.noHydraulicReason, 'a hydraulic test')}</p>;
  const outcome = result.checks.find(({ id }) => id === 'hydraulic-test');
  return (
    <div className="grid gap-4">
      {outcome && <p>{outcome.text}</p>}
      <HydraulicFigures test={test} />
      <ReadingsPlot
        title="Pressure over the hydraulic test"
        readings={test.readings}
        levels={[
          { label: 'Wanted', pa: test.wantedPa },
          { label: 'Most allowed', pa: (test.wantedPa * (100 + limits.testOverPercent)) / 100 },
        ]}
        hold={
          test.holdStartMinute === null || test.holdEndMinute === null
            ? null
            : { from: test.holdStartMinute, to: test.holdEndMinute }
        }
      />
      {test.leaks.length > 0 && (
        <Table
          caption="Leaks"
          rows={test.leaks}
          keyOf={(_leak, index) => String(index)}
          columns={[
            { head: 'At', cell: ({ place }) => leakPlaces[place] },
            { head: 'Where', cell: ({ where }) => where || '–' },
            { head: 'How much', cell: ({ leakClass }) => leakClasses[leakClass] },
            { head: 'Made dry', cell: ({ cured }) => (cured ? 'Yes' : 'No') },
          ]}
        />
      )}
      {test.note !== '' && <p>{test.note}</p>}
    </div>
  );
}

const noneText = (isInScope: boolean, reason: string, what: string): string => {
  if (!isInScope) return `This scope does not cover ${what}.`;
  return reason === '' ? `There was no record of ${what}.` : `Not made: ${reason}`;
};

function HydraulicFigures({ test }: { test: HydraulicTest }) {
  const { show } = useUnits();
  const { holdStartMinute: from, holdEndMinute: to } = test;
  return (
    <KeyFigures
      items={[
        { label: 'Kind', value: test.firstTest ? 'First, or after repair' : 'Repeat' },
        { label: 'Tested to', value: testProfileOf(test.profileId).label },
        { label: 'Pressure wanted', value: show('pressure', test.wantedPa) },
        { label: 'Held', value: from === null || to === null ? '–' : `${String(to - from)} min` },
        { label: 'Leaks', value: test.leaks.length === 0 ? 'None' : test.leaks.length },
        { label: 'Permanent set', value: show('length', test.permanentSetMm) },
        { label: 'Filled and vented', value: yesNo(test.filledAndVented) },
        { label: 'Gauge taken off', value: yesNo(test.gaugeRemoved) },
        { label: 'Safety valve gagged', value: yesNo(test.valveGagged) },
      ]}
    />
  );
}

/** The test under steam as it was made. */
export function SteamRecord({ report }: { report: Tested }) {
  const { show } = useUnits();
  const { facts, record, scope } = report;
  const { steam: test } = record;
  if (test === null) return <p>{noneText(scopes[scope].steam, record.noSteamReason, 'a steam test')}</p>;
  return (
    <div className="grid gap-4">
      <KeyFigures
        items={[
          { label: 'Raised steam', value: yesNo(test.raisedSteam) },
          { label: 'To working pressure', value: orDash(test.minutesToWorkingPressure, 'min') },
          { label: 'Safety valve lifts at', value: show('pressure', test.valveLiftsAtPa) },
          { label: 'Reseats at', value: show('pressure', test.valveReseatsAtPa) },
          { label: 'Highest, full fire, all shut', value: show('pressure', test.highestPressurePa) },
          { label: 'Water gauge blown through', value: yesNo(test.gaugeBlownThrough) },
          { label: 'Both passages clear', value: yesNo(test.passagesClear) },
          { label: 'Feeds delivered', value: yesNo(test.feedsDelivered) },
          { label: 'Evaporation', value: orDash(test.evaporationKgPerH, 'kg/h') },
          { label: 'Flame settled', value: yesNo(test.flameSettled) },
          { label: 'Gas tight', value: yesNo(test.gasTight) },
          { label: 'Carbon monoxide at the operator', value: orDash(test.coPpmAtOperator, 'ppm') },
        ]}
      />
      <ReadingsPlot
        title="Pressure over the steam test"
        readings={test.readings}
        levels={[
          { label: 'Claimed working pressure', pa: facts.workingPressurePa },
          { label: 'A tenth over', pa: mostWithValveLiftingPa(facts.workingPressurePa) },
        ]}
        events={[{ label: 'Lifts', pa: test.valveLiftsAtPa }]}
      />
      {test.note !== '' && <p>{test.note}</p>}
    </div>
  );
}
