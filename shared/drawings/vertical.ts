import type { BoilerFacts } from '../boilers/boiler.ts';
import { between, clamp, line, rect, solidBetween } from './drawing.ts';
import type { Sheet } from './drawing.ts';
import { drawFire, drawFittings, drawWater } from './fittings.ts';

const centre = 350;
const top = 128;
const height = 270;
const wall = 7;

/** A vertical boiler in section: fire tubes, a centre flue, or a firebox crossed by water tubes. */
export function drawVertical(sheet: Sheet, facts: BoilerFacts): void {
  const { dimensions: size, type } = facts;
  const aspect = clamp(size.barrelLengthMm / size.barrelOutsideDiameterMm, 1.15, 2.4);
  const width = clamp(height / aspect, 120, 220);
  const [left, right, bottom] = [centre - width / 2, centre + width / 2, top + height];
  const isCross = type === 'vertical-cross-tube';
  const boxWidth = width * 0.72;
  const boxTop = bottom - height * (isCross ? 0.58 : 0.36);
  const [boxLeft, boxRight] = [centre - boxWidth / 2, centre + boxWidth / 2];
  const level = top + height * 0.27;

  sheet.add('centre', line([centre, 30], [centre, bottom + 62]));
  sheet.add(
    'cut',
    rect(left, top, wall, height),
    rect(right - wall, top, wall, height),
    rect(boxLeft, boxTop, 5, bottom - boxTop),
    rect(boxRight - 5, boxTop, 5, bottom - boxTop),
    rect(left + wall, bottom - 7, boxLeft - left - wall, 7),
    rect(boxRight, bottom - 7, right - wall - boxRight, 7),
  );
  sheet.point('shell.barrel', left + 3, top + height * 0.72);
  sheet.point('shell.plates', left + wall + 6, top + 4);
  sheet.point('shell.joints', boxLeft - 6, bottom - 4);
  sheet.point('shell.waterside', left + wall + 6, top + height * 0.5);
  sheet.point('shell.fireside', boxRight - 12, boxTop + 24);

  const { flueWidth, openings } = passages(sheet, facts, { width, boxLeft, boxRight, boxTop });
  sheet.add(
    'cut',
    ...solidBetween(left + wall, right - wall, openings).map(([from, to]) =>
      rect(from, top, to - from, wall),
    ),
    ...solidBetween(boxLeft + 5, boxRight - 5, openings).map(([from, to]) =>
      rect(from, boxTop, to - from, 6),
    ),
  );
  chimney(sheet, flueWidth);
  drawWater(sheet, level, [
    [left + wall, centre - flueWidth / 2 - 4],
    [centre + flueWidth / 2 + 4, right - wall],
  ]);

  // The base, standing on the bench.
  const ground = bottom + 56;
  sheet.add(
    'outline',
    line(
      [left - 6, bottom],
      [left - 12, ground],
      [right + 12, ground],
      [right + 6, bottom],
      [left - 6, bottom],
    ),
  );
  sheet.add(
    'thin',
    line([60, ground], [640, ground]),
    ...between(left - 4, right + 4, 4).map((x) => line([x - 6, ground - 14], [x + 6, ground - 14])),
  );
  sheet.point('casing.mount', right + 8, bottom + 30);
  sheet.point('casing.fixings', left - 8, bottom + 6);
  drawFire(sheet, facts, boxLeft + 12, bottom + 6, boxWidth - 24);
  if (facts.fittings.includes('lagging')) {
    sheet.add(
      'thin',
      line([left - 6, top + 8], [left - 6, bottom - 6]),
      line([right + 6, top + 8], [right + 6, bottom - 6]),
      ...between(top, bottom, 3).flatMap((y) => [
        line([left - 9, y], [left - 3, y]),
        line([right + 3, y], [right + 9, y]),
      ]),
    );
    sheet.point('casing.lagging', right + 6, top + height * 0.82);
  }
  drawFittings(
    sheet,
    facts,
    {
      safetyValve: [centre + width * 0.43, top],
      gauge: [left, top + 26],
      gaugeSide: -1,
      gaugeStem: 0,
      stop: [right, top + 22],
      stopSide: 1,
      glass: [right, level + 6],
      glassSide: 1,
      check: [left, top + height * 0.58],
      checkSide: -1,
      blowdown: [right, bottom - 18],
      blowdownSide: 1,
      ground,
      feedX: 78,
      fuelX: 560,
    },
    [boxRight - 12, bottom + 10],
  );
}

interface Passages {
  /** How wide the fire is at the top plate. */
  flueWidth: number;
  /** Where it passes through the plates. */
  openings: readonly (readonly [from: number, to: number])[];
}

interface Box {
  width: number;
  boxLeft: number;
  boxRight: number;
  boxTop: number;
}

/** What leads the fire up through the water. */
function passages(
  sheet: Sheet,
  { dimensions: size, type }: BoilerFacts,
  { width, boxLeft, boxRight, boxTop }: Box,
): Passages {
  if (type === 'vertical-multi-tube') {
    const shown = clamp(Math.round(Math.sqrt(size.tubeCount ?? 12) * 1.3), 3, 7);
    const half = clamp(((boxRight - boxLeft) / (shown + 1)) * 0.24, 3, 7);
    for (const x of between(boxLeft, boxRight, shown)) {
      sheet.add(
        'outline',
        line([x - half, top], [x - half, boxTop + 6]),
        line([x + half, top], [x + half, boxTop + 6]),
      );
      sheet.add('centre', line([x, top - 6], [x, boxTop + 6]));
    }
    sheet.point('shell.tubes', between(boxLeft, boxRight, shown)[0] ?? centre, top + height * 0.36);
    sheet.point('shell.flue', boxLeft + 3, boxTop + 40);
    return {
      flueWidth: boxRight - boxLeft - 10,
      openings: between(boxLeft, boxRight, shown).map((x) => [x - half, x + half] as const),
    };
  }
  const flue =
    clamp(
      (size.flueDiameterMm ?? size.barrelOutsideDiameterMm * 0.32) / size.barrelOutsideDiameterMm,
      0.2,
      0.42,
    ) * width;
  sheet.add(
    'cut',
    rect(centre - flue / 2 - 4, top, 4, boxTop + 6 - top),
    rect(centre + flue / 2, top, 4, boxTop + 6 - top),
  );
  sheet.point('shell.flue', centre - flue / 2 - 2, (top + boxTop) / 2 + 10);
  if (type === 'vertical-cross-tube') {
    for (const [index, y] of between(boxTop + 10, top + height - 20, 3).entries()) {
      const rise = index % 2 === 0 ? 12 : -12;
      sheet.add(
        'outline',
        line([boxLeft + 5, y + rise], [boxRight - 5, y - rise]),
        line([boxLeft + 5, y + rise + 13], [boxRight - 5, y - rise + 13]),
      );
    }
    sheet.point('shell.tubes', centre + 14, boxTop + 52);
  }
  return { flueWidth: flue, openings: [[centre - flue / 2 - 4, centre + flue / 2 + 4]] };
}

function chimney(sheet: Sheet, flueWidth: number): void {
  const foot = flueWidth / 2 + 2;
  const stack = Math.min(22, foot);
  sheet.add(
    'outline',
    line([centre - foot, top], [centre - stack, top - 26], [centre - stack, top - 84]),
    line([centre + foot, top], [centre + stack, top - 26], [centre + stack, top - 84]),
    rect(centre - stack - 5, top - 90, 2 * stack + 10, 6),
  );
  sheet.point('firing.draught', centre - stack, top - 60);
}
