import { describe, expect, it } from 'vitest';
import { boilerTypeIds, boilerTypes } from '#shared/boilers/boiler-types.ts';
import { Problem } from '#shared/problem.ts';
import { differencesBetween, methodData, methodDataSchema } from '#shared/surveys/method.ts';
import {
  criteriaFor,
  criteriaOf,
  currentRubric,
  rubricOf,
  rubricVersion,
  rubricVersions,
} from '#shared/surveys/rubric/index.ts';
import { rubric as rubricSchema } from '#shared/surveys/rubric/types.ts';
import { verdictRules } from '#shared/surveys/verdict-rules.ts';

const criteria = criteriaOf(currentRubric);
const idsFor = (facts: Parameters<typeof criteriaFor>[0]) => criteriaFor(facts).map(({ id }) => id);

describe('the rubric', () => {
  it('is what its schema says', () => {
    for (const version of rubricVersions) expect(() => rubricSchema.parse(version)).not.toThrow();
  });

  it('weighs 100, section by section as published', () => {
    const sums = currentRubric.sections.map((section) => [
      section.id,
      section.criteria.reduce((sum, criterion) => sum + criterion.weight, 0),
    ]);
    expect(Object.fromEntries(sums)).toEqual({
      identity: 8,
      shell: 34,
      safety: 24,
      feed: 14,
      firing: 12,
      casing: 8,
    });
  });

  it('numbers its criteria 1 to 34 in order, each id once', () => {
    expect(criteria.map(({ number }) => number)).toEqual(Array.from({ length: 34 }, (_, index) => index + 1));
    expect(new Set(criteria.map(({ id }) => id)).size).toBe(34);
  });

  it('marks the safety-critical criteria', () => {
    expect(criteria.filter(({ safetyCritical }) => safetyCritical).map(({ id }) => id)).toEqual([
      'shell.barrel',
      'shell.plates',
      'shell.flue',
      'shell.tubes',
      'shell.stays',
      'shell.joints',
      'shell.bushes',
      'safety.valve',
      'safety.capacity',
      'safety.gauge',
      'safety.glass',
      'feed.check',
      'feed.first',
      'firing.fuel',
      'firing.flame',
      'firing.draught',
    ]);
  });

  it.each(criteria.map((criterion) => [criterion.id, criterion] as const))(
    '%s is complete',
    (id, criterion) => {
      expect(criterion.lookFor.line.length).toBeGreaterThan(20);
      expect(criterion.photosWanted.length).toBeGreaterThan(0);
      expect(criterion.defects.length).toBeGreaterThanOrEqual(5);
      expect(criterion.defects.length).toBeLessThanOrEqual(10);
      const strengths = criterion.ways.map(({ strength }) => strength);
      expect(strengths).toEqual(strengths.toSorted((a, b) => a - b));
      expect(strengths.at(-1)).toBe(1);
      const short = id.split('.')[1]!;
      for (const defect of criterion.defects) {
        expect(defect.code.startsWith(`${short}-`)).toBe(true);
        expect(defect.allowance.hoursLow).toBeLessThanOrEqual(defect.allowance.hoursHigh);
        for (const band of Object.values(defect.allowance.parts))
          expect(band.lowMinor).toBeLessThanOrEqual(band.highMinor);
      }
    },
  );

  it('has each defect code once', () => {
    const codes = criteria.flatMap(({ defects }) => defects.map(({ code }) => code));
    expect(new Set(codes).size).toBe(codes.length);
    expect(codes.length).toBeGreaterThan(180);
  });

  it('gives a line of its own to every type of boiler', () => {
    const spokenOf = (type: (typeof boilerTypeIds)[number]) =>
      criteria.some(({ lookFor }) => lookFor.byType[type] !== undefined);
    expect(boilerTypeIds.filter((type) => !spokenOf(type))).toEqual([]);
  });

  it('has a stop defect of every kind', () => {
    const kinds = criteria.flatMap(({ defects }) => defects.flatMap(({ stop }) => stop ?? []));
    expect(new Set(kinds)).toEqual(
      new Set(['crack', 'bulge', 'collapse', 'soft-solder', 'gas-leak', 'passage-blocked']),
    );
  });

  it('grades every stop defect Unfit, and a danger', () => {
    const stops = criteria.flatMap(({ defects }) => defects.filter(({ stop }) => stop !== null));
    expect(stops.filter((each) => each.grade !== 'unfit' || each.consequence !== 'danger')).toEqual([]);
  });

  it('never says safe or certified', () => {
    const text = JSON.stringify(methodData());
    expect(text).not.toMatch(/\bis safe\b|\bcertif(y|ied)\b|!/i);
  });

  it('refuses a version that was never published', () => {
    expect(() => rubricOf('0.9.0')).toThrow(Problem);
  });
});

