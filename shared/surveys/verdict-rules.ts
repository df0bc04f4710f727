import { z } from 'zod';
import type { StopKind } from './rubric/types.ts';
import { verdictId } from './verdicts.ts';

export const verdictRule = z.strictObject({
  id: z.string(),
  verdict: verdictId,
  title: z.string(),
  why: z.string(),
  /** The engineering checks whose failing fires it. */
  checks: z.array(z.string()),
});
export type VerdictRule = z.infer<typeof verdictRule>;

/** The rules in the order they are tried; the first verdict with a rule that fires is the one given. */
export const verdictRules = [
  {
    id: 'safety-critical-unfit',
    verdict: 'do-not-steam',
    title: 'A safety-critical item is Unfit',
    why: 'No other merit makes up for it.',
    checks: [],
  },
  {
    id: 'no-safety-valve',
    verdict: 'do-not-steam',
    title: 'There is no safety valve',
    why: 'Nothing then limits the pressure but the strength of the shell.',
    checks: [],
  },
  {
    id: 'hydraulic-test-failed',
    verdict: 'do-not-steam',
    title: 'The hydraulic test failed',
    why: 'The shell leaked, would not hold, or took a permanent set.',
    checks: ['hydraulic-test'],
  },
  {
    id: 'crack-bulge-collapse',
    verdict: 'do-not-steam',
    title: 'A crack, bulge or collapse is recorded',
    why: 'The plate has already been beyond what it will stand.',
    checks: [],
  },
  {
    id: 'soft-solder',
    verdict: 'do-not-steam',
    title: 'Soft solder holds a pressure joint',
    why: 'It softens not far above the temperature of the steam, and creeps below it.',
    checks: ['joint-material'],
  },
  {
    id: 'valve-did-not-lift',
    verdict: 'do-not-steam',
    title: 'The safety valve did not lift by working pressure and a tenth',
    why: 'A valve that lifts late is no limit.',
    checks: ['valve-lift'],
  },
  {
    id: 'pressure-climbed',
    verdict: 'do-not-steam',
    title: 'Pressure rose above working pressure and a tenth with the valve lifting',
    why: 'The fire makes more steam than the valve passes.',
    checks: ['accumulation'],
  },
  {
    id: 'passage-blocked',
    verdict: 'do-not-steam',
    title: 'A water gauge passage is blocked',
    why: 'A blocked gauge shows water that is not there.',
    checks: ['gauge-passages'],
  },
  {
    id: 'wall-too-thin',
    verdict: 'do-not-steam',
    title: 'Measured thickness gives less than the claimed working pressure',
    why: 'By calculation a part will not stand what is claimed for it.',
    checks: ['parts-pressure'],
  },
  {
    id: 'gas-leak',
    verdict: 'do-not-steam',
    title: 'A gas leak could not be made good',
    why: 'Gas gathers low and waits for a flame.',
    checks: ['gas-tightness'],
  },
  {
    id: 'carbon-monoxide',
    verdict: 'do-not-steam',
    title: 'Carbon monoxide at the operator is at or above the short-term limit',
    why: 'It cannot be smelt, and it kills.',
    checks: ['carbon-monoxide'],
  },
  {
    id: 'safety-critical-attention',
    verdict: 'repair-before-steaming',
    title: 'A safety-critical item needs attention',
    why: 'It can be put right, and must be first.',
    checks: [],
  },
  {
    id: 'fitting-missing',
    verdict: 'repair-before-steaming',
    title: 'A fitting that the fireman needs is missing',
    why: 'Pressure, water level and feed cannot be guessed.',
    checks: [],
  },
  {
    id: 'check-failed',
    verdict: 'repair-before-steaming',
    title: 'An engineering check fails that can be put right',
    why: 'The figures say that something is wrong or missing.',
    checks: [
      'gauge-range',
      'gauge-error',
      'valve-capacity',
      'valve-reseat',
      'water-level',
      'feed-rate',
      'second-feed',
    ],
  },
  {
    id: 'no-hydraulic-test',
    verdict: 'not-proven',
    title: 'There was no valid hydraulic test',
    why: 'Sight alone does not show what a shell will hold.',
    checks: [],
  },
  {
    id: 'no-steam-test',
    verdict: 'not-proven',
    title: 'There was no steam test',
    why: 'Valve, water gauge, feed and flame show their faults only hot.',
    checks: [],
  },
  {
    id: 'thin-evidence',
    verdict: 'not-proven',
    title: 'Evidence over the safety-critical items is under 80 %',
    why: 'Too much of what matters was not examined, or only looked at.',
    checks: [],
  },
  {
    id: 'instrument-out-of-date',
    verdict: 'not-proven',
    title: 'An instrument that mattered was out of calibration',
    why: 'A reading is worth no more than the instrument.',
    checks: [],
  },
] as const satisfies readonly VerdictRule[];
export type RuleId = (typeof verdictRules)[number]['id'];

/** The engineering checks that a rule listens to. */
export type CheckId =
  (typeof verdictRules)[number]['checks'][number] | 'bar-litres' | 'water-reserve' | 'gas-heat';

/** The rule that a defect marked as a stop fires. */
export const ruleOfStop: Record<StopKind, RuleId> = {
  crack: 'crack-bulge-collapse',
  bulge: 'crack-bulge-collapse',
  collapse: 'crack-bulge-collapse',
  'soft-solder': 'soft-solder',
  'gas-leak': 'gas-leak',
  'passage-blocked': 'passage-blocked',
};

/** Whether failing a check means do not steam. */
export const isStopCheck = (id: CheckId): boolean =>
  verdictRules.some(
    (rule) => rule.verdict === 'do-not-steam' && (rule.checks as readonly string[]).includes(id),
  );
