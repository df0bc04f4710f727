import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { testProfileIds, testProfileOf, testProfiles } from '#shared/engineering/test-profiles.ts';
import type { TestProfileId } from '#shared/engineering/test-profiles.ts';
import { askedPa, hydraulicTestCheck } from '#shared/surveys/checks-hydraulic.ts';
import { limits } from '#shared/surveys/limits.ts';
import type { HydraulicTest, SurveyRecord } from '#shared/surveys/record.ts';
import type { ScopeId } from '#shared/surveys/scopes.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Button } from '#web/ui/button.tsx';
import { Check, Choices } from '#web/ui/check.tsx';
import { Field, FieldGroup } from '#web/ui/field.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { Select } from '#web/ui/select.tsx';
import { ReadingsPlot } from '#web/ui/readings-plot.tsx';
import { FigureInput } from './figure-input.tsx';
import { GaugeAdvice } from './gauge-advice.tsx';
import { HoldTimer } from './hold-timer.tsx';
import { LeakFields } from './leak-fields.tsx';
import { RaisingList } from './raising-list.tsx';
import { ReadingsTable } from './readings-table.tsx';
import { changeHydraulic, emptyHydraulic } from './record-edits.ts';
import type { Edit } from './record-edits.ts';
import { useTestClock } from './test-clock.ts';
import { TestOrReason } from './test-or-reason.tsx';
import { WordsInput } from './words-input.tsx';

interface Props {
  /** The order, whose clock it is. */
  orderId: string;
  facts: BoilerFacts;
  scope: ScopeId;
  record: SurveyRecord;
  edit: (change: Edit) => void;
}

/** The cold water test: wanted pressure worked out, precautions ticked where they are taken, readings, hold and leaks. */
export function HydraulicScreen({ orderId, facts, scope, record, edit }: Props) {
  const { hydraulic: test } = record;
  const start = () => {
    edit((so) => {
      const empty = emptyHydraulic(0);
      return { ...so, hydraulic: { ...empty, wantedPa: askedPa(facts, empty) } };
    });
  };
  return (
    <div className="grid gap-6">
      <Caution title="Water, never compressed air.">
        Fill the boiler to the top and let out all the air first: water lets go at once, air does not. Take
        off a gauge that the pressure would exceed, and gag or blank the safety valve. Follow your local code
        and your boiler inspector.
      </Caution>
      {test === null ? (
        <TestOrReason
          label="Record a hydraulic test"
          onStart={start}
          reason={record.noHydraulicReason}
          onReason={(noHydraulicReason) => {
            edit((so) => ({ ...so, noHydraulicReason }));
          }}
        />
      ) : (
        <TestFields
          orderId={orderId}
          facts={facts}
          scope={scope}
          record={record}
          test={test}
          onChange={(change) => {
            edit(changeHydraulic(change));
          }}
          onRemove={() => {
            edit((so) => ({ ...so, hydraulic: null }));
          }}
        />
      )}
    </div>
  );
}

const profileLabels = Object.fromEntries(testProfileIds.map((id) => [id, testProfiles[id].label])) as Record<
  TestProfileId,
  string
>;

interface TestProps extends Omit<Props, 'edit'> {
  test: HydraulicTest;
  onChange: (change: Partial<HydraulicTest>) => void;
  onRemove: () => void;
}

