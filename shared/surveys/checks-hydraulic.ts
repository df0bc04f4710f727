import { gaugeWindowPa, wantedTestPa } from '../engineering/hydraulic-test.ts';
import { multipleOf, testProfileOf } from '../engineering/test-profiles.ts';
import type { BoilerFacts } from '../boilers/boiler.ts';
import { check, figure, isAbove } from './check.ts';
import type { SurveyInput } from './examined.ts';
import { instrumentsOf } from './instruments.ts';
import { limits } from './limits.ts';
import { leakClasses, leakPlaces } from './record.ts';
import type { HydraulicTest, SurveyRecord } from './record.ts';
import type { EngineeringCheck, Figure } from './result.ts';
import { inSentence, listText, pressureText, trim } from './words.ts';

interface Hold {
  minutes: number;
  startPa: number;
  endPa: number;
  highestPa: number;
}

/** The readings between the marks of the hold; null where it was not marked or not read at both ends. */
function holdOf({ holdStartMinute: start, holdEndMinute: end, readings }: HydraulicTest): Hold | null {
  if (start === null || end === null || end <= start) return null;
  const held = readings
    .filter(({ minute }) => minute >= start && minute <= end)
    .toSorted((a, b) => a.minute - b.minute || a.pressurePa - b.pressurePa);
  const first = held[0];
  const last = held.at(-1);
  if (first === undefined || last === undefined || held.length < 2) return null;
  return {
    minutes: last.minute - first.minute,
    startPa: first.pressurePa,
    endPa: last.pressurePa,
    highestPa: Math.max(...readings.map(({ pressurePa }) => pressurePa)),
  };
}

const leakText = (leaks: HydraulicTest['leaks']): string =>
  listText([
    ...new Set(
      leaks.map(
        ({ place, leakClass }) =>
          `${inSentence(leakClasses[leakClass] ?? 'Leak')} at a ${inSentence(leakPlaces[place])}`,
      ),
    ),
  ]);

/** Leaks that condemn the test: any of the structure, and a bush that could not be made dry. */
const structural = ({ leaks }: HydraulicTest): HydraulicTest['leaks'] =>
  leaks.filter(
    ({ place, leakClass, cured }) => leakClass > 0 && place !== 'gland' && !(place === 'bush' && cured),
  );

const wetGlands = ({ leaks }: HydraulicTest): HydraulicTest['leaks'] =>
  leaks.filter(({ place, leakClass, cured }) => place === 'gland' && leakClass > 0 && !cured);

/** Working pressure times the multiple that the profile picked asks for. */
export const askedPa = (facts: BoilerFacts, test: HydraulicTest): number =>
  wantedTestPa(facts.workingPressurePa, multipleOf(testProfileOf(test.profileId), test.firstTest));

function whyNotValid(facts: BoilerFacts, record: SurveyRecord, test: HydraulicTest): string | null {
  const asked = askedPa(facts, test);
  const hold = holdOf(test);
  const { holdMinutes } = testProfileOf(test.profileId);
  if (isAbove(asked, test.wantedPa))
    return `The test was for ${pressureText(test.wantedPa)}; ${pressureText(asked)} is asked for.`;
  if (hold === null) return 'The hold was not marked and read at both ends.';
  if (isAbove(test.wantedPa, hold.startPa))
    return `The hold began at ${pressureText(hold.startPa)}, under the ${pressureText(test.wantedPa)} wanted.`;
  if (isAbove(hold.highestPa, (test.wantedPa * (100 + limits.testOverPercent)) / 100))
    return `It was taken to ${pressureText(hold.highestPa)}, beyond the ${pressureText(test.wantedPa)} wanted.`;
  if (hold.minutes < holdMinutes)
    return `It was held for ${trim(hold.minutes, 1)} minutes; ${String(holdMinutes)} are asked for.`;
  const glands = wetGlands(test).filter(({ leakClass }) => leakClass > limits.glandLeakClass);
  if (glands.length > 0) return `A gland was not cured (${leakText(glands)}); make it dry and try again.`;
  if (!test.filledAndVented) return 'It is not recorded that the boiler was filled and all air let out.';
  const scales = instrumentsOf(record, 'test-gauge').flatMap(({ fullScalePa }) => fullScalePa ?? []);
  const { least, most } = gaugeWindowPa(test.wantedPa);
  const isInRange = (scale: number) => scale >= least && scale <= most;
  if (scales.length > 0 && !scales.some(isInRange))
    return 'The test gauge’s full scale is not between 1.5 and 4 times the test pressure.';
  return null;
}

/** The hydraulic test as recorded: passed, failed, or not valid as a test. */
export function hydraulicTestCheck({ facts, record }: SurveyInput): EngineeringCheck {
  const make = check('hydraulic-test', 'Hydraulic test', 'shell.barrel');
  const test = record.hydraulic;
  if (test === null) return make.cannotSay('No hydraulic test was made.');
  const hold = holdOf(test);
  const figures: Figure[] = [
    figure('Wanted', test.wantedPa, 'Pa'),
    figure('Claimed working pressure', facts.workingPressurePa, 'Pa'),
    ...(hold === null
      ? []
      : [
          figure('At the start of the hold', hold.startPa, 'Pa'),
          figure('At the end of the hold', hold.endPa, 'Pa'),
          figure('Held for', hold.minutes, 'min'),
        ]),
  ];
  const leaks = structural(test);
  if (leaks.length > 0) return make.fail(`The hydraulic test failed: ${leakText(leaks)}.`, figures);
  if (test.permanentSetMm !== null && test.permanentSetMm > 0)
    return make.fail(
      `The hydraulic test failed: a permanent set of ${trim(test.permanentSetMm, 2)} mm.`,
      figures,
    );
  const isFallen =
    hold !== null &&
    isAbove(hold.startPa - hold.endPa, (hold.startPa * testProfileOf(test.profileId).fallPercent) / 100);
  if (isFallen && wetGlands(test).length === 0)
    return make.fail(
      `The hydraulic test failed: pressure fell from ${pressureText(hold.startPa)} to ${pressureText(hold.endPa)} and no gland accounts for it.`,
      figures,
    );
  const invalid = whyNotValid(facts, record, test);
  if (invalid !== null) return make.cannotSay(`The hydraulic test is not valid. ${invalid}`, figures);
  const glands = wetGlands(test);
  const note = glands.length === 0 ? '' : ` A gland was wet (${leakText(glands)}).`;
  return make.pass(
    `Held ${pressureText(hold?.startPa ?? test.wantedPa)} for ${trim(hold?.minutes ?? 0, 1)} minutes, dry at shell, seams, stays and tubes.${note}`,
    figures,
  );
}
