import { z } from 'zod';
import { fireMarginK } from '../engineering/metal.ts';
import { seamEfficiencies } from '../engineering/shell.ts';
import { sources, surenesses } from '../engineering/sources.ts';
import { testProfileIds, testProfiles } from '../engineering/test-profiles.ts';
import { limits } from './limits.ts';
import { grades, remedies } from './record.ts';
import { allowanceGroups } from './result.ts';
import { criteriaOf, rubricOf, rubricVersion, rubricVersions } from './rubric/index.ts';
import { rubric, stopKinds, consequences } from './rubric/types.ts';
import type { Criterion, Rubric } from './rubric/types.ts';
import { verdictRule, verdictRules } from './verdict-rules.ts';
import { verdictId, verdicts } from './verdicts.ts';
import { inSentence, listText } from './words.ts';

const idAndLabel = z.strictObject({ id: z.string(), label: z.string() });

/** One thing that differs between two versions of the method. */
export const difference = z.strictObject({
  criterionId: z.string(),
  what: z.enum([
    'added',
    'removed',
    'weight',
    'safety-critical',
    'applies-to',
    'ways',
    'measurements',
    'defects',
  ]),
  text: z.string(),
});
export type Difference = z.infer<typeof difference>;

/** The whole published method as data: what `GET /api/method` answers and the Method page shows. */
export const methodDataSchema = z.strictObject({
  current: z.string(),
  versions: z.array(
    z.strictObject({
      version: z.string(),
      publishedOn: z.iso.date(),
      changes: z.array(z.string()),
      differences: z.array(difference),
    }),
  ),
  rubric,
  grades: z.array(idAndLabel.extend({ points: z.int().nullable() })),
  remedies: z.array(idAndLabel),
  consequences: z.array(idAndLabel),
  stops: z.array(idAndLabel),
  verdicts: z.array(idAndLabel.extend({ id: verdictId })),
  verdictRules: z.array(verdictRule),
  allowanceGroups: z.array(idAndLabel),
  limits: z.array(
    z.strictObject({
      id: z.string(),
      label: z.string(),
      value: z.number(),
      unit: z.string(),
      source: z.string(),
    }),
  ),
  /** How a hydraulic test may be made; the surveyor picks one and the report says which. */
  testProfiles: z.array(
    z.strictObject({
      id: z.string(),
      label: z.string(),
      firstPercent: z.number(),
      repeatPercent: z.number(),
      holdMinutes: z.number(),
      fallPercent: z.number(),
      source: z.string(),
      sureness: z.string(),
    }),
  ),
  /** How the figures are worked out and rounded, a sentence each. */
  arithmetic: z.array(z.string()),
  cautions: z.array(z.string()),
});
export type MethodData = z.infer<typeof methodDataSchema>;

const same = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b);

function changesOf(before: Criterion, after: Criterion): Difference[] {
  const changed: Difference[] = [];
  const note = (what: Difference['what'], text: string) =>
    changed.push({ criterionId: after.id, what, text: `${after.title}: ${text}` });
  if (before.weight !== after.weight)
    note('weight', `weight ${String(before.weight)} became ${String(after.weight)}.`);
  if (before.safetyCritical !== after.safetyCritical)
    note('safety-critical', after.safetyCritical ? 'now safety-critical.' : 'no longer safety-critical.');
  if (!same(before.appliesTo, after.appliesTo)) note('applies-to', 'applies to other boilers than before.');
  if (!same(before.ways, after.ways)) note('ways', 'ways of examining or their strengths changed.');
  const measured = new Set(before.measurements.map(({ quantity }) => quantity));
  const more = after.measurements.filter(({ quantity }) => !measured.has(quantity));
  if (more.length > 0)
    note('measurements', `also measures ${listText(more.map(({ label }) => inSentence(label)))}.`);
  else if (!same(before.measurements, after.measurements))
    note('measurements', 'what is measured, or its limits, changed.');
  if (!same(before.defects, after.defects)) note('defects', 'the defect catalogue changed.');
  return changed;
}

/** What differs from one version of the method to another, in the order of examination. */
export function differencesBetween(before: Rubric, after: Rubric): Difference[] {
  const old = new Map(criteriaOf(before).map((criterion) => [criterion.id, criterion]));
  const now = new Set(criteriaOf(after).map((criterion) => criterion.id));
  const changed = criteriaOf(after).flatMap((criterion): Difference[] => {
    const was = old.get(criterion.id);
    return was === undefined
      ? [{ criterionId: criterion.id, what: 'added', text: `${criterion.title}: added.` }]
      : changesOf(was, criterion);
  });
  const removed = [...old.values()]
    .filter((criterion) => !now.has(criterion.id))
    .map((criterion): Difference => ({
      criterionId: criterion.id,
      what: 'removed',
      text: `${criterion.title}: removed.`,
    }));
  return [...changed, ...removed];
}

const labelled = <T extends string>(words: Readonly<Record<T, string>>): { id: T; label: string }[] =>
  (Object.keys(words) as T[]).map((id) => ({ id, label: words[id] }));

const points: Readonly<Record<string, number>> = limits.gradePoints;

const limitRow = (id: string, label: string, value: number, unit: string, source: string) => ({
  id,
  label,
  value,
  unit,
  source,
});
const ours = 'this method';
const hobbyCode = 'UK hobby code 2012, as quoted; the local code governs';

