import type { BoilerFacts, FittingId } from '../boilers/boiler.ts';
import { circle, curve, line, rect } from './drawing.ts';
import type { Sheet, Spot } from './drawing.ts';

/** Where a kind of boiler carries each of its fittings. */
export interface Mounts {
  /** On top of the shell: the valve stands up from here. */
  safetyValve: Spot;
  /** Where the siphon leaves the shell; the gauge hangs up and to that side. */
  gauge: Spot;
  gaugeSide: -1 | 1;
  /** How far the siphon stands off the shell. */
  gaugeStem: number;
  /** The stop valve on the shell, its pipe going to that side. */
  stop: Spot;
  stopSide: -1 | 1;
  /** The water gauge beside the shell, about the water level. */
  glass: Spot;
  glassSide: -1 | 1;
  check: Spot;
  checkSide: -1 | 1;
  blowdown: Spot;
  blowdownSide: -1 | 1;
  /** Level of the bench. */
  ground: number;
  /** Left edges of pump and tank, and of the fuel, on the bench. */
  feedX: number;
  fuelX: number;
}

const wheel = (x: number, y: number): string[] => [
  line([x, y], [x, y - 14]),
  line([x - 9, y - 14], [x + 9, y - 14]),
];

/** A valve: two triangles nose to nose, with its wheel. */
const valve = (x: number, y: number): string[] => [
  line([x - 9, y - 6], [x + 9, y + 6], [x + 9, y - 6], [x - 9, y + 6], [x - 9, y - 6]),
  ...wheel(x, y),
];

/** A non-return valve: a triangle against a bar. */
const checkValve = (x: number, y: number): string[] => [
  line([x - 8, y - 6], [x + 6, y], [x - 8, y + 6], [x - 8, y - 6]),
  line([x + 7, y - 7], [x + 7, y + 7]),
];

function drawSafetyValve(sheet: Sheet, [x, y]: Spot, isSecond: boolean): void {
  const body = (at: number) => {
    sheet.add(
      'outline',
      rect(at - 5, y - 14, 10, 14),
      line([at - 9, y - 14], [at + 9, y - 14], [at + 6, y - 26], [at - 6, y - 26], [at - 9, y - 14]),
    );
    sheet.add(
      'thin',
      line([at - 4, y - 17], [at + 4, y - 19], [at - 4, y - 21], [at + 4, y - 23]),
      line([at, y - 26], [at, y - 32]),
    );
  };
  body(x);
  if (isSecond) body(x + 24);
  sheet.point('safety.valve', x, y - 24);
  sheet.point('safety.capacity', x, y - 8);
}

function drawGauge(sheet: Sheet, [x, y]: Spot, side: -1 | 1, hasSiphon: boolean): void {
  const [gx, gy] = [x + side * 52, y - 34];
  sheet.add(
    'outline',
    hasSiphon
      ? `M${String(x)} ${String(y)}h${String(side * 24)}c${String(side * 18)} 0 ${String(side * 18)} 18 ${String(side * 4)} 18c${String(side * -14)} 0 ${String(side * -6)} -18 ${String(side * 14)} -18h${String(side * 10)}V${String(gy + 20)}`
      : `M${String(x)} ${String(y)}h${String(side * 52)}V${String(gy + 20)}`,
    circle(gx, gy, 20),
  );
  sheet.add(
    'thin',
    circle(gx, gy, 16),
    line([gx, gy], [gx + 8, gy - 8]),
    ...[-45, 0, 45, 90, 135, 180, 225].map((degrees) => {
      const angle = (degrees * Math.PI) / 180;
      return line(
        [gx + Math.cos(angle) * 13, gy - Math.sin(angle) * 13],
        [gx + Math.cos(angle) * 16, gy - Math.sin(angle) * 16],
      );
    }),
  );
  sheet.point('safety.gauge', gx - side * 4, gy + 6);
}

