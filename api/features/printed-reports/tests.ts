import { figureText, listedText } from '#shared/engineering/quantities.ts';
import { testProfileOf } from '#shared/engineering/test-profiles.ts';
import { paPerBar, paPerPsi } from '#shared/engineering/units.ts';
import { leakClasses, leakPlaces } from '#shared/surveys/record.ts';
import type { HydraulicTest, SteamTest } from '#shared/surveys/record.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import { drawPlot } from '../../print/plot.ts';
import type { Sheets } from '../../print/sheets.ts';
import { printTable } from '../../print/table.ts';
import type { PrintJob } from './job.ts';

const pairs = (sheets: Sheets, rows: readonly (readonly [string, string])[]): void => {
  const half = Math.ceil(rows.length / 2);
  printTable(
    sheets,
    [
      { head: '', share: 3 },
      { head: '', share: 2, isNumber: true },
      { head: '', share: 0.4 },
      { head: '', share: 3 },
      { head: '', share: 2, isNumber: true },
    ],
    Array.from({ length: half }, (_, index) => [
      ...(rows[index] ?? ['', '']),
      '',
      ...(rows[index + half] ?? ['', '']),
    ]),
  );
};

const yesNo = (value: boolean | null): string => (value === null ? 'Not tried' : value ? 'Yes' : 'No');

function readingsTable({ sheets, units }: PrintJob, readings: SteamTest['readings']): void {
  const sorted = readings.toSorted((a, b) => a.minute - b.minute);
  const text = sorted.map(
    ({ minute, pressurePa }) => `${figureText(minute)} min ${listedText('pressure', units, pressurePa)}`,
  );
  if (text.length === 0) return;
  sheets.tag('P', () => {
    sheets.write(`Readings: ${text.join('; ')}.`, { size: 8, colour: 'pencil' });
  });
  sheets.gap(4);
}

const number = (value: number | null, unit: string): string =>
  value === null ? '–' : `${figureText(value)} ${unit}`;

function noneText(isInScope: boolean, reason: string, what: string): string {
  if (!isInScope) return `This scope does not cover ${what}.`;
  return reason === '' ? `There was no record of ${what}.` : `Not made: ${reason}`;
}

function printHydraulic(job: PrintJob, test: HydraulicTest): void {
  const { sheets, units, report } = job;
  const pressure = (pa: number): string => listedText('pressure', units, pa);
  const outcome = report.result.checks.find(({ id }) => id === 'hydraulic-test');
  if (outcome)
    sheets.tag('P', () => {
      sheets.write(outcome.text);
    });
  const { holdStartMinute: from, holdEndMinute: to } = test;
  pairs(sheets, [
    ['Kind', test.firstTest ? 'First, or after repair' : 'Repeat'],
    ['Tested to', testProfileOf(test.profileId).label],
    ['Pressure wanted', pressure(test.wantedPa)],
    ['Held', from === null || to === null ? '–' : `${figureText(to - from)} min`],
    ['Filled and vented', yesNo(test.filledAndVented)],
    ['Gauge taken off', yesNo(test.gaugeRemoved)],
    ['Safety valve gagged', yesNo(test.valveGagged)],
    ['Permanent set', test.permanentSetMm === null ? '–' : listedText('length', units, test.permanentSetMm)],
  ]);
  if (test.leaks.length > 0)
    printTable(
      sheets,
      [
        { head: 'Leak at', share: 3 },
        { head: 'Where', share: 4 },
        { head: 'How much', share: 2 },
        { head: 'Made dry', share: 1.5 },
      ],
      test.leaks.map(({ place, where, leakClass, cured }) => [
        leakPlaces[place],
        where || '–',
        leakClasses[leakClass] ?? '–',
        cured ? 'Yes' : 'No',
      ]),
    );
  plotReadings(job, test.readings, {
    title: 'Hydraulic test',
    levels: [
      { label: 'Wanted', pa: test.wantedPa },
      { label: 'Most, 6 % over', pa: test.wantedPa * 1.06 },
    ],
    stretch: from === null || to === null ? null : { label: 'Hold', from, to },
  });
  readingsTable(job, test.readings);
}

function plotReadings(
  { sheets, units }: PrintJob,
  readings: SteamTest['readings'],
  of: {
    title: string;
    levels: readonly { label: string; pa: number }[];
    stretch?: { label: string; from: number; to: number } | null;
  },
): void {
  if (readings.length < 2) return;
  const per = units === 'imperial' ? paPerPsi : paPerBar;
  drawPlot(sheets, {
    title: of.title,
    x: 'Minutes',
    y: `Pressure, ${units === 'imperial' ? 'psi' : 'bar'}`,
    points: readings
      .toSorted((a, b) => a.minute - b.minute)
      .map(({ minute, pressurePa }) => [minute, pressurePa / per] as const),
    levels: of.levels.map(({ label, pa }) => ({ label, y: pa / per })),
    stretch: of.stretch ?? null,
  });
}

function printSteam(job: PrintJob, test: SteamTest): void {
  const { sheets, units, report } = job;
  const pressure = (pa: number | null): string => (pa === null ? '–' : listedText('pressure', units, pa));
  pairs(sheets, [
    ['Raised steam', yesNo(test.raisedSteam)],
    ['To working pressure', number(test.minutesToWorkingPressure, 'min')],
    ['Safety valve lifts at', pressure(test.valveLiftsAtPa)],
    ['Reseats at', pressure(test.valveReseatsAtPa)],
    ['Highest, full fire, all shut', pressure(test.highestPressurePa)],
    ['Water gauge blown through', yesNo(test.gaugeBlownThrough)],
    ['Both passages clear', yesNo(test.passagesClear)],
    ['Feeds delivered', yesNo(test.feedsDelivered)],
    ['Evaporation', number(test.evaporationKgPerH, 'kg/h')],
    ['Flame settled', yesNo(test.flameSettled)],
    ['Gas tight', yesNo(test.gasTight)],
    ['Carbon monoxide at the operator', number(test.coPpmAtOperator, 'ppm')],
  ]);
  const working = report.facts.workingPressurePa;
  plotReadings(job, test.readings, {
    title: 'Steam test',
    levels: [
      { label: 'Claimed working pressure', pa: working },
      { label: 'A tenth over', pa: working * 1.1 },
    ],
  });
  readingsTable(job, test.readings);
}

/** The two tests as they were made, or why they were not. */
export function printTests(job: PrintJob): void {
  const { sheets, report } = job;
  const { record, scope } = report;
  const say = (text: string) => {
    sheets.tag('P', () => {
      sheets.write(text);
    });
  };
  sheets.heading(2, 'Hydraulic test');
  if (record.hydraulic) printHydraulic(job, record.hydraulic);
  else say(noneText(scopes[scope].hydraulic, record.noHydraulicReason, 'a hydraulic test'));
  if (record.hydraulic?.note) say(record.hydraulic.note);
  sheets.heading(2, 'Steam test');
  if (record.steam) printSteam(job, record.steam);
  else say(noneText(scopes[scope].steam, record.noSteamReason, 'a steam test'));
  if (record.steam?.note) say(record.steam.note);
}
