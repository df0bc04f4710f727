import type { UnitSystem } from '#shared/engineering/quantities.ts';
import type { Report } from '#shared/surveys/contract.ts';
import type { Sheets } from '../../print/sheets.ts';

export interface PrintJob {
  sheets: Sheets;
  report: Report;
  units: UnitSystem;
  /** JPEGs of the report's photographs, by id. */
  images: ReadonlyMap<string, Buffer>;
}
