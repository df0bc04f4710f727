import { z } from 'zod';

/** The three scopes of examination, each covering the one before. */
export const scopes = {
  external: {
    label: 'External examination',
    covers:
      'Everything that can be seen and measured cold: shell, fittings, firing, papers. No pressure is put on the boiler.',
    hydraulic: false,
    steam: false,
  },
  hydraulic: {
    label: 'Examination and hydraulic test',
    covers: 'The external examination, and a cold water pressure test held and watched for leaks.',
    hydraulic: true,
    steam: false,
  },
  full: {
    label: 'Full survey with steam test',
    covers:
      'All of that, then the boiler is lit: safety valve, water gauge, feeds, flame and carbon monoxide are watched under steam.',
    hydraulic: true,
    steam: true,
  },
} as const satisfies Record<string, { label: string; covers: string; hydraulic: boolean; steam: boolean }>;
export type ScopeId = keyof typeof scopes;
export const scopeId = z.enum(Object.keys(scopes) as [ScopeId, ...ScopeId[]], 'Choose a scope');

export const extras = {
  thickness: {
    label: 'Wall-thickness readings',
    covers: 'Ultrasonic readings of barrel and plates at marked points.',
  },
  borescope: {
    label: 'Internal examination by borescope',
    covers: 'A camera through the bushes: plates, stays and tubes from the water side.',
  },
} as const;
export type ExtraId = keyof typeof extras;
export const extraId = z.enum(Object.keys(extras) as [ExtraId, ...ExtraId[]]);
