import {
  airEnergy,
  gaugeWindow,
  mustGaugeComeOff,
  testPressure,
  waterEnergy,
} from '../../engineering/hydraulic-test.ts';
import { multipleOf, testProfileOf, testProfiles } from '../../engineering/test-profiles.ts';
import { paPerBar } from '../../engineering/units.ts';
import { work } from '../../engineering/working.ts';
import type { Line } from '../../engineering/working.ts';
import { pressureText, trim } from '../../surveys/words.ts';
import { calculator, resultsOf, steps } from '../calculator.ts';
import { choice, figure, labelsOf, unknownFigure } from '../field.ts';
import { gaugeRange, workingPressure } from '../ranges.ts';

const fallOf = (startPa: number, endPa: number): Line =>
  work({
    result: ['f', 'Fall over the hold', 'percent'],
    formula: '100·({P_1} − {P_2}) / {P_1}',
    terms: {
      P_1: ['At the start of the hold', 'pressure', startPa],
      P_2: ['At the end', 'pressure', endPa],
    },
    compute: ({ P_1, P_2 }) => (100 * (P_1 - P_2)) / P_1,
    source: 'test-profile',
    holds: 'Read on one gauge, water at one temperature',
    units: 'metric',
  });

/** The cold water test: what pressure, what gauge, and what a hold shows. */
export const hydraulicTestCalculator = calculator({
  id: 'hydraulic-test',
  title: 'The hydraulic test',
  about: 'Test pressure by the profile you pick, the gauge to use, and whether a hold was good.',
  group: 'tests',
  caution:
    'Water only, never compressed air. Fill and let out all the air. Take off a gauge the pressure would exceed, and gag or blank the safety valve. Follow your local code and your boiler inspector.',
  fields: {
    workingPa: workingPressure(),
    profile: choice('Tested to', labelsOf(testProfiles), 'hobby'),
    kind: choice(
      'Which test',
      { repeat: 'Repeat, with papers', first: 'First, or after a repair to the shell' },
      'repeat',
    ),
    volumeL: figure('Volume of the boiler', 'volume', [0.02, 500], 1),
    ownGaugePa: unknownFigure('Full scale of the boiler’s own gauge', 'pressure', gaugeRange, 6 * paPerBar),
    testGaugePa: unknownFigure('Full scale of the test gauge', 'pressure', gaugeRange, 16 * paPerBar),
    startPa: unknownFigure('At the start of the hold', 'pressure', gaugeRange, null, {
      part: 'A hold you have read',
    }),
    endPa: unknownFigure('At the end of the hold', 'pressure', [0, 100 * paPerBar], null, {
      part: 'A hold you have read',
    }),
    minutes: unknownFigure('Held for', 'minutes', [0, 600], null, { part: 'A hold you have read' }),
  },
  check: ({ startPa, endPa }) =>
    startPa !== null && endPa !== null && endPa > startPa * 1.06
      ? [
          {
            field: 'endPa',
            message: 'Pressure cannot rise over a hold unless the water warmed: wait and read again',
          },
        ]
      : [],
  work: ({ workingPa, profile: id, kind, volumeL, ownGaugePa, testGaugePa, startPa, endPa, minutes }) => {
    const profile = testProfileOf(id);
    const wanted = testPressure(workingPa, multipleOf(profile, kind === 'first'));
    const testPa = wanted.result.value;
    const window = gaugeWindow(testPa);
    const air = airEnergy(testPa, volumeL);
    const water = waterEnergy(testPa, volumeL);
    const fall = startPa === null || endPa === null ? null : fallOf(startPa, endPa);
    const says = [
      `Raise it to ${pressureText(testPa)} and hold it ${String(profile.holdMinutes)} minutes; it may fall at most ${String(profile.fallPercent)} %. ${profile.source}. The local code governs.`,
      ...(ownGaugePa === null
        ? []
        : [
            mustGaugeComeOff(testPa, ownGaugePa)
              ? `Take the boiler’s own gauge off: the test goes beyond its ${pressureText(ownGaugePa)}.`
              : `The boiler’s own gauge reaches ${pressureText(ownGaugePa)}: it may stay on.`,
          ]),
      ...(testGaugePa === null
        ? []
        : [
            testGaugePa >= window.least.result.value && testGaugePa <= window.most.result.value
              ? `A test gauge to ${pressureText(testGaugePa)} suits.`
              : `A test gauge to ${pressureText(testGaugePa)} does not suit: use one between ${pressureText(window.least.result.value)} and ${pressureText(window.most.result.value)}.`,
          ]),
      ...(fall === null || startPa === null
        ? []
        : [holdSays({ fallPercent: fall.result.value, startPa, minutes, testPa, profile })]),
      `Filled with air instead, it would hold ${trim(air.result.value / Math.max(water.result.value, 1e-9), 0)} times the energy.`,
    ];
    return {
      answers: resultsOf(wanted, window.least, window.most, ...(fall === null ? [] : [fall])),
      says,
      steps: [
        steps('Pressure', wanted),
        steps('Gauge', window.least, window.most),
        ...(fall === null ? [] : [steps('Hold', fall)]),
        steps('Why water', water, air),
      ],
    };
  },
});

function holdSays(of: {
  fallPercent: number;
  startPa: number;
  minutes: number | null;
  testPa: number;
  profile: { holdMinutes: number; fallPercent: number };
}): string {
  const { fallPercent, startPa, minutes, testPa, profile } = of;
  if (startPa < testPa)
    return `The hold began at ${pressureText(startPa)}, under the ${pressureText(testPa)} wanted.`;
  if (startPa > testPa * 1.06)
    return `It was taken to ${pressureText(startPa)}, beyond the ${pressureText(testPa)} wanted and the 6 % allowed over.`;
  if (minutes === null) return 'Give how long it was held.';
  if (minutes < profile.holdMinutes)
    return `Held ${trim(minutes, 1)} minutes; ${String(profile.holdMinutes)} are asked for.`;
  return fallPercent > profile.fallPercent
    ? `It fell ${trim(fallPercent, 1)} %, more than the ${String(profile.fallPercent)} % allowed: find where, make it good, and try again.`
    : `It fell ${trim(Math.max(0, fallPercent), 1)} % in ${trim(minutes, 1)} minutes: within what is allowed. Look for wet all over before you let it down.`;
}
