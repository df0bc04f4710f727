import { monthsLater } from '../time.ts';
import { limits } from './limits.ts';
import type { Instrument, InstrumentKind, SurveyRecord } from './record.ts';

/** Whether an instrument was in calibration on the day of examination. Unknown dates count as out of date. */
export const isInDate = (instrument: Instrument, examinedOn: string | null): boolean =>
  examinedOn !== null &&
  instrument.calibratedOn !== null &&
  instrument.calibratedOn <= examinedOn &&
  examinedOn <= monthsLater(instrument.calibratedOn, limits.calibrationMonths);

export const instrumentsOf = (record: SurveyRecord, kind: InstrumentKind): Instrument[] =>
  record.instruments.filter((instrument) => instrument.kind === kind);

/** Whether at least one instrument of a kind was named and in calibration. */
export const hasInDate = (record: SurveyRecord, kind: InstrumentKind): boolean =>
  instrumentsOf(record, kind).some((instrument) => isInDate(instrument, record.examinedOn));

/** The instruments a record leans on, and what for. */
export function instrumentsThatMatter(record: SurveyRecord): { kind: InstrumentKind; usedFor: string }[] {
  const needed: { kind: InstrumentKind; usedFor: string }[] = [];
  if (record.hydraulic !== null) needed.push({ kind: 'test-gauge', usedFor: 'the hydraulic test' });
  else if (record.steam !== null) needed.push({ kind: 'test-gauge', usedFor: 'the steam test' });
  if (record.steam !== null && record.steam.coPpmAtOperator !== null)
    needed.push({ kind: 'co-meter', usedFor: 'carbon monoxide at the operator' });
  const measuredWall = record.findings.some((finding) =>
    finding.measurements.some((measured) => measured.quantity === 'thinnestMm'),
  );
  // A wall may also be read with a micrometer at an open edge, which needs no velocity set.
  if (measuredWall && instrumentsOf(record, 'thickness-meter').length > 0)
    needed.push({ kind: 'thickness-meter', usedFor: 'wall thickness' });
  return needed;
}
