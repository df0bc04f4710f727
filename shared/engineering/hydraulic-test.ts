/** Multiples of the working pressure; the local code governs. */
export const testMultiplesPercent = {
  /** First test of a bare shell, no trusted history, or after structural repair. */
  first: 200,
  /** A repeat, with papers. */
  repeat: 150,
} as const;

/** Test pressure wanted, Pa gauge (UK Boiler Test Code 2012, para 14.3, as quoted: 2 × and 1.5 ×). */
export const wantedTestPa = (workingPa: number, kind: keyof typeof testMultiplesPercent): number =>
  (workingPa * testMultiplesPercent[kind]) / 100;

/** Full scale a test gauge may have: 1.5 to 4 times the test pressure (ASME VIII-1 UG-102). */
export const gaugeWindowPa = (testPa: number): { least: number; most: number } => ({
  least: (testPa * 15) / 10,
  most: testPa * 4,
});

/** Whether the boiler's own gauge must come off before a test to this pressure. */
export const mustGaugeComeOff = (testPa: number, fullScalePa: number): boolean => testPa > fullScalePa;