function TestFields({ orderId, facts, scope, record, test, onChange, onRemove }: TestProps) {
  const { show } = useUnits();
  const clock = useTestClock(`${orderId}.hydraulic`);
  const { status, text } = hydraulicTestCheck({ facts, record, scope });
  const kind = { pass: 'good', fail: 'bad', 'cannot-say': 'plain' } as const;
  const profile = testProfileOf(test.profileId);
  const setKind = (kindOfTest: Partial<Pick<HydraulicTest, 'firstTest' | 'profileId'>>) => {
    onChange({ ...kindOfTest, wantedPa: askedPa(facts, { ...test, ...kindOfTest }) });
  };
  return (
    <>
      <Select
        label="Tested to"
        value={testProfileIds.find((id) => id === test.profileId) ?? 'hobby'}
        options={profileLabels}
        hint={`Hold ${String(profile.holdMinutes)} minutes, fall at most ${String(profile.fallPercent)} %. ${profile.source}. Your local code governs; the report says which you picked.`}
        onChange={(profileId) => {
          if (profileId !== null) setKind({ profileId });
        }}
      />
      <FieldGroup legend="Which test">
        <Choices
          name="which-test"
          value={test.firstTest ? 'first' : 'repeat'}
          options={[
            {
              id: 'repeat',
              label: 'Repeat test',
              hint: `${String(profile.repeatPercent / 100)} times working pressure`,
            },
            {
              id: 'first',
              label: 'First test, or after a repair to the shell',
              hint: `${String(profile.firstPercent / 100)} times working pressure`,
            },
          ]}
          onChange={(id) => {
            setKind({ firstTest: id === 'first' });
          }}
        />
      </FieldGroup>
      <FigureInput
        label="Pressure wanted"
        unit="Pa"
        min={0}
        max={6_000_000}
        hint={`Worked out from the claimed ${show('pressure', facts.workingPressurePa)}; raise it if your local code asks for more`}
        value={test.wantedPa}
        onChange={(wantedPa) => {
          if (wantedPa !== null) onChange({ wantedPa });
        }}
      />
      <FieldGroup legend="Before the pump is touched">
        <Check
          label="Filled to the top, all air let out"
          checked={test.filledAndVented}
          onChange={({ target }) => {
            onChange({ filledAndVented: target.checked });
          }}
        />
        <Check
          label="The boiler’s own gauge is off, or will stand the pressure"
          checked={test.gaugeRemoved}
          onChange={({ target }) => {
            onChange({ gaugeRemoved: target.checked });
          }}
        />
        <Check
          label="Safety valve gagged or blanked"
          checked={test.valveGagged}
          onChange={({ target }) => {
            onChange({ valveGagged: target.checked });
          }}
        />
      </FieldGroup>
      <GaugeAdvice wantedPa={test.wantedPa} record={record} />
      <RaisingList test={test} />
      <ReadingsTable
        readings={test.readings}
        from="the first stroke"
        clock={clock}
        onChange={(readings) => {
          const minutes = new Set(readings.map(({ minute }) => minute));
          const keep = (minute: number | null) => (minute !== null && minutes.has(minute) ? minute : null);
          onChange({
            readings,
            holdStartMinute: keep(test.holdStartMinute),
            holdEndMinute: keep(test.holdEndMinute),
          });
        }}
      />
      <HoldTimer test={test} clock={clock} onChange={onChange} />
      <ReadingsPlot
        title="Pressure so far"
        readings={test.readings}
        levels={[
          { label: 'Wanted', pa: test.wantedPa },
          { label: 'Most allowed', pa: (test.wantedPa * (100 + limits.testOverPercent)) / 100 },
        ]}
      />
      <FieldGroup
        legend="The hold"
        hint={`At least ${String(profile.holdMinutes)} minutes, read at both ends`}
      >
        <div className="grid grid-cols-2 gap-3">
          <MinuteChoice
            label="Began at minute"
            value={test.holdStartMinute}
            readings={test.readings}
            onChange={(holdStartMinute) => {
              onChange({ holdStartMinute });
            }}
          />
          <MinuteChoice
            label="Ended at minute"
            value={test.holdEndMinute}
            readings={test.readings}
            onChange={(holdEndMinute) => {
              onChange({ holdEndMinute });
            }}
          />
        </div>
      </FieldGroup>
      <LeakFields
        leaks={test.leaks}
        onChange={(leaks) => {
          onChange({ leaks });
        }}
      />
      <FigureInput
        label="Permanent set"
        unit="mm"
        min={0}
        max={50}
        hint="Growth left once the pressure is off; nought if measured and none"
        value={test.permanentSetMm}
        onChange={(permanentSetMm) => {
          onChange({ permanentSetMm });
        }}
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
      <Notice kind={kind[status]}>{text}</Notice>
      <div>
        <Button kind="danger" onClick={onRemove}>
          Take this test off the record
        </Button>
      </div>
    </>
  );
}

interface MinuteProps {
  label: string;
  value: number | null;
  readings: HydraulicTest['readings'];
  onChange: (minute: number | null) => void;
}

function MinuteChoice({ label, value, readings, onChange }: MinuteProps) {
  const { show } = useUnits();
  return (
    <Field label={label}>
      {(control) => (
        <select
          {...control}
          value={value ?? ''}
          onChange={({ target }) => {
            onChange(target.value === '' ? null : Number(target.value));
          }}
        >
          <option value="">Not marked</option>
          {[...new Map(readings.map((reading) => [reading.minute, reading])).values()].map((reading) => (
            <option key={reading.minute} value={reading.minute}>
              {reading.minute}: {show('pressure', reading.pressurePa)}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
