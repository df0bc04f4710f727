import { compareCanonical } from './canonical.ts';
import { evidenceSums, strengthOf } from './evidence.ts';
import { isExamined, isFitted } from './examined.ts';
import type { Examined, SurveyInput } from './examined.ts';
import { hasInDate, instrumentsOf, instrumentsThatMatter } from './instruments.ts';
import { limits } from './limits.ts';
import { grades, instrumentKinds } from './record.ts';
import type { EngineeringCheck, Figure, Reason, SurveyResult } from './result.ts';
import { defectOf } from './rubric/index.ts';
import { scopes } from './scopes.ts';
import { ruleOfStop, verdictRules } from './verdict-rules.ts';
import type { RuleId } from './verdict-rules.ts';
import { verdicts } from './verdicts.ts';
import type { VerdictId } from './verdicts.ts';
import { inSentence, listText } from './words.ts';

interface Fired {
  rule: RuleId;
  criterionId: string | null;
  text: string;
  figures?: readonly Figure[];
}

const labelsOfDefects = ({ criterion, finding }: Examined): string[] => [
  ...new Set(
    finding.defects.flatMap((found) => {
      const spec = defectOf(criterion, found.code);
      return spec === undefined ? [] : [inSentence(spec.label)];
    }),
  ),
];

function fromGrades(items: readonly Examined[]): Fired[] {
  return items
    .filter(({ criterion }) => criterion.safetyCritical)
    .flatMap((item): Fired[] => {
      const { criterion, finding } = item;
      const why = labelsOfDefects(item);
      const text = `${criterion.title}: ${grades[finding.grade]}${why.length > 0 ? ` (${listText(why)})` : ''}.`;
      if (finding.grade === 'unfit')
        return [{ rule: 'safety-critical-unfit', criterionId: criterion.id, text }];
      if (finding.grade === 'attention')
        return [{ rule: 'safety-critical-attention', criterionId: criterion.id, text }];
      if (finding.grade === 'notFitted' && criterion.ifNotFitted !== 'nothing') {
        const rule = criterion.ifNotFitted === 'do-not-steam' ? 'no-safety-valve' : 'fitting-missing';
        return [{ rule, criterionId: criterion.id, text: `${criterion.title}: not fitted.` }];
      }
      return [];
    });
}

const fromDefects = (items: readonly Examined[]): Fired[] =>
  items.flatMap(({ criterion, finding }) =>
    finding.defects.flatMap((found): Fired[] => {
      const spec = defectOf(criterion, found.code);
      if (spec === undefined || spec.stop === null) return [];
      const where = found.where === '' ? '' : `, ${found.where}`;
      const text = `${criterion.title}: ${inSentence(spec.label)}${where}.`;
      return [{ rule: ruleOfStop[spec.stop], criterionId: criterion.id, text }];
    }),
  );

const fromChecks = (checks: readonly EngineeringCheck[]): Fired[] =>
  checks
    .filter((check) => check.status === 'fail')
    .flatMap((check) =>
      verdictRules
        .filter((rule) => (rule.checks as readonly string[]).includes(check.id))
        .map((rule) => ({
          rule: rule.id,
          criterionId: check.criterionId,
          text: check.text,
          figures: check.figures,
        })),
    );

function fromTests({ record, scope }: SurveyInput, checks: readonly EngineeringCheck[]): Fired[] {
  const hydraulic = checks.find((check) => check.id === 'hydraulic-test');
  const fired: Fired[] = [];
  if (hydraulic === undefined || hydraulic.status === 'cannot-say') {
    const outside = scopes[scope].hydraulic ? '' : ' The scope asked for does not include one.';
    fired.push({
      rule: 'no-hydraulic-test',
      criterionId: null,
      text: `${hydraulic?.text ?? 'No hydraulic test was made.'}${outside}`,
      figures: hydraulic?.figures ?? [],
    });
  }
  if (record.steam?.raisedSteam !== true) {
    const outside = scopes[scope].steam ? '' : ' The scope asked for does not include one.';
    const text = record.steam === null ? 'No steam test was made.' : 'Steam was not raised.';
    fired.push({ rule: 'no-steam-test', criterionId: null, text: text + outside });
  }
  return fired;
}

/** Whether the safety-critical items are known well enough; compared exactly, before any rounding. */
function isWellEvidenced(critical: readonly Examined[], input: SurveyInput): boolean {
  const { known, of } = evidenceSums(critical, input.record);
  return of > 0 && known * 100 >= of * limits.evidenceWantedPercent;
}