function drawGlass(sheet: Sheet, [x, y]: Spot, side: -1 | 1): void {
  const gx = x + side * 24;
  sheet.add(
    'outline',
    rect(gx - 4, y - 36, 8, 72),
    line([x, y - 40], [gx + side * 8, y - 40]),
    line([x, y + 40], [gx + side * 8, y + 40]),
    rect(gx - 6, y - 46, 12, 12),
    rect(gx - 6, y + 34, 12, 12),
  );
  sheet.add(
    'thin',
    line([gx, y + 46], [gx, y + 58]),
    line([gx + side * 8, y - 45], [gx + side * 8, y - 35]),
    line([gx + side * 8, y + 35], [gx + side * 8, y + 45]),
  );
  sheet.add('water', line([gx - 4, y], [gx + 4, y]));
  sheet.point('safety.glass', gx + side * 3, y - 14);
}

/** Pump, tank and their pipe to the check valve. */
function drawFeed(sheet: Sheet, mounts: Mounts, has: (id: FittingId) => boolean): void {
  const { feedX: x, ground, check, checkSide } = mounts;
  const start: Spot = [check[0] + checkSide * 14, check[1]];
  if (has('feed-tank')) {
    sheet.add('outline', line([x, ground - 44], [x, ground], [x + 62, ground], [x + 62, ground - 44]));
    sheet.add('water', line([x, ground - 32], [x + 62, ground - 32]));
    sheet.point('feed.tank', x + 20, ground - 16);
  }
  const hasPump = has('hand-pump') || has('engine-pump');
  if (hasPump) {
    const px = x + 84;
    sheet.add('outline', rect(px, ground - 18, 34, 18), rect(px + 10, ground - 30, 10, 12));
    sheet.add(
      'thin',
      line([px + 34, ground - 10], [px + 48, ground - 10]),
      line([px + 46, ground - 24], [px + 48, ground - 10]),
    );
    if (has('hand-pump')) sheet.add('outline', line([px + 48, ground - 10], [px + 58, ground - 52]));
    sheet.add(
      'thin',
      line([x + 62, ground - 8], [px, ground - 8]),
      curve([px + 15, ground - 30], [px + 15, check[1]], start),
    );
    sheet.point('feed.first', px + 18, ground - 8);
    sheet.point('feed.pipes', px + 16, (ground - 30 + check[1]) / 2);
  }
  if (has('injector') || (has('hand-pump') && has('engine-pump'))) {
    const [ix, iy] = [x + 20, ground - 66];
    sheet.add(
      'outline',
      line([ix, iy - 3], [ix + 26, iy - 9], [ix + 26, iy + 9], [ix, iy + 3], [ix, iy - 3]),
      rect(ix - 10, iy - 3, 10, 6),
    );
    sheet.add('thin', line([ix - 6, iy + 3], [ix - 6, ground - 20]));
    sheet.point('feed.second', ix + 14, iy);
  }
}

/** What the fire burns, beside the boiler. */
function drawFuel(sheet: Sheet, { fuelX: x, ground }: Mounts, facts: BoilerFacts, burner: Spot): void {
  if (facts.firing === 'gas') {
    sheet.add(
      'outline',
      `M${String(x)} ${String(ground)}v-54q0 -16 20 -16q20 0 20 16v54Z`,
      rect(x + 14, ground - 82, 12, 12),
    );
    sheet.add('thin', curve([x + 26, ground - 76], [x - 30, ground - 100], burner));
    sheet.point('firing.fuel', x + 20, ground - 40);
  }
  if (facts.firing === 'spirit' || facts.firing === 'oil') {
    sheet.add('outline', rect(x, ground - 30, 46, 30), rect(x + 18, ground - 38, 10, 8));
    sheet.add('thin', curve([x, ground - 10], [x - 30, ground - 4], burner));
    sheet.point('firing.fuel', x + 24, ground - 14);
  }
}

