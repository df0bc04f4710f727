import { readFile } from 'node:fs/promises';
import path from 'node:path';
import sharp from 'sharp';

const folder = path.join(import.meta.dirname, 'photos');

/** One demonstration picture: a file, and how it is varied so that two boilers do not share a picture. */
export interface SeedPicture {
  file: string;
  view: string;
  alt: string;
  /** Mirrored left to right. */
  mirror?: boolean;
  /** Turn of the hues, degrees: repaints a casing. */
  hue?: number;
  brightness?: number;
  /** Part of the picture to keep, as shares of its width and height. */
  crop?: { left: number; top: number; width: number; height: number };
}

const note = ' Computer-made demonstration picture.';

/** Says in words that nobody photographed this. */
export const altOf = (picture: SeedPicture): string => picture.alt + note;

export async function readPicture({ file, mirror, hue, brightness, crop }: SeedPicture): Promise<Buffer> {
  const original = await readFile(path.join(folder, `${file}.jpg`));
  if (!mirror && hue === undefined && brightness === undefined && !crop) return original;
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
  if (hue !== undefined || brightness !== undefined) {
    image.modulate({
      ...(hue === undefined ? {} : { hue }),
      ...(brightness === undefined ? {} : { brightness }),
    });
  }
  return image.jpeg({ quality: 88 }).toBuffer();
}
