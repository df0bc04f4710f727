import type { Report } from './contract.ts';
import { examinedOf } from './examined.ts';
import type { Examined } from './examined.ts';
import type { AllowanceLine } from './result.ts';

export const foundGroups = {
  must: 'Must be put right before steaming',
  should: 'Should be put right',
  looks: 'For looks',
  well: 'Found well',
  notExamined: 'Not examined',
  notFitted: 'Not fitted',
} as const;
export type FoundGroup = keyof typeof foundGroups;

/** One item as the report shows it: the finding, and what its defects would cost to put right. */
export interface Found extends Examined {
  lines: AllowanceLine[];
}

function groupOf({ criterion, finding }: Examined, inGroups: ReadonlySet<string>): FoundGroup {
  if (finding.grade === 'notExamined' || finding.grade === 'notFitted') return finding.grade;
  if (inGroups.has('must')) return 'must';
  const isBad = finding.grade === 'attention' || finding.grade === 'unfit';
  if (isBad && criterion.safetyCritical) return 'must';
  if (inGroups.has('should') || (isBad && !inGroups.has('looks'))) return 'should';
  return inGroups.has('looks') ? 'looks' : 'well';
}

/** Every item that applies, under the most pressing of what its defects call for, in the order of examination. */
export function groupFound(report: Pick<Report, 'facts' | 'record' | 'result'>): Map<FoundGroup, Found[]> {
  const groups = new Map<FoundGroup, Found[]>(
    (Object.keys(foundGroups) as FoundGroup[]).map((id) => [id, []]),
  );
  const { allowance } = report.result;
  for (const item of examinedOf(report)) {
    const own = allowance.groups.map(({ id, lines }) => ({
      id,
      lines: lines.filter(({ criterionId }) => criterionId === item.criterion.id),
    }));
    const inGroups = new Set<string>(own.filter(({ lines }) => lines.length > 0).map(({ id }) => id));
    groups.get(groupOf(item, inGroups))?.push({ ...item, lines: own.flatMap(({ lines }) => lines) });
  }
  return groups;
}
