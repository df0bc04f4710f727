import { listedText } from '#shared/engineering/quantities.ts';
import type { UnitSystem } from '#shared/engineering/quantities.ts';
import type { Report } from '#shared/surveys/contract.ts';
import { examinedOf } from '#shared/surveys/examined.ts';
import { grades } from '#shared/surveys/record.ts';
import type { Grade } from '#shared/surveys/record.ts';
import { extras, scopes } from '#shared/surveys/scopes.ts';
import { verdicts } from '#shared/surveys/verdicts.ts';
import { dayOf, dayText } from '#shared/time.ts';
import { drawMark, inkOfGrade } from '../../print/marks.ts';
import { printDrawing } from '../../print/drawing.ts';
import { openSheets } from '../../print/sheets.ts';
import type { Paper, Sheets } from '../../print/sheets.ts';
import { printAllowance } from './allowance.ts';
import { printFindings } from './findings.ts';
import { printPhotographs } from './photographs.ts';
import { printChecks, printInstruments, printParts } from './tables.ts';
import { printTests } from './tests.ts';

interface Options {
  paper: Paper;
  units: UnitSystem;
  images: ReadonlyMap<string, Buffer>;
  /** Where anyone can check the copy. */
  checkAddress: string;
}

const markOfVerdict: Readonly<Record<keyof typeof verdicts, Grade>> = {
  'do-not-steam': 'unfit',
  'repair-before-steaming': 'attention',
  'not-proven': 'notExamined',
  'in-steaming-order': 'sound',
};

function printVerdict(sheets: Sheets, { result }: Report): void {
  const { doc, left } = sheets;
  const mark = markOfVerdict[result.verdict.id];
  sheets.tag('P', () => {
    sheets.write('Verdict, as found on the day', { size: 8, weight: 'medium', colour: 'pencil' });
  });
  sheets.tag('H2', () => {
    drawMark(doc, mark, left + 8, doc.y + 10, 7);
    sheets.write(verdicts[result.verdict.id], { size: 16, weight: 'bold', colour: inkOfGrade[mark], x: 24 });
  });
  sheets.gap(4);
  const list = (texts: readonly string[]) => {
    for (const text of texts)
      sheets.tag('P', () => {
        sheets.write(`– ${text}`, { x: 24, size: 9.5 });
      });
  };
  list(
    result.reasons.length === 0
      ? ['Nothing found speaks against it, and enough was examined to say so.']
      : result.reasons.map(({ text }) => text),
  );
  if (result.furtherReasons.length > 0) {
    sheets.heading(3, 'What would still stand against it once that is put right');
    list(result.furtherReasons.map(({ text }) => text));
  }
  if (result.toProve.length > 0) {
    sheets.heading(3, 'What would prove it');
    list(result.toProve.map(({ text }) => text));
  }
  sheets.gap(6);
  sheets.tag('P', () => {
    sheets.write(
      `Condition ${result.condition === null ? '–' : String(result.condition)} of 100. Evidence ${String(result.evidence)} %.`,
      { size: 13, weight: 'medium' },
    );
  });
  sheets.gap(4);
  const cells = result.sections.map(
    ({ title, mean, evidence }) =>
      `${title}: ${mean === null ? '–' : String(mean)} of 100, evidence ${evidence === null ? '–' : `${String(evidence)} %`}`,
  );
  sheets.tag('P', () => {
    sheets.write(`${cells.join('. ')}.`, { size: 8, colour: 'pencil' });
  });
}

const limitsOf = (report: Report): string[] => [
  `It covers what the scope covers and no more: ${scopes[report.scope].covers}`,
  'It speaks of the day of examination only. A boiler can change in store, in carriage and in steam.',
  `What is marked ${grades.notExamined} was not examined, and nothing is implied about it.`,
  `It was scored by the published method, version ${report.record.rubricVersion}; anyone can work it out again from what is recorded here.`,
  'It is no certificate and no permission to steam. Follow your local code and your boiler inspector.',
];

/** A filed report on paper: the same as the page says, with its title block and check code on every sheet. */
export function printReport(report: Report, options: Options): Promise<Buffer> {
  const { listing, surveyor, facts, record, scope, signOff } = report;
  const { units, images } = options;
  const filedOn = dayText(dayOf(report.filedAt));
  const examinedOn = record.examinedOn === null ? filedOn : dayText(record.examinedOn);
  const sheets = openSheets({
    paper: options.paper,
    title: `Survey report: ${listing.title}`,
    subject: `Condition survey of a model boiler, examined ${examinedOn}`,
    codeAddress: options.checkAddress,
    at: report.filedAt,
    block: [
      { label: 'Boiler', value: listing.title, share: 2.2 },
      {
        label: 'Surveyor',
        value: surveyor.number === '' ? surveyor.name : `${surveyor.name}, no. ${surveyor.number}`,
      },
      { label: 'Signed and filed', value: filedOn },
      { label: 'Method', value: record.rubricVersion, share: 0.7 },
      { label: 'Check code', value: report.checkCode },
    ],
  });
  const job = { sheets, report, units, images };
  const covered = [scopes[scope].label, ...report.extras.map((extra) => extras[extra].label)];
  sheets.tag('P', () => {
    sheets.write('Tubeplate · survey report', { size: 8, weight: 'medium', colour: 'copper' });
  });
  sheets.heading(1, listing.title);
  sheets.tag('P', () => {
    sheets.write(
      `Examined ${examinedOn}. ${covered.join(', ')}. Claimed working pressure ${listedText('pressure', units, facts.workingPressurePa)}.`,
      { colour: 'pencil' },
    );
  });
  sheets.gap(6);
  sheets.rule('ink');
  printVerdict(sheets, report);
  sheets.gap(8);
  sheets.tag('Note', () => {
    sheets.write(
      'This is not a certificate. It says what was found on one day. Before the boiler is steamed again, your club’s or insurer’s boiler inspector must test it under your local code.',
      { weight: 'medium' },
    );
  });
  sheets.heading(2, 'Drawing');
  const items = examinedOf({ facts, record });
  printDrawing(
    sheets,
    facts,
    record.rubricVersion,
    new Map(items.map(({ criterion, finding }) => [criterion.id, finding.grade])),
  );
  if (record.summary !== '') {
    sheets.heading(2, 'From the surveyor');
    sheets.tag('P', () => {
      sheets.write(record.summary);
    });
  }
  printAllowance(job);
  printFindings(job);
  printTests(job);
  printParts(job);
  printChecks(job);
  printInstruments(job);
  printPhotographs(job);
  sheets.heading(2, 'Limits of this report');
  for (const text of limitsOf(report))
    sheets.tag('P', () => {
      sheets.write(`– ${text}`, { size: 9 });
    });
  sheets.gap(8);
  sheets.tag('P', () => {
    sheets.write(
      `Signed ${signOff.name}, ${filedOn}, who declared independence of both parties. Check this copy at ${options.checkAddress}`,
      { size: 9 },
    );
  });
  return sheets.finish();
}
