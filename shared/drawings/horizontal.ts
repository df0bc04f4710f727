import type { BoilerFacts } from '../boilers/boiler.ts';
import { between, clamp, line, rect, solidBetween } from './drawing.ts';
import type { Sheet, Spot } from './drawing.ts';
import { drawFire, drawFittings, drawWater } from './fittings.ts';

const wall = 7;
const middle = 235;
const ground = 432;

interface Shell {
  left: number;
  right: number;
  top: number;
  bottom: number;
  level: number;
}

function shellOf({ dimensions: size, type }: BoilerFacts): Shell {
  const aspect = clamp(size.barrelLengthMm / size.barrelOutsideDiameterMm, 1.2, 3.6);
  const length = type === 'locomotive' ? 260 : 300;
  const height = clamp(length / aspect, 116, 188);
  const left = type === 'locomotive' ? 268 : 210;
  return {
    left,
    right: left + length,
    top: middle - height / 2,
    bottom: middle + height / 2,
    level: middle - height * 0.2,
  };
}

type Openings = readonly (readonly [from: number, to: number])[];

/** Barrel and ends in section; a flue leaves its opening in each end that it passes, a firebox leaves no end at all. */
function drawShell(
  sheet: Sheet,
  { left, right, top, bottom }: Shell,
  openings: { left?: Openings | 'none'; right?: Openings } = {},
): void {
  const end = (x: number, gaps: Openings): string[] =>
    solidBetween(top + wall, bottom - wall, gaps).map(([from, to]) => rect(x, from, wall, to - from));
  sheet.add('centre', line([left - 40, middle], [right + 60, middle]));
  sheet.add(
    'cut',
    rect(left, top, right - left, wall),
    rect(left, bottom - wall, right - left, wall),
    ...(openings.left === 'none' ? [] : end(left, openings.left ?? [])),
    ...end(right - wall, openings.right ?? []),
  );
  sheet.point('shell.barrel', left + (right - left) * 0.72, bottom - 3);
  sheet.point('shell.plates', right - 3, top + 22);
  sheet.point('shell.joints', left + 6, bottom - 5);
  sheet.point('shell.waterside', left + (right - left) * 0.62, bottom - wall - 5);
}

const chimneyAt = (sheet: Sheet, x: number, y: number, half = 15): void => {
  sheet.add(
    'outline',
    line([x - half - 6, y], [x - half, y - 16], [x - half, y - 84]),
    line([x + half + 6, y], [x + half, y - 16], [x + half, y - 84]),
    rect(x - half - 5, y - 90, 2 * half + 10, 6),
  );
  sheet.point('firing.draught', x + half, y - 56);
};

/** Feet that carry the shell to the bench. */
function drawFeet(sheet: Sheet, { left, right, bottom }: Shell): void {
  for (const x of [left + 40, right - 92])
    sheet.add('outline', line([x - 18, bottom], [x - 26, ground], [x + 26, ground], [x + 18, bottom]));
  sheet.add('thin', line([60, ground], [640, ground]));
  sheet.point('casing.mount', right - 92, (bottom + ground) / 2);
  sheet.point('casing.fixings', left + 24, ground - 6);
}

function drawLagging(sheet: Sheet, facts: BoilerFacts, { left, right, top, bottom }: Shell): void {
  if (!facts.fittings.includes('lagging')) return;
  sheet.add(
    'thin',
    line([left + 8, top - 6], [right - 8, top - 6]),
    line([left + 8, bottom + 6], [right - 8, bottom + 6]),
    ...between(left, right, 4).flatMap((x) => [
      line([x, top - 9], [x, top]),
      line([x, bottom], [x, bottom + 9]),
    ]),
  );
  sheet.point('casing.lagging', left + (right - left) * 0.86, top - 6);
}

const mountsOn = (shell: Shell, more: { glass: Spot; glassSide: -1 | 1 }) => ({
  safetyValve: [shell.left + (shell.right - shell.left) * 0.62, shell.top] as const,
  gauge: [shell.left + 84, shell.top - 22] as const,
  gaugeSide: -1 as const,
  gaugeStem: 22,
  stop: [shell.left + (shell.right - shell.left) * 0.42, shell.top - 14] as const,
  stopSide: 1 as const,
  check: [shell.right, middle + 20] as const,
  checkSide: 1 as const,
  blowdown: [shell.left + 12, shell.bottom + 14] as const,
  blowdownSide: -1 as const,
  ground,
  feedX: 456,
  fuelX: 78,
  ...more,
});