describe('which criteria apply', () => {
  it('leaves flue, tubes, stays and feed off a pot boiler', () => {
    const ids = idsFor({ type: 'pot', fittings: ['safety-valve'], firing: 'spirit' });
    for (const id of ['shell.flue', 'shell.tubes', 'shell.stays', 'feed.check', 'feed.first', 'feed.second'])
      expect(ids).not.toContain(id);
    expect(ids).toContain('firing.fuel');
  });

  it('brings the feed in where a pump is fitted', () => {
    expect(idsFor({ type: 'pot', fittings: ['hand-pump'], firing: 'spirit' })).toContain('feed.first');
  });

  it('examines stays only on types that have them', () => {
    const withStays = boilerTypeIds.filter((type) =>
      (boilerTypes[type].traits as readonly string[]).includes('stays'),
    );
    expect(
      boilerTypeIds.filter((type) => idsFor({ type, fittings: [], firing: 'coal' }).includes('shell.stays')),
    ).toEqual(withStays);
  });

  it('leaves flame and fuel off an electric boiler, and all firing off one that comes with none', () => {
    const electric = idsFor({ type: 'pot', fittings: [], firing: 'electric' });
    expect(electric.filter((id) => id.startsWith('firing.'))).toEqual(['firing.burner']);
    expect(electric).not.toContain('shell.fireside');
    const none = idsFor({ type: 'locomotive', fittings: [], firing: 'none' });
    expect(none.filter((id) => id.startsWith('firing.'))).toEqual([]);
  });

  it('asks a coal fire for no gas container', () => {
    expect(idsFor({ type: 'locomotive', fittings: [], firing: 'coal' })).not.toContain('firing.fuel');
  });
});

describe('the published method', () => {
  it('is what its schema says, and survives JSON', () => {
    const data = methodData();
    expect(methodDataSchema.parse(JSON.parse(JSON.stringify(data)))).toEqual(data);
    expect(data.current).toBe(rubricVersion);
    expect(data.verdictRules.map(({ id }) => id)).toEqual(verdictRules.map(({ id }) => id));
  });

  it('tries the rules from the worst verdict to the best', () => {
    const order = ['do-not-steam', 'repair-before-steaming', 'not-proven'];
    const places = verdictRules.map(({ verdict }) => order.indexOf(verdict));
    expect(places).toEqual(places.toSorted((a, b) => a - b));
  });

  it('says what differs between two versions', () => {
    const next = structuredClone(currentRubric);
    next.version = '2.0.0';
    next.sections[0]!.criteria[0]!.weight = 2;
    next.sections[1]!.criteria[7]!.safetyCritical = true;
    const [gone] = next.sections[5]!.criteria.splice(3, 1);
    expect(
      differencesBetween(currentRubric, next).map(({ criterionId, what }) => [criterionId, what]),
    ).toEqual([
      ['identity.mark', 'weight'],
      ['shell.waterside', 'safety-critical'],
      [gone!.id, 'removed'],
    ]);
    expect(differencesBetween(currentRubric, currentRubric)).toEqual([]);
  });
});
