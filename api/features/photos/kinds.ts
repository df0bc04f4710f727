import type { Buffer } from 'node:buffer';

export const kinds = ['jpeg', 'png', 'webp', 'avif', 'tiff', 'gif', 'heic', 'pdf'] as const;
export type Kind = (typeof kinds)[number];

const heicBrands = new Set(['heic', 'heix', 'hevc', 'hevx', 'heim', 'heis', 'mif1', 'msf1']);

const isAt = (bytes: Buffer, at: number, text: string): boolean =>
  bytes.toString('latin1', at, at + text.length) === text;

/**
 * What a file is by its first bytes, whatever its name claims.
 *
 * Asked before any decoder sees the file, so that only the formats we mean to read are ever parsed.
 */
export function kindOf(bytes: Buffer): Kind | undefined {
  if (isAt(bytes, 0, '\u00FF\u00D8\u00FF')) return 'jpeg';
  if (isAt(bytes, 0, '\u0089PNG\r\n\u001A\n')) return 'png';
  if (isAt(bytes, 0, 'RIFF') && isAt(bytes, 8, 'WEBP')) return 'webp';
  if (isAt(bytes, 0, 'GIF8')) return 'gif';
  if (isAt(bytes, 0, 'II*\0') || isAt(bytes, 0, 'MM\0*')) return 'tiff';
  if (isAt(bytes, 0, '%PDF-')) return 'pdf';
  if (isAt(bytes, 4, 'ftyp')) {
    const brands = bytes.toString('latin1', 8, 48);
    // An AVIF also lists the general brand mif1, so it is looked for first.
    if (brands.includes('avif')) return 'avif';
    if (heicBrands.has(brands.slice(0, 4))) return 'heic';
  }
  return undefined;
}

/** Whether a PDF ends as one should; one cut off on the way does not. */
export const isWholePdf = (bytes: Buffer): boolean => bytes.subarray(-1_024).includes('%%EOF');
