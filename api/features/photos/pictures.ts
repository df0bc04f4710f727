import { webcrypto } from 'node:crypto';
import sharp from 'sharp';
import type { Sharp } from 'sharp';
import { photoFormats, photoWidths, uploadLimits } from '#shared/listings/pictures.ts';
import { Problem } from '#shared/problem.ts';
import { isWholePdf, kindOf } from './kinds.ts';
import type { Kind } from './kinds.ts';

const mimes = {
  jpeg: 'image/jpeg',
  png: 'image/png',
  webp: 'image/webp',
  avif: 'image/avif',
  tiff: 'image/tiff',
} as const satisfies Partial<Record<Kind, string>>;
type PictureKind = keyof typeof mimes;
const isPicture = (kind: Kind | undefined): kind is PictureKind => kind !== undefined && kind in mimes;

const wrongKind = (detail: string) => new Problem('wrong-kind', detail);
const damaged = () =>
  wrongKind(
    'That picture is damaged or was cut off on its way: it cannot be read to the end. Send it again, or choose another.',
  );

const refusals: Partial<Record<Kind, string>> = {
  heic: 'That is an HEIC picture, which most browsers cannot show. In the telephone’s camera settings choose “Most compatible”, or export the picture as JPEG, and send that.',
  gif: 'GIF pictures are not taken. Send a JPEG, PNG, WebP, AVIF or TIFF.',
  pdf: 'That is a PDF. Add it under documents; here only pictures are taken.',
};
const notPicture =
  'That file is not a picture, whatever its name says. Send a JPEG, PNG, WebP, AVIF or TIFF.';

/** SHA-256 in hex. Worked out off the event loop: a large picture takes tens of milliseconds. */
export async function sha256Of(bytes: Uint8Array<ArrayBuffer>): Promise<string> {
  return Buffer.from(await webcrypto.subtle.digest('SHA-256', bytes)).toString('hex');
}

const millions = (pixels: number): string => String(Math.round(pixels / 1e6));

interface Opened {
  kind: PictureKind;
  mime: string;
  /** As it is to be looked at, after any turn the camera recorded. */
  width: number;
  height: number;
  /** A fresh pipeline over the picture, turned upright. */
  decode: () => Sharp;
}

const options = { failOn: 'error', limitInputPixels: uploadLimits.photoPixels } as const;

/** Looks at a picture's header. @throws Problem wrong-kind, too-large. */
async function openPicture(bytes: Buffer): Promise<Opened> {
  const kind = kindOf(bytes);
  if (!isPicture(kind)) throw wrongKind((kind && refusals[kind]) ?? notPicture);
  // The limit on pixels is ours to explain, so the header alone is read without it.
  const header = await sharp(bytes, { ...options, limitInputPixels: false })
    .metadata()
    .catch(() => {
      throw damaged();
    });
  if ((header.pages ?? 1) > 1)
    throw wrongKind('That file holds several pictures or moves. Send one still picture.');
  if (header.width * header.height > uploadLimits.photoPixels) {
    throw new Problem(
      'too-large',
      `That picture claims ${millions(header.width * header.height)} million pixels; the most is ${millions(uploadLimits.photoPixels)} million. Save it smaller and send it again.`,
    );
  }
  const { width, height } = header.autoOrient;
  return { kind, mime: mimes[kind], width, height, decode: () => sharp(bytes, options).autoOrient() };
}

/** The widths to make: the standard ones narrower than the original, and one as wide as the original or the widest. */
export function widthsFor(originalPx: number): number[] {
  const widest = Math.min(originalPx, photoWidths[photoWidths.length - 1] ?? originalPx);
  return [...photoWidths.filter((width) => width < widest), widest];
}

export interface MadePhoto {
  mime: string;
  width: number;
  height: number;
  widths: number[];
  sha256: string;
  variants: { width: number; format: (typeof photoFormats)[number]; content: Buffer }[];
}

const encode = {
  avif: (image: Sharp) => image.avif({ quality: 52, effort: 2 }),
  jpeg: (image: Sharp) => image.jpeg({ quality: 80, mozjpeg: true }),
} as const;

/**
 * Makes every variant of a picture: upright, in sRGB, and with nothing of what the camera wrote into the file.
 *
 * Decoded and resized once, to the widest; the others are taken from that.
 * @throws Problem wrong-kind, too-large.
 */
export async function makePhoto(original: Buffer<ArrayBuffer>): Promise<MadePhoto> {
  const { mime, width, height, decode } = await openPicture(original);
  const widths = widthsFor(width);
  const { data, info } = await decode()
    .resize({ width: widths.at(-1) ?? width, withoutEnlargement: true })
    .flatten({ background: '#ffffff' })
    .toColourspace('srgb')
    .raw()
    .toBuffer({ resolveWithObject: true })
    .catch(() => {
      throw damaged();
    });
  const raw = { width: info.width, height: info.height, channels: info.channels };
  const variants = await Promise.all(
    widths.flatMap((wanted) =>
      photoFormats.map(async (format) => {
        const image = sharp(data, { raw });
        if (wanted < info.width) image.resize({ width: wanted });
        return { width: wanted, format, content: await encode[format](image).toBuffer() };
      }),
    ),
  );
  return { mime, width, height, widths, sha256: await sha256Of(original), variants };
}

export interface MadeDocument {
  mime: string;
  content: Buffer;
  /** Of the file as received. */
  sha256: string;
}

/**
 * Checks a document: a whole PDF as it is, or a JPEG or PNG freed of what the camera wrote into it.
 * @throws Problem wrong-kind, too-large.
 */
export async function makeDocument(original: Buffer<ArrayBuffer>): Promise<MadeDocument> {
  const sha256 = await sha256Of(original);
  const kind = kindOf(original);
  if (kind === 'pdf') {
    if (!isWholePdf(original))
      throw wrongKind('That PDF was cut off on its way: its end is missing. Send it again.');
    return { mime: 'application/pdf', content: original, sha256 };
  }
  if (kind !== 'jpeg' && kind !== 'png')
    throw wrongKind('A document is a PDF, or a JPEG or PNG picture of the paper. Send one of those.');
  const { mime, decode } = await openPicture(original);
  const image = decode().toColourspace('srgb');
  const content = await (kind === 'jpeg' ? image.jpeg({ quality: 90, mozjpeg: true }) : image.png())
    .toBuffer()
    .catch(() => {
      throw damaged();
    });
  return { mime, content, sha256 };
}
