import { formatBand } from '#shared/money-words.ts';
import { measuredWords } from '#shared/surveys/figure-words.ts';
import { foundGroups, groupFound } from '#shared/surveys/found.ts';
import type { Found, FoundGroup } from '#shared/surveys/found.ts';
import { grades, remedies } from '#shared/surveys/record.ts';
import { defectOf } from '#shared/surveys/rubric/index.ts';
import { drawMark, inkOfGrade } from '../../print/marks.ts';
import type { PrintJob } from './job.ts';

const inset = 22;

/** A line of a grade: mark, number, title, and the grade in words. */
function gradeLine({ sheets }: PrintJob, { criterion, finding }: Found): void {
  const { doc, left, width } = sheets;
  sheets.need(34);
  sheets.tag('H3', () => {
    const y = doc.y;
    sheets.write(String(criterion.number), { weight: 'medium', colour: 'pencil', width: inset });
    const after = doc.y;
    doc.y = y;
    sheets.write(criterion.title, { weight: 'medium', x: inset, width: width - inset - 110 });
    const end = Math.max(after, doc.y);
    doc.y = y;
    sheets.write(grades[finding.grade], {
      x: width - 84,
      weight: 'medium',
      colour: inkOfGrade[finding.grade],
    });
    drawMark(doc, finding.grade, left + width - 94, y + 6);
    doc.y = end;
  });
}

const sentence = (text: string): string => (/[.!?]$/.test(text) ? text : `${text}.`);

function defectText({ criterion, lines }: Found, defect: Found['finding']['defects'][number]): string {
  const line = lines.find(({ defectCode }) => defectCode === defect.code);
  const label = defectOf(criterion, defect.code)?.label ?? defect.code;
  const remedy = defect.remedy ?? defectOf(criterion, defect.code)?.remedy ?? null;
  const cost =
    line === undefined || line.highMinor === 0 ? '' : `, ${formatBand(line.lowMinor, line.highMinor)}`;
  return [
    defect.where === '' ? label : `${label}, ${defect.where}`,
    defect.note,
    remedy === null || remedy === 'none' ? '' : `${remedies[remedy]}${cost}`,
  ]
    .filter(Boolean)
    .map(sentence)
    .join(' ');
}

function printFound(job: PrintJob, found: Found): void {
  const { sheets, units } = job;
  const { criterion, finding } = found;
  gradeLine(job, found);
  const say = (text: string, colour: 'ink' | 'pencil' = 'ink') => {
    if (text === '') return;
    sheets.tag('P', () => {
      sheets.write(text, { x: inset, size: 9, colour });
    });
  };
  say(finding.reason);
  for (const defect of finding.defects) say(defectText(found, defect));
  say(finding.note);
  say(
    criterion.measurements
      .flatMap((spec) => {
        const values = finding.measurements.filter(({ quantity }) => quantity === spec.quantity);
        const told = values.map(({ value }) => measuredWords(spec, value, units)).join(', ');
        return told === '' ? [] : [`${spec.label}: ${told}`];
      })
      .join('; '),
  );
  const ways = criterion.ways.filter(({ id }) => finding.ways.includes(id)).map(({ label }) => label);
  if (ways.length > 0) say(`Examined ${ways.join(', ').toLowerCase()}.`, 'pencil');
  sheets.gap(2);
  sheets.rule();
}

const groupOrder: readonly FoundGroup[] = ['must', 'should', 'looks', 'well', 'notExamined', 'notFitted'];

/** Every item examined, what presses most first. */
export function printFindings(job: PrintJob): void {
  const groups = groupFound(job.report);
  job.sheets.heading(2, 'What was found');
  for (const id of groupOrder) {
    const items = groups.get(id) ?? [];
    if (items.length === 0) continue;
    job.sheets.heading(3, `${foundGroups[id]} (${String(items.length)})`);
    for (const found of items) printFound(job, found);
    job.sheets.gap(4);
  }
}