/** A stayed firebox behind, tubes through the barrel, a smokebox before. */
export function drawLocomotive(sheet: Sheet, facts: BoilerFacts): void {
  const shell = shellOf(facts);
  const { left, right, top, bottom } = shell;
  const shown = clamp(Math.round(Math.sqrt(facts.dimensions.tubeCount ?? 14)), 3, 6);
  const tubes = between(top + 30, bottom - wall - 4, shown);
  drawShell(sheet, shell, { left: 'none', right: tubes.map((y) => [y - 4, y + 4] as const) });
  const [boxLeft, boxTop, boxBottom] = [left - 96, top - 12, bottom + 74];
  const [inLeft, inRight, inTop] = [boxLeft + 22, left - 22, top + 26];
  const doorY = inTop + (boxBottom - inTop) * 0.45;
  sheet.add(
    'cut',
    rect(boxLeft, boxTop, 96, wall),
    ...solidBetween(boxTop + wall, boxBottom, [[doorY - 11, doorY + 11]]).map(([from, to]) =>
      rect(boxLeft, from, wall, to - from),
    ),
    rect(left - wall, boxTop + wall, wall, top - boxTop),
    rect(left - wall, bottom - wall, wall, boxBottom - bottom + wall),
  );
  sheet.add(
    'cut',
    ...solidBetween(inTop + 5, boxBottom, [[doorY - 11, doorY + 11]]).map(([from, to]) =>
      rect(inLeft, from, 5, to - from),
    ),
    ...solidBetween(
      inTop + 5,
      boxBottom,
      tubes.map((y) => [y - 4, y + 4] as const),
    ).map(([from, to]) => rect(inRight - 5, from, 5, to - from)),
    rect(boxLeft + wall, doorY - 15, inLeft - boxLeft - wall + 5, 4),
    rect(boxLeft + wall, doorY + 11, inLeft - boxLeft - wall + 5, 4),
    rect(inLeft, inTop, inRight - inLeft, 5),
  );
  sheet.add(
    'cut',
    rect(boxLeft, boxBottom - 6, inLeft - boxLeft, 6),
    rect(inRight, boxBottom - 6, left - inRight, 6),
  );
  sheet.add(
    'thin',
    ...between(inTop + 4, boxBottom - 8, 7)
      .filter((y) => Math.abs(y - doorY) > 17)
      .map((y) => line([boxLeft, y], [inLeft + 5, y])),
    ...between(bottom, boxBottom - 8, 3).map((y) => line([inRight - 5, y], [left, y])),
    ...between(inLeft, inRight, 3).map((x) => line([x, boxTop], [x, inTop])),
  );
  sheet.point('shell.stays', (boxLeft + inLeft) / 2 + 3, between(inTop + 4, boxBottom - 8, 7)[0] ?? inTop);
  sheet.point('shell.flue', inLeft + 30, inTop + 3);
  sheet.point('shell.fireside', inRight - 12, inTop + 40);
  for (const y of tubes) {
    sheet.add(
      'outline',
      line([inRight - 5, y - 4], [right, y - 4]),
      line([inRight - 5, y + 4], [right, y + 4]),
    );
  }
  sheet.point('shell.tubes', left + 60, tubes[0] ?? middle);
  sheet.add('outline', rect(right, top, 62, bottom - top), rect(right + 62, top + 14, 6, bottom - top - 28));
  chimneyAt(sheet, right + 32, top);
  drawWater(sheet, top + 15, [[boxLeft + wall + 4, right - wall]]);
  drawFire(sheet, facts, inLeft + 8, boxBottom - 14, inRight - inLeft - 16);
  drawFeet(sheet, { ...shell, left: left + 30 });
  drawLagging(sheet, facts, shell);
  drawFittings(
    sheet,
    facts,
    {
      ...mountsOn(shell, { glass: [boxLeft, top + 34], glassSide: -1 }),
      gauge: [boxLeft + 70, boxTop - 22],
      check: [right - 60, bottom + 14],
      checkSide: 1,
      blowdown: [boxLeft, boxBottom - 16],
      fuelX: 66,
      feedX: 478,
    },
    [inLeft + 8, boxBottom - 10],
  );
}