const fromEvidence = (critical: readonly Examined[], input: SurveyInput, percent: number): Fired[] =>
  isWellEvidenced(critical, input)
    ? []
    : [
        {
          rule: 'thin-evidence',
          criterionId: null,
          text: `Evidence over the safety-critical items is ${String(percent)} %, under the ${String(limits.evidenceWantedPercent)} % wanted.`,
          figures: [{ label: 'Evidence, safety-critical', value: percent, unit: '%' }],
        },
      ];

const fromInstruments = ({ record }: SurveyInput): Fired[] =>
  instrumentsThatMatter(record)
    .filter(({ kind }) => !hasInDate(record, kind))
    .map(({ kind, usedFor }) => ({
      rule: 'instrument-out-of-date',
      criterionId: null,
      text:
        instrumentsOf(record, kind).length === 0
          ? `No ${inSentence(instrumentKinds[kind])} is named for ${usedFor}.`
          : `${instrumentKinds[kind]} for ${usedFor}: not shown to be in calibration on the day.`,
    }));

const orderOf = (rule: string): number => verdictRules.findIndex((each) => each.id === rule);

/** Every rule that fires, in the order of the rules and then of examination. */
function reasonsFor(
  items: readonly Examined[],
  input: SurveyInput,
  checks: readonly EngineeringCheck[],
  safetyEvidence: number,
): Reason[] {
  const critical = items.filter(({ criterion }) => criterion.safetyCritical);
  const numberOf = (id: string | null) =>
    items.find(({ criterion }) => criterion.id === id)?.criterion.number ?? 0;
  const reasons = [
    ...fromGrades(items),
    ...fromDefects(items),
    ...fromChecks(checks),
    ...fromTests(input, checks),
    ...fromEvidence(critical, input, safetyEvidence),
    ...fromInstruments(input),
  ].flatMap((fired): Reason[] => {
    const rule = verdictRules.find((each) => each.id === fired.rule);
    return rule === undefined
      ? []
      : [{ verdict: rule.verdict, ...fired, figures: [...(fired.figures ?? [])] }];
  });
  return reasons.toSorted(
    (a, b) =>
      orderOf(a.rule) - orderOf(b.rule) ||
      numberOf(a.criterionId) - numberOf(b.criterionId) ||
      compareCanonical(a, b),
  );
}

function toProve(items: readonly Examined[], input: SurveyInput, fired: readonly Reason[]) {
  const has = (rule: RuleId) => fired.some((reason) => reason.rule === rule);
  const needs: SurveyResult['toProve'] = [];
  if (has('no-hydraulic-test'))
    needs.push({
      rule: 'no-hydraulic-test',
      text: 'A hydraulic test, held and witnessed, with a test gauge in calibration.',
    });
  if (has('no-steam-test'))
    needs.push({
      rule: 'no-steam-test',
      text: 'A steam test with full fire: valve, water gauge, feeds, flame and carbon monoxide.',
    });
  if (has('thin-evidence')) {
    for (const item of items) {
      const { criterion, finding } = item;
      const isShort = strengthOf(item, input.record) * 100 < limits.evidenceWantedPercent;
      if (!criterion.safetyCritical || !isFitted(item) || !isShort) continue;
      const better = criterion.ways
        .filter((way) => way.strength * 100 >= limits.evidenceWantedPercent || !finding.ways.includes(way.id))
        .map((way) => inSentence(way.label));
      const how = better.length > 0 ? listText(better.slice(-1)) : 'again';
      const now = isExamined(item) ? 'examine it further' : 'examine it';
      needs.push({ rule: 'thin-evidence', text: `${criterion.title}: ${now}, ${how}.` });
    }
  }
  for (const { kind, usedFor } of instrumentsThatMatter(input.record)) {
    if (!hasInDate(input.record, kind))
      needs.push({
        rule: 'instrument-out-of-date',
        text: `${instrumentKinds[kind]}: repeat ${usedFor} with one in calibration.`,
      });
  }
  return needs;
}

/** The verdict by the published rules: the first that fires decides, and nothing makes up for it. */
export function verdictOf(
  items: readonly Examined[],
  input: SurveyInput,
  checks: readonly EngineeringCheck[],
  safetyEvidence: number,
): Pick<SurveyResult, 'verdict' | 'reasons' | 'furtherReasons' | 'toProve'> {
  const fired = reasonsFor(items, input, checks, safetyEvidence);
  const id: VerdictId = fired[0]?.verdict ?? 'in-steaming-order';
  return {
    verdict: { id, label: verdicts[id] },
    reasons: fired.filter((reason) => reason.verdict === id),
    furtherReasons: fired.filter((reason) => reason.verdict !== id),
    toProve: toProve(items, input, fired),
  };
}