/** Draws what the seller says is fitted, each in its place. */
export function drawFittings(sheet: Sheet, facts: BoilerFacts, mounts: Mounts, burner: Spot): void {
  const has = (id: FittingId): boolean => facts.fittings.includes(id);
  if (has('safety-valve')) drawSafetyValve(sheet, mounts.safetyValve, has('second-safety-valve'));
  if (has('pressure-gauge') && mounts.gaugeStem > 0)
    sheet.add('outline', line([mounts.gauge[0], mounts.gauge[1] + mounts.gaugeStem], mounts.gauge));
  if (has('pressure-gauge')) drawGauge(sheet, mounts.gauge, mounts.gaugeSide, has('siphon'));
  if (has('water-gauge')) drawGlass(sheet, mounts.glass, mounts.glassSide);
  if (has('stop-valve')) {
    const [x, y] = mounts.stop;
    const vx = x + mounts.stopSide * 16;
    sheet.add('outline', ...valve(vx, y));
    sheet.add(
      'thin',
      line([x, y], [vx - mounts.stopSide * 9, y]),
      line([vx + mounts.stopSide * 9, y], [vx + mounts.stopSide * 36, y]),
    );
    sheet.point('feed.stop', vx, y);
  }
  if (has('check-valve')) {
    const [x, y] = mounts.check;
    sheet.add('outline', ...checkValve(x + mounts.checkSide * 12, y));
    sheet.add('thin', line([x, y], [x + mounts.checkSide * 5, y]));
    sheet.point('feed.check', x + mounts.checkSide * 12, y);
  }
  if (has('blowdown-valve')) {
    const [x, y] = mounts.blowdown;
    sheet.add('outline', ...valve(x + mounts.blowdownSide * 16, y));
    sheet.add(
      'thin',
      line([x, y], [x + mounts.blowdownSide * 7, y]),
      line(
        [x + mounts.blowdownSide * 25, y],
        [x + mounts.blowdownSide * 34, y],
        [x + mounts.blowdownSide * 34, y + 10],
      ),
    );
    sheet.point('safety.blowdown', x + mounts.blowdownSide * 16, y);
  }
  drawFeed(sheet, mounts, has);
  drawFuel(sheet, mounts, facts, burner);
  sheet.point('shell.bushes', mounts.stop[0], mounts.stop[1] + 3);
}

/** Water in the boiler, with the drafting mark of a level. */
export function drawWater(
  sheet: Sheet,
  y: number,
  spans: readonly (readonly [from: number, to: number])[],
): void {
  for (const [from, to] of spans) sheet.add('water', line([from, y], [to, y]));
  const x = (spans[0]?.[0] ?? 0) + 12;
  sheet.add(
    'water',
    line([x - 6, y - 9], [x + 6, y - 9], [x, y], [x - 6, y - 9]),
    line([x - 7, y + 4], [x + 7, y + 4]),
    line([x - 4, y + 8], [x + 4, y + 8]),
  );
}

/** The fire in its place: a grate for coal, a burner for the rest. */
export function drawFire(sheet: Sheet, facts: BoilerFacts, x: number, y: number, width: number): void {
  if (facts.firing === 'none') return;
  if (facts.firing === 'coal') {
    sheet.add('outline', line([x, y], [x + width, y]));
    sheet.add('thin', ...between6(x, x + width).map((each) => line([each, y], [each, y + 6])));
  } else if (facts.firing === 'electric') {
    sheet.add('outline', curve([x, y], [x + width / 2, y - 24], [x + width, y]));
  } else {
    sheet.add('outline', rect(x, y, width, 9));
    sheet.add(
      'thin',
      ...between6(x, x + width).map((each) => curve([each - 4, y - 1], [each, y - 18], [each + 4, y - 1])),
    );
    sheet.point('firing.flame', x + width * 0.62, y - 9);
  }
  if (facts.firing === 'coal') sheet.point('firing.flame', x + width * 0.6, y - 10);
  sheet.point('firing.burner', x + width * 0.3, y + 4);
  sheet.point('firing.heat', x + width, y + 4);
}

const between6 = (from: number, to: number): number[] =>
  Array.from({ length: 6 }, (_, index) => from + ((to - from) * (index + 1)) / 7);