/**
 * The published method, ready to be sent as JSON.
 *
 * @throws Problem `invalid-input` if no such version was published.
 */
export function methodData(version: string = rubricVersion): MethodData {
  return {
    current: rubricVersion,
    versions: rubricVersions.map((each, index) => {
      const before = rubricVersions[index - 1];
      return {
        version: each.version,
        publishedOn: each.publishedOn,
        changes: [...each.changes],
        differences: before === undefined ? [] : differencesBetween(before, each),
      };
    }),
    rubric: rubricOf(version),
    grades: labelled(grades).map((each) => ({ ...each, points: points[each.id] ?? null })),
    remedies: labelled(remedies),
    consequences: labelled(consequences),
    stops: labelled(stopKinds),
    verdicts: labelled(verdicts),
    verdictRules: verdictRules.map((rule) => ({ ...rule, checks: [...rule.checks] })),
    allowanceGroups: labelled(allowanceGroups),
    limits: [
      limitRow(
        'evidence-wanted',
        'Evidence wanted over the safety-critical items',
        limits.evidenceWantedPercent,
        '%',
        ours,
      ),
      limitRow(
        'accumulation',
        'Most that pressure may rise above working pressure',
        limits.accumulationPercent,
        '%',
        'common practice; the local code governs',
      ),
      limitRow(
        'first-test',
        'First hydraulic test, of working pressure',
        limits.firstTestPercent,
        '%',
        hobbyCode,
      ),
      limitRow(
        'repeat-test',
        'Repeat hydraulic test, of working pressure',
        limits.repeatTestPercent,
        '%',
        hobbyCode,
      ),
      limitRow(
        'test-over',
        'Most that the test pressure may be passed by',
        limits.testOverPercent,
        '%',
        ours,
      ),
      limitRow('hold', 'Hydraulic hold, at least', limits.holdMinutes, 'minutes', 'common practice'),
      limitRow('hold-fall', 'Most that pressure may fall over the hold', limits.holdFallPercent, '%', ours),
      limitRow(
        'gauge-steady',
        'Working pressure, at most, of the gauge’s full scale',
        limits.gaugeSteadyPercent,
        '%',
        'EN 837-2, from memory',
      ),
      limitRow(
        'gauge-class',
        'Class assumed for the boiler’s gauge',
        limits.gaugeClassPercent,
        '%',
        'EN 837-1',
      ),
      limitRow(
        'calibration',
        'An instrument is out of date after',
        limits.calibrationMonths,
        'months',
        'common practice',
      ),
      limitRow(
        'fire-margin',
        'Metal in the fire is taken hotter than the steam by',
        fireMarginK,
        '°C',
        `${sources['metal-margin'].title}; from memory`,
      ),
      ...Object.entries(seamEfficiencies).map(([id, { label, efficiency }]) =>
        limitRow(
          `seam-${id}`,
          `${label}: carries of its plate`,
          efficiency * 100,
          '%',
          sources['seam-efficiency'].title,
        ),
      ),
      limitRow(
        'carbon-monoxide',
        'Carbon monoxide at the operator, under',
        limits.coShortTermPpm,
        'ppm',
        limits.coSource,
      ),
      limitRow(
        'second-feed',
        'A second means of feed is asked for from',
        limits.secondFeedBarLitres,
        'bar·litres',
        limits.secondFeedSource,
      ),
      limitRow(
        'out-of-date',
        'A test with an instrument out of date counts',
        limits.outOfDateFactor,
        'of full',
        ours,
      ),
      limitRow(
        'labour',
        'Labour in the put-right allowance',
        limits.labourMinorPerHour,
        'pence an hour',
        ours,
      ),
      limitRow(
        'hydraulic-retest',
        'Hydraulic test after a repair to the shell',
        limits.hydraulicRetestMinor,
        'pence',
        ours,
      ),
      limitRow(
        'steam-retest',
        'Steam test after a repair to the shell',
        limits.steamRetestMinor,
        'pence',
        ours,
      ),
    ],
    testProfiles: testProfileIds.map((id) => {
      const { sureness, ...profile } = testProfiles[id];
      return { id, ...profile, sureness: surenesses[sureness] };
    }),
    arithmetic: [
      'Condition is the mean of the grade points over what was examined, each item by its weight, to the nearest whole number, halves up. It is a dash where less than a third of the applicable weight was examined.',
      'Each way of examining has a strength: how surely it shows the item by itself. In several ways, what each leaves unknown is multiplied: half by eye and a quarter by measuring leave an eighth.',
      'A way that needs a test counts for nothing without that test, and for half with an instrument out of calibration.',
      'A safety-critical item graded Sound or Serviceable on its weakest way alone, with no reason given, counts for half.',
      'Evidence is the mean of those strengths over all that applies and is fitted, each item by its weight, rounded down. What was not examined counts nothing.',
      'The verdict is the first whose rule fires. No merit elsewhere makes up for it.',
      'The put-right allowance adds hours at the labour rate to parts, each line to the nearest penny. Its low is the sum of the lows and its high the sum of the highs; nothing is taken off for jobs that share work.',
    ],
    cautions: [
      'The verdict speaks of the boiler as found on the day of examination, and of nothing later.',
      'A report is no certificate. Whether a boiler may be steamed is for the boiler inspector, under the local code.',
    ],
  };
}
