import { z } from 'zod';

/** What a boiler has or is, as far as the method of examination cares. Criteria apply to traits, never to types. */
export const traits = [
  'fire-tubes',
  'water-tubes',
  'flue',
  'firebox',
  'stays',
  'tubeplates',
  'pressure-feed',
  'chimney',
] as const;
export type Trait = (typeof traits)[number];

export interface PhotoView {
  id: string;
  label: string;
  hint: string;
}

interface BoilerType {
  label: string;
  /** One line a buyer can recognise it by. */
  about: string;
  traits: readonly Trait[];
  orientation: 'vertical' | 'horizontal';
  /** Named photographs that show what matters on this type, the first is the cover by default. */
  views: readonly PhotoView[];
}

const whole: PhotoView = {
  id: 'whole',
  label: 'Whole boiler',
  hint: 'Three-quarter view, all of it in the picture',
};
const plate: PhotoView = {
  id: 'mark',
  label: 'Plate or marking',
  hint: 'Any maker’s, club or serial mark, close up',
};
const fittings: PhotoView = {
  id: 'fittings',
  label: 'Fittings',
  hint: 'Gauge, safety valve and water gauge together',
};
const underside: PhotoView = {
  id: 'underside',
  label: 'Underside',
  hint: 'Base ring, blowdown and anything that has dripped',
};
const burner: PhotoView = {
  id: 'burner',
  label: 'Burner or grate',
  hint: 'Out of the boiler, face towards you',
};
const lagging: PhotoView = {
  id: 'lagging',
  label: 'Lagging and bands',
  hint: 'Where the lagging meets the plates',
};
const topTubeplate: PhotoView = {
  id: 'top-tubeplate',
  label: 'Top tubeplate',
  hint: 'Chimney off, straight down, all the tube ends',
};
const frontTubeplate: PhotoView = {
  id: 'front-tubeplate',
  label: 'Front tubeplate',
  hint: 'Smokebox open, all the tube ends',
};
const firebox: PhotoView = {
  id: 'firebox',
  label: 'Firebox end',
  hint: 'Backhead with its fittings, and inside the firehole',
};
const flueEnd: PhotoView = {
  id: 'flue',
  label: 'Inside the flue',
  hint: 'A lamp at one end, the camera at the other',
};
const tubes: PhotoView = { id: 'tubes', label: 'Water tubes', hint: 'Casing off, both sides of the bank' };

/** The boiler types of the catalogue. Add one here; criteria, form, drawing and search follow by its traits. */
export const boilerTypes = {
  'vertical-multi-tube': {
    label: 'Vertical multi-tube',
    about: 'Upright barrel, firebox below, a bundle of fire tubes up to the top plate.',
    traits: ['fire-tubes', 'firebox', 'tubeplates', 'pressure-feed', 'chimney'],
    orientation: 'vertical',
    views: [whole, topTubeplate, firebox, fittings, underside, plate],
  },
  'vertical-centre-flue': {
    label: 'Vertical centre-flue',
    about: 'Upright barrel with one flue straight up the middle.',
    traits: ['flue', 'firebox', 'pressure-feed', 'chimney'],
    orientation: 'vertical',
    views: [whole, flueEnd, fittings, underside, burner, plate],
  },
  'vertical-cross-tube': {
    label: 'Vertical cross-tube',
    about: 'Upright barrel, large firebox crossed by water tubes.',
    traits: ['water-tubes', 'flue', 'firebox', 'pressure-feed', 'chimney'],
    orientation: 'vertical',
    views: [whole, firebox, tubes, fittings, underside, plate],
  },
  locomotive: {
    label: 'Locomotive',
    about: 'Horizontal barrel with stayed firebox at the back and tubes to a smokebox.',
    traits: ['fire-tubes', 'firebox', 'stays', 'tubeplates', 'pressure-feed', 'chimney'],
    orientation: 'horizontal',
    views: [whole, firebox, frontTubeplate, fittings, underside, plate],
  },
  'return-flue': {
    label: 'Return-flue marine',
    about: 'Short fat barrel; flame goes out along a furnace flue and comes back through tubes.',
    traits: ['fire-tubes', 'flue', 'tubeplates', 'stays', 'pressure-feed', 'chimney'],
    orientation: 'horizontal',
    views: [whole, frontTubeplate, flueEnd, fittings, lagging, plate],
  },
  'horizontal-centre-flue': {
    label: 'Horizontal centre-flue',
    about: 'Horizontal barrel with one flue, usually crossed by water tubes, and a burner at one end.',
    traits: ['flue', 'water-tubes', 'pressure-feed', 'chimney'],
    orientation: 'horizontal',
    views: [whole, flueEnd, burner, fittings, lagging, plate],
  },
  'water-tube': {
    label: 'Water-tube launch',
    about: 'Drums joined by banks of small water tubes in a casing.',
    traits: ['water-tubes', 'pressure-feed', 'chimney'],
    orientation: 'horizontal',
    views: [whole, tubes, fittings, burner, underside, plate],
  },
  pot: {
    label: 'Pot boiler',
    about: 'A plain drum over a flame, with no flue or tubes through it.',
    traits: [],
    orientation: 'horizontal',
    views: [whole, burner, fittings, underside, plate],
  },
} as const satisfies Record<string, BoilerType>;

export const boilerTypeIds = Object.keys(boilerTypes) as [BoilerTypeId, ...BoilerTypeId[]];
export type BoilerTypeId = keyof typeof boilerTypes;
export const boilerTypeId = z.enum(boilerTypeIds, 'Choose the type of boiler');

export const boilerTypeOf = (id: BoilerTypeId): BoilerType => boilerTypes[id];
