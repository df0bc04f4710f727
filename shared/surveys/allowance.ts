import type { BoilerFacts, MaterialId } from '../boilers/boiler.ts';
import { compareCanonical } from './canonical.ts';
import { examinedOf } from './examined.ts';
import type { Examined } from './examined.ts';
import { limits } from './limits.ts';
import type { AllowanceOverride, FoundDefect, SurveyRecord } from './record.ts';
import { allowanceGroups } from './result.ts';
import type { Allowance, AllowanceGroup, AllowanceGroupId, AllowanceLine } from './result.ts';
import { defectOf } from './rubric/index.ts';
import type { DefectSpec, MaterialClass } from './rubric/types.ts';

/** The stock a repair to this metal is priced by. */
export const materialClassOf: Record<MaterialId, MaterialClass> = {
  copper: 'copper',
  'copper-brass': 'copper',
  brass: 'brass',
  steel: 'steel',
  stainless: 'stainless',
};

/** The catalogue's band for a defect on a boiler of this metal. */
export function bandOf(spec: DefectSpec, material: MaterialId): AllowanceOverride {
  const stock = spec.allowance.parts[materialClassOf[material]];
  return {
    hoursLow: spec.allowance.hoursLow,
    hoursHigh: spec.allowance.hoursHigh,
    partsLowMinor: stock.lowMinor,
    partsHighMinor: stock.highMinor,
  };
}

/** Labour in whole pence, halves up; hours are taken to the hundredth first so that no binary fraction matters. */
export const labourMinor = (hours: number, rateMinorPerHour: number): number =>
  Math.floor((Math.round(hours * 100) * rateMinorPerHour + 50) / 100);

const groupOf = (item: Examined, spec: DefectSpec): AllowanceGroupId => {
  if (spec.consequence === 'danger' || spec.stop !== null) return 'must';
  if (spec.consequence === 'appearance') return 'looks';
  const isBad = item.finding.grade === 'attention' || item.finding.grade === 'unfit';
  return item.criterion.safetyCritical && isBad ? 'must' : 'should';
};

const nothing: AllowanceOverride = { hoursLow: 0, hoursHigh: 0, partsLowMinor: 0, partsHighMinor: 0 };

interface Priced {
  group: AllowanceGroupId;
  line: AllowanceLine;
}

function price(
  item: Examined,
  found: FoundDefect,
  spec: DefectSpec,
  facts: BoilerFacts,
  rate: number,
): Priced {
  const remedy = found.remedy ?? spec.remedy;
  // Where the surveyor says to leave alone what the catalogue would mend, there is nothing to pay.
  const isLeft = remedy !== spec.remedy && (remedy === 'none' || remedy === 'watch');
  const band = found.allowance ?? (isLeft ? nothing : bandOf(spec, facts.material));
  return {
    group: groupOf(item, spec),
    line: {
      criterionId: item.criterion.id,
      defectCode: spec.code,
      label: spec.label,
      where: found.where,
      remedy,
      isOverridden: found.allowance !== null,
      ...band,
      lowMinor: labourMinor(band.hoursLow, rate) + band.partsLowMinor,
      highMinor: labourMinor(band.hoursHigh, rate) + band.partsHighMinor,
    },
  };
}

type MinorKey = 'partsLowMinor' | 'partsHighMinor' | 'lowMinor' | 'highMinor';
const sum = (lines: readonly AllowanceLine[], of: MinorKey) => lines.reduce((all, line) => all + line[of], 0);
/** Hours add up to the hundredth, in whole hundredths. */
const sumHours = (lines: readonly AllowanceLine[], of: 'hoursLow' | 'hoursHigh') =>
  lines.reduce((all, line) => all + Math.round(line[of] * 100), 0) / 100;

function groupWith(id: AllowanceGroupId, priced: readonly Priced[]): AllowanceGroup {
  const lines = priced.filter((each) => each.group === id).map((each) => each.line);
  return {
    id,
    label: allowanceGroups[id],
    hoursLow: sumHours(lines, 'hoursLow'),
    hoursHigh: sumHours(lines, 'hoursHigh'),
    partsLowMinor: sum(lines, 'partsLowMinor'),
    partsHighMinor: sum(lines, 'partsHighMinor'),
    lowMinor: sum(lines, 'lowMinor'),
    highMinor: sum(lines, 'highMinor'),
    lines,
  };
}

/**
 * What it would cost to put right what was found, low and high. The low total is the sum of the lows and the high the
 * sum of the highs: no allowance is made for one job sharing another's work.
 *
 * @param labourMinorPerHour pence an hour at the bench; the platform's published figure unless the reader sets one.
 */
export function allowanceOf(
  facts: BoilerFacts,
  record: SurveyRecord,
  labourMinorPerHour: number = limits.labourMinorPerHour,
): Allowance {
  const priced = examinedOf({ facts, record }).flatMap((item) =>
    item.criterion.defects.flatMap((spec) =>
      item.finding.defects
        .filter((found) => found.code === spec.code)
        .map((found) => price(item, found, spec, facts, labourMinorPerHour))
        .toSorted((a, b) => compareCanonical(a.line, b.line)),
    ),
  );
  const ids = Object.keys(allowanceGroups) as AllowanceGroupId[];
  const groups = ids.map((id) => groupWith(id, priced));
  const isShellRepaired = examinedOf({ facts, record }).some(
    (item) =>
      item.criterion.section === 'shell' &&
      item.finding.defects.some((found) => {
        const spec = defectOf(item.criterion, found.code);
        return spec !== undefined && ['repair', 'replace', 'condemn'].includes(found.remedy ?? spec.remedy);
      }),
  );
  const retestCosts = isShellRepaired
    ? [
        { id: 'hydraulic', label: 'Hydraulic test after repair', minor: limits.hydraulicRetestMinor },
        { id: 'steam', label: 'Steam test after repair', minor: limits.steamRetestMinor },
      ]
    : [];
  const retest = retestCosts.reduce((all, cost) => all + cost.minor, 0);
  return {
    currency: 'GBP',
    labourMinorPerHour,
    groups,
    retestCosts,
    total: {
      lowMinor: groups.reduce((all, group) => all + group.lowMinor, retest),
      highMinor: groups.reduce((all, group) => all + group.highMinor, retest),
    },
  };
}
