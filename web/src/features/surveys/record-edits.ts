import { gradeRank } from './grade-rank.ts';
import type {
  Finding,
  FoundDefect,
  Grade,
  HydraulicTest,
  Measurement,
  SteamTest,
  SurveyRecord,
} from '#shared/surveys/record.ts';
import type { DefectSpec } from '#shared/surveys/rubric/types.ts';

/** A change to a record; autosave and undo need nothing else. */
export type Edit = (record: SurveyRecord) => SurveyRecord;

const untouched = (criterionId: string): Omit<Finding, 'grade'> => ({
  criterionId,
  ways: [],
  defects: [],
  measurements: [],
  photoIds: [],
  note: '',
  reason: '',
});

export const findingOf = (record: SurveyRecord, criterionId: string): Finding | undefined =>
  record.findings.find((finding) => finding.criterionId === criterionId);

/**
 * Changes one finding. Whatever is recorded of an item that has no grade yet stands as Not examined until it gets one,
 * so that nothing noted is lost by leaving the screen.
 */
export const editFinding =
  (criterionId: string, change: (finding: Finding) => Finding): Edit =>
  (record) => {
    const before = findingOf(record, criterionId);
    if (before === undefined) {
      const after = change({ ...untouched(criterionId), grade: 'notExamined' });
      return { ...record, findings: [...record.findings, after] };
    }
    return {
      ...record,
      findings: record.findings.map((finding) => (finding === before ? change(finding) : finding)),
    };
  };

/** Grades an item. What was recorded of it stays, even where the grade contradicts it: a slip must lose nothing. */
export const setGrade = (criterionId: string, grade: Grade): Edit =>
  editFinding(criterionId, (finding) => ({ ...finding, grade }));

/** Takes off everything that only an examined item can have. */
export const clearExamined = (criterionId: string): Edit =>
  editFinding(criterionId, (finding) => ({ ...finding, ways: [], defects: [], measurements: [] }));

/** Takes an item back to where nothing is said of it. */
export const clearFinding =
  (criterionId: string): Edit =>
  (record) => ({
    ...record,
    findings: record.findings.filter((finding) => finding.criterionId !== criterionId),
  });

const asFound = (code: string): FoundDefect => ({ code, where: '', note: '', remedy: null, allowance: null });

/** Adds a defect or takes it off; adding one marks the grade down to the one it usually calls for, never up. */
export const toggleDefect = (criterionId: string, spec: DefectSpec): Edit =>
  editFinding(criterionId, (finding) => {
    if (finding.defects.some(({ code }) => code === spec.code))
      return { ...finding, defects: finding.defects.filter(({ code }) => code !== spec.code) };
    const grade = gradeRank(finding.grade) < gradeRank(spec.grade) ? spec.grade : finding.grade;
    return { ...finding, grade, defects: [...finding.defects, asFound(spec.code)] };
  });

export const changeDefect = (criterionId: string, code: string, change: Partial<FoundDefect>): Edit =>
  editFinding(criterionId, (finding) => ({
    ...finding,
    defects: finding.defects.map((defect) => (defect.code === code ? { ...defect, ...change } : defect)),
  }));

export const toggleWay = (criterionId: string, wayId: string): Edit =>
  editFinding(criterionId, (finding) => ({
    ...finding,
    ways: finding.ways.includes(wayId) ? finding.ways.filter((id) => id !== wayId) : [...finding.ways, wayId],
  }));

/** Sets the readings of one quantity; other quantities stay as they are. */
export const setReadings = (
  criterionId: string,
  quantity: string,
  values: readonly Measurement['value'][],
): Edit =>
  editFinding(criterionId, (finding) => ({
    ...finding,
    measurements: [
      ...finding.measurements.filter((measured) => measured.quantity !== quantity),
      ...values.map((value) => ({ quantity, value })),
    ],
  }));

export const addPhoto = (criterionId: string, photoId: string): Edit =>
  editFinding(criterionId, (finding) =>
    finding.photoIds.includes(photoId) ? finding : { ...finding, photoIds: [...finding.photoIds, photoId] },
  );

export const removePhoto = (criterionId: string, photoId: string): Edit =>
  editFinding(criterionId, (finding) => ({
    ...finding,
    photoIds: finding.photoIds.filter((id) => id !== photoId),
  }));

export const emptyHydraulic = (wantedPa: number): HydraulicTest => ({
  profileId: 'hobby',
  firstTest: false,
  wantedPa,
  gaugeRemoved: false,
  valveGagged: false,
  filledAndVented: false,
  readings: [],
  holdStartMinute: null,
  holdEndMinute: null,
  leaks: [],
  permanentSetMm: null,
  note: '',
});

export const emptySteam: SteamTest = {
  raisedSteam: false,
  minutesToWorkingPressure: null,
  valveLiftsAtPa: null,
  valveReseatsAtPa: null,
  highestPressurePa: null,
  gaugeBlownThrough: false,
  passagesClear: null,
  feedsDelivered: null,
  evaporationKgPerH: null,
  flameSettled: null,
  gasTight: null,
  coPpmAtOperator: null,
  readings: [],
  note: '',
};

export const changeHydraulic =
  (change: Partial<HydraulicTest>): Edit =>
  (record) =>
    record.hydraulic === null ? record : { ...record, hydraulic: { ...record.hydraulic, ...change } };

export const changeSteam =
  (change: Partial<SteamTest>): Edit =>
  (record) =>
    record.steam === null ? record : { ...record, steam: { ...record.steam, ...change } };
