import type { FieldError } from '../problem.ts';
import type { Photo } from './pictures.ts';

/** Fewest photographs with which a boiler may be listed. */
export const fewestPhotos = 3;
/** The view that every listing must have, whatever its type. */
export const wholeView = 'whole';

/** What a listing's photographs lack before it may stand on the market; empty when nothing. */
export function photoFaults(photos: readonly Pick<Photo, 'view' | 'alt'>[]): FieldError[] {
  const faults: string[] = [];
  if (photos.length < fewestPhotos) {
    const missing = fewestPhotos - photos.length;
    faults.push(`Add ${String(missing)} more: at least ${String(fewestPhotos)} photographs are needed`);
  }
  if (!photos.some(({ view }) => view === wholeView)) faults.push('Add a view of the whole boiler');
  const silent = photos.filter(({ alt }) => alt.trim() === '').length;
  if (silent > 0) {
    faults.push(
      silent === 1
        ? 'One photograph has no description: say what it shows, for those who cannot see it'
        : `${String(silent)} photographs have no description: say what each shows, for those who cannot see it`,
    );
  }
  return faults.map((detail) => ({ detail, pointer: '#/photos' }));
}
