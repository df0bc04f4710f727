import { mostWithValveLiftingPa } from '#shared/engineering/safety-valve.ts';
import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import type { SteamTest, SurveyRecord } from '#shared/surveys/record.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Button } from '#web/ui/button.tsx';
import { Check } from '#web/ui/check.tsx';
import { Caution } from '#web/ui/notes.tsx';
import { ReadingsPlot } from '#web/ui/readings-plot.tsx';
import { FigureInput } from './figure-input.tsx';
import { ReadingsTable } from './readings-table.tsx';
import { changeSteam, emptySteam } from './record-edits.ts';
import type { Edit } from './record-edits.ts';
import { StopButton } from './stop-button.tsx';
import { useTestClock } from './test-clock.ts';
import { TestOrReason } from './test-or-reason.tsx';
import { TimedFeed } from './timed-feed.tsx';
import { WordsInput } from './words-input.tsx';
import { YesNo } from './yes-no.tsx';

interface Props {
  /** The order, whose clock it is. */
  orderId: string;
  facts: BoilerFacts;
  record: SurveyRecord;
  edit: (change: Edit) => void;
}

/** The test under steam. */
export function SteamScreen({ orderId, facts, record, edit }: Props) {
  const { steam: test } = record;
  return (
    <div className="grid gap-6">
      <Caution title="Eyes covered, and nobody in line with a fitting.">
        A boiler that failed its hydraulic test is not lit. Follow your local code and your boiler inspector.
        {facts.firing !== 'electric' &&
          ' Fire out of doors or with the doors open, with a carbon monoxide meter at your face: it cannot be smelt. If it sounds, shut off the fuel and leave.'}
      </Caution>
      {test === null ? (
        <TestOrReason
          label="Record a steam test"
          onStart={() => {
            edit((so) => ({ ...so, steam: emptySteam }));
          }}
          reason={record.noSteamReason}
          onReason={(noSteamReason) => {
            edit((so) => ({ ...so, noSteamReason }));
          }}
        />
      ) : (
        <TestFields
          orderId={orderId}
          facts={facts}
          test={test}
          onChange={(change) => {
            edit(changeSteam(change));
          }}
          onRemove={() => {
            edit((so) => ({ ...so, steam: null }));
          }}
        />
      )}
    </div>
  );
}

interface TestProps {
  orderId: string;
  facts: BoilerFacts;
  test: SteamTest;
  onChange: (change: Partial<SteamTest>) => void;
  onRemove: () => void;
}

function TestFields({ orderId, facts, test, onChange, onRemove }: TestProps) {
  const { show } = useUnits();
  const clock = useTestClock(`${orderId}.steam`);
  const mostPa = mostWithValveLiftingPa(facts.workingPressurePa);
  const pressure = { unit: 'Pa', min: 0, max: 6_000_000 } as const;
  return (
    <>
      <StopButton firing={facts.firing} />
      <Check
        label="Steam was raised to working pressure"
        checked={test.raisedSteam}
        onChange={({ target }) => {
          onChange({ raisedSteam: target.checked });
        }}
      />
      <FigureInput
        label="Time to working pressure"
        unit="min"
        min={0}
        max={600}
        value={test.minutesToWorkingPressure}
        onChange={(minutesToWorkingPressure) => {
          onChange({ minutesToWorkingPressure });
        }}
      />
      <section className="grid gap-4" aria-label="Safety valve">
        <div>
          <h2 className="text-lg">Safety valve</h2>
          <p className="text-[0.9375rem] leading-6 text-pencil">
            It must lift, and hold the pressure with full fire and everything shut, by{' '}
            {show('pressure', mostPa)}: a tenth above working pressure.
          </p>
        </div>
        <FigureInput
          label="Lifts at"
          {...pressure}
          value={test.valveLiftsAtPa}
          onChange={(valveLiftsAtPa) => {
            onChange({ valveLiftsAtPa });
          }}
        />
        <FigureInput
          label="Highest pressure, full fire, stop valve and feed shut"
          {...pressure}
          value={test.highestPressurePa}
          onChange={(highestPressurePa) => {
            onChange({ highestPressurePa });
          }}
        />
        <FigureInput
          label="Reseats at"
          {...pressure}
          value={test.valveReseatsAtPa}
          onChange={(valveReseatsAtPa) => {
            onChange({ valveReseatsAtPa });
          }}
        />
      </section>
      <section className="grid gap-4" aria-label="Water gauge and feed">
        <h2 className="text-lg">Water gauge and feed</h2>
        <Check
          label="Water gauge blown through under steam"
          checked={test.gaugeBlownThrough}
          onChange={({ target }) => {
            onChange({ gaugeBlownThrough: target.checked });
          }}
        />
        <YesNo
          label="Both passages clear"
          value={test.passagesClear}
          onChange={(passagesClear) => {
            onChange({ passagesClear });
          }}
        />
        <YesNo
          label="Feeds delivered against pressure"
          value={test.feedsDelivered}
          onChange={(feedsDelivered) => {
            onChange({ feedsDelivered });
          }}
        />
        <FigureInput
          label="Water evaporated, by timed feed"
          unit="kg/h"
          min={0}
          max={500}
          value={test.evaporationKgPerH}
          onChange={(evaporationKgPerH) => {
            onChange({ evaporationKgPerH });
          }}
        />
        <TimedFeed
          name={`${orderId}.feed`}
          onTimed={(evaporationKgPerH) => {
            onChange({ evaporationKgPerH });
          }}
        />
      </section>
      <section className="grid gap-4" aria-label="Fire">
        <h2 className="text-lg">Fire</h2>
        <YesNo
          label="Flame settled"
          value={test.flameSettled}
          onChange={(flameSettled) => {
            onChange({ flameSettled });
          }}
        />
        {facts.firing === 'gas' && (
          <YesNo
            label="Gas tight"
            value={test.gasTight}
            onChange={(gasTight) => {
              onChange({ gasTight });
            }}
          />
        )}
        <FigureInput
          label="Carbon monoxide at the operator"
          unit="ppm"
          min={0}
          max={5_000}
          value={test.coPpmAtOperator}
          onChange={(coPpmAtOperator) => {
            onChange({ coPpmAtOperator });
          }}
        />
      </section>
      <ReadingsTable
        readings={test.readings}
        from="lighting up"
        clock={clock}
        onChange={(readings) => {
          onChange({ readings });
        }}
      />
      <ReadingsPlot
        title="Pressure so far"
        readings={test.readings}
        levels={[
          { label: 'Claimed working pressure', pa: facts.workingPressurePa },
          { label: 'A tenth over', pa: mostPa },
        ]}
      />
      <WordsInput
        label="Note"
        most={1_000}
        rows={3}
        value={test.note}
        onChange={(note) => {
          onChange({ note });
        }}
      />
      <div>
        <Button kind="danger" onClick={onRemove}>
          Take this test off the record
        </Button>
      </div>
    </>
  );
}