/** A furnace flue low down and tubes back above it. */
export function drawReturnFlue(sheet: Sheet, facts: BoilerFacts): void {
  const shell = shellOf(facts);
  const { left, right, top, bottom } = shell;
  const height = bottom - top;
  const level = top + height * 0.24;
  const flueBottom = bottom - 20;
  const flueTop = flueBottom - height * 0.32;
  const back = right - 52;
  const tubes = between(level + 6, flueTop, clamp(Math.floor((flueTop - level - 6) / 15), 2, 4));
  const chamberTop = level + 3;
  drawShell(sheet, shell, {
    left: [...tubes.map((y) => [y - 3.5, y + 3.5] as const), [flueTop, flueBottom + 5]],
  });
  sheet.add(
    'cut',
    rect(left, flueTop, back - left, 5),
    rect(left, flueBottom, back + 34 - left, 5),
    ...solidBetween(
      chamberTop + 5,
      flueTop + 5,
      tubes.map((y) => [y - 3.5, y + 3.5] as const),
    ).map(([from, to]) => rect(back, from, 5, to - from)),
    rect(back + 29, chamberTop + 5, 5, flueBottom - chamberTop - 5),
    rect(back, chamberTop, 34, 5),
  );
  sheet.point('shell.flue', left + 120, flueTop + 2);
  sheet.point('shell.fireside', back + 16, flueBottom - 14);
  for (const y of tubes)
    sheet.add(
      'outline',
      line([left, y - 3.5], [back + 5, y - 3.5]),
      line([left, y + 3.5], [back + 5, y + 3.5]),
    );
  sheet.point('shell.tubes', left + 200, tubes[1] ?? middle);
  for (const y of [top + 14, top + 22]) {
    sheet.add('thin', line([left - 5, y], [right + 5, y]));
    for (const x of [left - 5, right + 1]) sheet.add('outline', rect(x, y - 4, 4, 8));
  }
  sheet.point('shell.stays', right + 3, top + 22);
  sheet.add(
    'outline',
    line([left, level + 6], [left - 44, level + 6], [left - 44, flueTop - 2], [left, flueTop - 2]),
  );
  chimneyAt(sheet, left - 24, level + 6, 13);
  drawWater(sheet, level, [[left + 50, right - wall - 4]]);
  drawFire(sheet, facts, left + 16, flueBottom - 12, 100);
  drawFeet(sheet, shell);
  drawLagging(sheet, facts, shell);
  drawFittings(
    sheet,
    facts,
    {
      ...mountsOn(shell, { glass: [right, level + 6], glassSide: 1 }),
      check: [left + 190, bottom + 14],
      checkSide: 1,
    },
    [left, flueBottom - 6],
  );
}

/** One flue from end to end, crossed by water tubes. */
export function drawCentreFlue(sheet: Sheet, facts: BoilerFacts): void {
  const shell = shellOf(facts);
  const { left, right, top, bottom } = shell;
  const { flueDiameterMm, barrelOutsideDiameterMm } = facts.dimensions;
  const flue =
    clamp((flueDiameterMm ?? barrelOutsideDiameterMm * 0.4) / barrelOutsideDiameterMm, 0.28, 0.52) *
    (bottom - top);
  const [flueTop, flueBottom] = [middle + 8 - flue / 2, middle + 8 + flue / 2];
  const through = [[flueTop - 5, flueBottom + 5]] as const;
  drawShell(sheet, shell, { left: through, right: through });
  sheet.add('cut', rect(left, flueTop - 5, right - left, 5), rect(left, flueBottom, right - left, 5));
  sheet.point('shell.flue', left + 150, flueTop - 3);
  sheet.point('shell.fireside', right - 70, flueBottom - 5);
  for (const [index, x] of between(left + 90, right - 20, 5).entries()) {
    const lean = index % 2 === 0 ? 7 : -7;
    sheet.add(
      'outline',
      line([x - 4 - lean, flueTop], [x - 4 + lean, flueBottom]),
      line([x + 4 - lean, flueTop], [x + 4 + lean, flueBottom]),
    );
  }
  sheet.point('shell.tubes', between(left + 90, right - 20, 5)[2] ?? middle, middle + 8);
  sheet.add('outline', rect(right, flueTop - 8, 52, flue + 16));
  chimneyAt(sheet, right + 26, flueTop - 8, 14);
  drawWater(sheet, top + 22, [[left + 50, right - wall - 4]]);
  drawFire(sheet, facts, left + 12, flueBottom - 12, 76);
  drawFeet(sheet, shell);
  drawLagging(sheet, facts, shell);
  drawFittings(
    sheet,
    facts,
    {
      ...mountsOn(shell, { glass: [left, top + 28], glassSide: -1 }),
      check: [left + 200, bottom + 14],
      checkSide: 1,
    },
    [left + 12, flueBottom - 7],
  );
}

/** A plain drum over a flame. */
export function drawPot(sheet: Sheet, facts: BoilerFacts): void {
  const shell = shellOf(facts);
  const { left, right, bottom, level } = shell;
  drawShell(sheet, shell);
  sheet.point('shell.fireside', left + 120, bottom + 2);
  drawWater(sheet, level + 6, [[left + 50, right - wall - 4]]);
  drawFire(sheet, facts, left + 76, ground - 40, right - left - 200);
  drawFeet(sheet, shell);
  drawLagging(sheet, facts, shell);
  drawFittings(
    sheet,
    facts,
    {
      ...mountsOn(shell, { glass: [left, level + 6], glassSide: -1 }),
      blowdown: [right, bottom - 16],
      blowdownSide: 1,
    },
    [left + 76, ground - 35],
  );
}
