import { useId } from 'react';
import { instrumentsThatMatter, instrumentsOf, isInDate } from '#shared/surveys/instruments.ts';
import { instrumentKinds } from '#shared/surveys/record.ts';
import type { Instrument, InstrumentKind, SurveyRecord } from '#shared/surveys/record.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Caution, Notice } from '#web/ui/notes.tsx';
import { FigureInput } from './figure-input.tsx';
import type { Edit } from './record-edits.ts';
import { WordsInput } from './words-input.tsx';

interface Props {
  record: SurveyRecord;
  /** Today, where the phone is. */
  today: string;
  edit: (change: Edit) => void;
}

const kinds = Object.keys(instrumentKinds) as InstrumentKind[];
const newInstrument = (kind: InstrumentKind): Instrument => ({
  kind,
  name: instrumentKinds[kind],
  serial: '',
  calibratedOn: null,
  fullScalePa: null,
});

/** The day of examination, and what is measured with. */
export function StartScreen({ record, today, edit }: Props) {
  const change = (index: number, fields: Partial<Instrument>) => {
    edit((so) => ({
      ...so,
      instruments: so.instruments.map((each, at) => (at === index ? { ...each, ...fields } : each)),
    }));
  };
  const missing = instrumentsThatMatter(record).filter(
    ({ kind }) => instrumentsOf(record, kind).length === 0,
  );
  return (
    <div className="grid gap-6">
      <Caution title="You may be alone at a stranger’s premises.">
        Tell somebody where you are and when you will be back. Get help to lift anything you would not lift at
        home.
      </Caution>
      <Field label="Day of examination" hint="The report speaks of this day and of nothing later">
        {(control) => (
          <input
            {...control}
            type="date"
            max={today}
            value={record.examinedOn ?? ''}
            onChange={({ target }) => {
              edit((so) => ({ ...so, examinedOn: target.value === '' ? null : target.value }));
            }}
          />
        )}
      </Field>
      {record.examinedOn === null && (
        <div>
          <Button
            kind="quiet"
            onClick={() => {
              edit((so) => ({ ...so, examinedOn: today }));
            }}
          >
            It is today
          </Button>
        </div>
      )}
      <section className="grid gap-4" aria-label="Instruments">
        <div>
          <h2 className="text-lg">Instruments</h2>
          <p className="text-[0.9375rem] leading-6 text-pencil">
            A test counts for half with an instrument out of calibration, and the verdict becomes Not proven.
          </p>
        </div>
        {missing.map(({ kind, usedFor }) => (
          <Notice key={kind}>
            The {instrumentKinds[kind].toLowerCase()} used for {usedFor} is not named yet.
          </Notice>
        ))}
        {record.instruments.map((instrument, index) => (
          <InstrumentFields
            // Instruments have no name of their own until one is typed.
            // eslint-disable-next-line react/no-array-index-key
            key={index}
            instrument={instrument}
            examinedOn={record.examinedOn}
            onChange={(fields) => {
              change(index, fields);
            }}
            onRemove={() => {
              edit((so) => ({ ...so, instruments: so.instruments.filter((_each, at) => at !== index) }));
            }}
          />
        ))}
        {record.instruments.length < 20 && (
          <AddInstrument
            onAdd={(kind) => {
              edit((so) => ({ ...so, instruments: [...so.instruments, newInstrument(kind)] }));
            }}
          />
        )}
      </section>
    </div>
  );
}

function AddInstrument({ onAdd }: { onAdd: (kind: InstrumentKind) => void }) {
  const id = useId();
  return (
    <div className="grid gap-1">
      <label htmlFor={id} className="font-medium">
        Add an instrument
      </label>
      <select
        id={id}
        className="control"
        value=""
        onChange={({ target }) => {
          if (target.value !== '') onAdd(target.value as InstrumentKind);
        }}
      >
        <option value="">Choose the kind</option>
        {kinds.map((kind) => (
          <option key={kind} value={kind}>
            {instrumentKinds[kind]}
          </option>
        ))}
      </select>
    </div>
  );
}

interface FieldsProps {
  instrument: Instrument;
  examinedOn: string | null;
  onChange: (fields: Partial<Instrument>) => void;
  onRemove: () => void;
}

function InstrumentFields({ instrument, examinedOn, onChange, onRemove }: FieldsProps) {
  const { kind, name, serial, calibratedOn, fullScalePa } = instrument;
  const isLate = calibratedOn !== null && examinedOn !== null && !isInDate(instrument, examinedOn);
  return (
    <fieldset className="grid gap-3 border-t border-rule pt-3">
      <legend className="float-left w-full font-medium">{instrumentKinds[kind]}</legend>
      <WordsInput
        label="Name"
        most={80}
        value={name}
        onChange={(value) => {
          onChange({ name: value });
        }}
      />
      <div className="grid grid-cols-[minmax(0,2fr)_minmax(0,3fr)] gap-3">
        <WordsInput
          label="Number"
          most={60}
          value={serial}
          onChange={(value) => {
            onChange({ serial: value });
          }}
        />
        <Field label="Calibrated on" error={isLate ? 'Out of date on the day' : undefined}>
          {(control) => (
            <input
              {...control}
              type="date"
              value={calibratedOn ?? ''}
              onChange={({ target }) => {
                onChange({ calibratedOn: target.value === '' ? null : target.value });
              }}
            />
          )}
        </Field>
      </div>
      {kind === 'test-gauge' && (
        <FigureInput
          label="Full scale"
          unit="Pa"
          min={10_000}
          max={100_000_000}
          hint="Between 1.5 and 4 times the test pressure"
          value={fullScalePa}
          onChange={(value) => {
            onChange({ fullScalePa: value });
          }}
        />
      )}
      <div>
        <Button kind="plain" onClick={onRemove}>
          Take it off the list
        </Button>
      </div>
    </fieldset>
  );
}
