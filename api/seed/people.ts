import type { Role } from '#shared/accounts/roles.ts';
import type { SurveyorTerms } from '#shared/surveyors/contract.ts';
import { boilerTypeIds } from '#shared/boilers/boiler-types.ts';
import type { BoilerTypeId } from '#shared/boilers/boiler-types.ts';
import { demoAccounts } from '../demo-accounts.ts';

export interface SeedPerson {
  email: string;
  name: string;
  roles: readonly Role[];
}

const [seller, buyer, surveyor, office] = demoAccounts;

export const people = {
  harriet: { email: seller.email, name: seller.name, roles: [] },
  tomos: { email: buyer.email, name: buyer.name, roles: [] },
  mabel: { email: surveyor.email, name: surveyor.name, roles: ['surveyor'] },
  idris: { email: office.email, name: office.name, roles: ['office'] },
  gwen: { email: 'gwen.askew@tubeplate.example', name: 'Gwen Askew', roles: [] },
  peter: { email: 'peter.marrow@tubeplate.example', name: 'Peter Marrow', roles: [] },
  sanjay: { email: 'sanjay.mistry@tubeplate.example', name: 'Sanjay Mistry', roles: [] },
  odile: { email: 'odile.brandt@tubeplate.example', name: 'Odile Brandt', roles: [] },
  ruth: { email: 'ruth.calder@tubeplate.example', name: 'Ruth Calder', roles: ['surveyor'] },
  joe: { email: 'joe.penhale@tubeplate.example', name: 'Joe Penhale', roles: ['surveyor'] },
} as const satisfies Record<string, SeedPerson>;
export type PersonKey = keyof typeof people;

interface SeedSurveyor {
  town: string;
  hasPayouts: boolean;
  /** Days from the day of seeding that the insurance still runs. */
  insuredForDays: number;
  terms: Omit<SurveyorTerms, 'townId' | 'insuredUntilOn'>;
}

const small: BoilerTypeId[] = [
  'vertical-multi-tube',
  'vertical-centre-flue',
  'vertical-cross-tube',
  'horizontal-centre-flue',
  'pot',
];

export const surveyors: Partial<Record<PersonKey, SeedSurveyor>> = {
  mabel: {
    town: 'Ludlow',
    hasPayouts: true,
    insuredForDays: 260,
    terms: {
      rangeKm: 320,
      types: [...boilerTypeIds],
      materials: ['copper', 'copper-brass', 'brass', 'steel', 'stainless'],
      fees: {
        external: 5_500,
        hydraulic: 9_500,
        full: 16_500,
        thickness: 2_500,
        borescope: 3_000,
        perKmMinor: 45,
      },
      about:
        'Thirty-one years a toolmaker, fourteen as boiler tester for the Teme Valley Model Engineers. I bring my own test pump, two gauges and a thickness meter, and I like a dry floor to lie on.',
      isTakingJobs: true,
    },
  },
  ruth: {
    town: 'Skipton',
    hasPayouts: true,
    insuredForDays: 95,
    terms: {
      rangeKm: 200,
      types: [...boilerTypeIds],
      materials: ['copper', 'copper-brass', 'steel'],
      fees: {
        external: 6_000,
        hydraulic: 11_000,
        full: 18_500,
        thickness: null,
        borescope: 3_500,
        perKmMinor: 40,
      },
      about:
        'Works on heritage boilers through the week and small ones at the weekend. Second boiler tester of the Airedale Light Steam Society since 2015.',
      isTakingJobs: true,
    },
  },
  joe: {
    town: 'Bodmin',
    hasPayouts: false,
    insuredForDays: 310,
    terms: {
      rangeKm: 250,
      types: small,
      materials: ['copper', 'copper-brass', 'brass'],
      fees: {
        external: 4_500,
        hydraulic: 8_500,
        full: 14_000,
        thickness: 2_000,
        borescope: null,
        perKmMinor: 35,
      },
      about:
        'Builds and mends launch plant and small verticals in copper. Tests for the Camel Estuary Steamers. No steel boilers, please: I have no business judging welds.',
      isTakingJobs: true,
    },
  },
};
