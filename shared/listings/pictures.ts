import { z } from 'zod';
import { instant } from '../time.ts';

export const photoWidths = [480, 960, 1920] as const;
export const photoFormats = ['avif', 'jpeg'] as const;

/** A picture as anyone may see it: never the original, never where it was taken. */
export const photo = z.object({
  id: z.uuid(),
  view: z.string(),
  alt: z.string(),
  width: z.int(),
  height: z.int(),
  /** Widths made: none wider than the original. */
  widths: z.array(z.int()),
  /** SHA-256 of the original as received, hex. */
  sha256: z.string(),
  uploadedAt: instant,
});
export type Photo = z.infer<typeof photo>;

/** Address of one variant. */
export const photoPath = (id: string, width: number, format: (typeof photoFormats)[number]): string =>
  `/media/${id}/${String(width)}.${format}`;

export const documentView = z.object({
  id: z.uuid(),
  filename: z.string(),
  mime: z.string(),
  bytes: z.int(),
  uploadedAt: instant,
});
export type DocumentView = z.infer<typeof documentView>;

/** What an upload is for, sent as tus metadata. */
export const uploadPurposes = ['listing-photo', 'survey-photo', 'listing-document'] as const;
export const uploadMetadata = z.object({
  purpose: z.enum(uploadPurposes),
  /** Listing id, or survey order id. */
  recordId: z.uuid(),
  /** Named view of a listing photograph, or the criterion of a survey photograph. */
  view: z.string().max(60).default('whole'),
  alt: z.string().max(300).default(''),
  filename: z.string().max(200).default('photograph'),
});
export type UploadMetadata = z.infer<typeof uploadMetadata>;

export const uploadLimits = {
  photoBytes: 40 * 1024 * 1024,
  documentBytes: 15 * 1024 * 1024,
  /** Pixels of a decoded picture; a camera of today makes 50 million, a decompression bomb claims far more. */
  photoPixels: 120_000_000,
  photosPerListing: 40,
  documentsPerListing: 20,
} as const;
export const photoMimes = ['image/jpeg', 'image/png', 'image/webp', 'image/avif', 'image/tiff'] as const;
export const documentMimes = ['application/pdf', 'image/jpeg', 'image/png'] as const;
