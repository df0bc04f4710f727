import { listedText } from '#shared/engineering/quantities.ts';
import { examinedOf } from '#shared/surveys/examined.ts';
import { figureWords } from '#shared/surveys/figure-words.ts';
import { partsOf, weakestOf } from '#shared/surveys/parts.ts';
import { instrumentKinds } from '#shared/surveys/record.ts';
import type { EngineeringCheck } from '#shared/surveys/result.ts';
import { dayText } from '#shared/time.ts';
import { printTable } from '../../print/table.ts';
import type { PrintJob } from './job.ts';

/** What each pressure part stands by calculation. */
export function printParts({ sheets, report, units }: PrintJob): void {
  const parts = partsOf(report.facts, examinedOf(report));
  const weakest = weakestOf(parts);
  sheets.heading(2, 'Pressure by parts');
  printTable(
    sheets,
    [
      { head: 'Part', share: 2.4 },
      { head: 'Thickness or diameter', share: 2, isNumber: true },
      { head: 'Taken from', share: 1.6 },
      { head: 'By calculation', share: 5 },
    ],
    parts.map(({ id, title, thicknessMm, isMeasured, standsPa, refusal }) => [
      id === weakest?.id ? `${title} (governs)` : title,
      thicknessMm === null ? '–' : listedText('length', units, thicknessMm),
      thicknessMm === null ? '–' : isMeasured ? 'Measured' : 'The seller',
      standsPa === null ? (refusal?.text ?? 'Cannot say') : listedText('pressure', units, standsPa),
    ]),
  );
}

const outcomes: Readonly<Record<EngineeringCheck['status'], string>> = {
  pass: 'Passes',
  fail: 'Fails',
  'cannot-say': 'Cannot be said',
};

/** Every engineering check with the figures it went by. */
export function printChecks({ sheets, report, units }: PrintJob): void {
  sheets.heading(2, 'Engineering checks');
  printTable(
    sheets,
    [
      { head: 'Check', share: 3 },
      { head: 'Outcome', share: 1.8 },
      { head: 'Why', share: 7 },
    ],
    report.result.checks.map(({ title, status, text, figures }) => [
      title,
      outcomes[status],
      [text, figures.map((figure) => `${figure.label} ${figureWords(figure, units)}`).join(' · ')]
        .filter(Boolean)
        .join('\n'),
    ]),
  );
}

/** What was measured with. */
export function printInstruments({ sheets, report, units }: PrintJob): void {
  const { instruments } = report.record;
  if (instruments.length === 0) return;
  sheets.heading(2, 'Instruments');
  printTable(
    sheets,
    [
      { head: 'Instrument', share: 3 },
      { head: 'Name', share: 3 },
      { head: 'Number', share: 2 },
      { head: 'Full scale', share: 2, isNumber: true },
      { head: 'Calibrated', share: 2.4, isNumber: true },
    ],
    instruments.map(({ kind, name, serial, fullScalePa, calibratedOn }) => [
      instrumentKinds[kind],
      name,
      serial || '–',
      fullScalePa === null ? '–' : listedText('pressure', units, fullScalePa),
      calibratedOn === null ? '–' : dayText(calibratedOn),
    ]),
  );
}
