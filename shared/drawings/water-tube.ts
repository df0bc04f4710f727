import type { BoilerFacts } from '../boilers/boiler.ts';
import { between, circle, curve, line, rect } from './drawing.ts';
import type { Sheet } from './drawing.ts';
import { drawFire, drawFittings, drawWater } from './fittings.ts';

const centre = 350;
const drum = { y: 170, radius: 46 };
const low = { y: 356, radius: 23, apart: 118 };
const ground = 432;

/** Drums joined by banks of small tubes in a casing, seen from the end. */
export function drawWaterTube(sheet: Sheet, facts: BoilerFacts): void {
  const [left, right] = [centre - low.apart, centre + low.apart];
  sheet.add('centre', line([centre, 40], [centre, ground]));
  for (const [x, y, radius] of [
    [centre, drum.y, drum.radius],
    [left, low.y, low.radius],
    [right, low.y, low.radius],
  ] as const) {
    sheet.add('cut', `${circle(x, y, radius)}${circle(x, y, radius - 6)}`);
  }
  for (const [index, share] of between(0, 1, 6).entries()) {
    for (const side of [-1, 1] as const) {
      const start = [centre + side * (12 + share * 34), drum.y + drum.radius - 4 - share * 30] as const;
      const end = [
        centre + side * (low.apart - 16 + index * 6),
        low.y - low.radius + 2 + Math.abs(index - 2.5) * 2,
      ] as const;
      sheet.add(
        'outline',
        curve(start, [start[0] + side * (14 + index * 16), start[1] + 70 - index * 6], end),
      );
    }
  }
  sheet.point('shell.tubes', centre + 84, drum.y + 88);
  sheet.point('shell.barrel', centre - drum.radius + 3, drum.y + 8);
  sheet.point('shell.plates', left - low.radius + 3, low.y);
  sheet.point('shell.joints', centre - 26, drum.y + drum.radius - 10);
  sheet.point('shell.waterside', centre + 8, drum.y + 30);
  sheet.point('shell.fireside', centre - 72, drum.y + 96);
  sheet.add(
    'outline',
    line([left - 36, ground - 10], [left - 44, 250], [centre - 66, 112], [centre - 30, 96]),
    line([right + 36, ground - 10], [right + 44, 250], [centre + 66, 112], [centre + 30, 96]),
    line([centre - 24, 96], [centre - 24, 36]),
    line([centre + 24, 96], [centre + 24, 36]),
    rect(centre - 30, 30, 60, 6),
  );
  sheet.add('thin', line([60, ground], [640, ground]), rect(left - 44, ground - 10, 2 * low.apart + 88, 10));
  sheet.point('firing.draught', centre - 24, 62);
  sheet.point('casing.mount', right + 30, ground - 5);
  sheet.point('casing.fixings', left - 36, ground - 14);
  if (facts.fittings.includes('lagging')) sheet.point('casing.lagging', right + 44, 262);
  drawWater(sheet, drum.y - 4, [[centre - drum.radius + 8, centre + drum.radius - 8]]);
  drawFire(sheet, facts, centre - 70, low.y + 22, 140);
  drawFittings(
    sheet,
    facts,
    {
      safetyValve: [centre + 20, drum.y - drum.radius + 4],
      gauge: [centre - 40, drum.y - 20],
      gaugeSide: -1,
      gaugeStem: 0,
      stop: [centre + 42, drum.y - 18],
      stopSide: 1,
      glass: [centre + drum.radius + 46, drum.y + 10],
      glassSide: 1,
      check: [right + low.radius, low.y - 6],
      checkSide: 1,
      blowdown: [left - low.radius, low.y + 8],
      blowdownSide: -1,
      ground,
      feedX: 516,
      fuelX: 78,
    },
    [centre - 70, low.y + 26],
  );
}
