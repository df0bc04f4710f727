import { readFile } from 'node:fs/promises';
import path from 'node:path';
import sharp from 'sharp';
import type { Sharp } from 'sharp';

const folder = path.join(import.meta.dirname, 'photos');

/** One demonstration picture: a file, and how it is varied so that two boilers do not share a picture. */
export interface SeedPicture {
  file: string;
  view: string;
  alt: string;
  /** Mirrored left to right. */
  mirror?: boolean;
  /** Repaints what is of one hue, degrees: a casing, and not the bench it stands on. */
  repaint?: { from: number; to: number; reach: number };
  brightness?: number;
  /** Part of the picture to keep, as shares of its width and height. */
  crop?: { left: number; top: number; width: number; height: number };
}

const note = ' Computer-made demonstration picture.';

/** Says in words that nobody photographed this. */
export const altOf = (picture: SeedPicture): string => picture.alt + note;

export async function readPicture({ file, mirror, repaint, brightness, crop }: SeedPicture): Promise<Buffer> {
  const original = await readFile(path.join(folder, `${file}.jpg`));
  if (!mirror && !repaint && brightness === undefined && !crop) return original;
  const image = sharp(original);
  const { width, height } = await image.metadata();
  if (crop) {
    image.extract({
      left: Math.round(crop.left * width),
      top: Math.round(crop.top * height),
      width: Math.round(crop.width * width),
      height: Math.round(crop.height * height),
    });
  }
  if (mirror) image.flop();
  if (brightness !== undefined) image.modulate({ brightness });
  if (repaint) return repainted(image, repaint);
  return image.jpeg({ quality: 88 }).toBuffer();
}

/** How strong the colour of a pixel must be to count as paint. */
const leastSaturation = 0.3;

async function repainted(
  image: Sharp,
  { from, to, reach }: { from: number; to: number; reach: number },
): Promise<Buffer> {
  const { data, info } = await image.removeAlpha().raw().toBuffer({ resolveWithObject: true });
  for (let at = 0; at < data.length; at += 3) {
    const [red = 0, green = 0, blue = 0] = data.subarray(at, at + 3);
    const [hue, saturation, value] = hsvOf(red, green, blue);
    const off = Math.abs(((hue - from + 540) % 360) - 180);
    if (off <= reach && saturation >= leastSaturation)
      data.set(rgbOf((to + hue - from + 720) % 360, saturation, value), at);
  }
  const raw = { width: info.width, height: info.height, channels: 3 as const };
  return sharp(data, { raw }).jpeg({ quality: 88 }).toBuffer();
}

function hsvOf(red: number, green: number, blue: number): [hue: number, saturation: number, value: number] {
  const most = Math.max(red, green, blue);
  const spread = most - Math.min(red, green, blue);
  if (spread === 0) return [0, 0, most];
  const sector =
    most === red
      ? (green - blue) / spread
      : most === green
        ? 2 + (blue - red) / spread
        : 4 + (red - green) / spread;
  return [(sector * 60 + 360) % 360, spread / most, most];
}

function rgbOf(hue: number, saturation: number, value: number): [red: number, green: number, blue: number] {
  const part = (offset: number): number => {
    const k = (offset + hue / 60) % 6;
    return Math.round(value * (1 - saturation * Math.max(0, Math.min(k, 4 - k, 1))));
  };
  return [part(5), part(3), part(1)];
}
