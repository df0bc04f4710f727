import { z } from 'zod';
import { materialId } from '../boilers/boiler.ts';
import { boilerTypeId } from '../boilers/boiler-types.ts';
import { endpoint } from '../endpoint.ts';
import { town } from '../listings/places.ts';
import { surveyorFees } from '../survey-orders/pricing.ts';
import { day } from '../time.ts';

/** What a surveyor says of themselves, and what the platform checks before each job. */
export const surveyorTerms = z.strictObject({
  townId: z.int('Choose your nearest town'),
  rangeKm: z.int('Give how far you go').min(5, 'At least 5 km').max(1_000, 'At most 1,000 km'),
  types: z.array(boilerTypeId).min(1, 'Choose at least one type'),
  materials: z.array(materialId).min(1, 'Choose at least one material'),
  insuredUntilOn: day,
  fees: surveyorFees,
  about: z
    .string()
    .trim()
    .min(20, 'Say in at least 20 characters what you have done')
    .max(1_500, 'Keep it under 1,500 characters'),
  isTakingJobs: z.boolean(),
});
export type SurveyorTerms = z.infer<typeof surveyorTerms>;

export const surveyor = z.object({
  id: z.string(),
  name: z.string(),
  /** Three digits, given by the office. */
  number: z.string(),
  town,
  rangeKm: z.int(),
  about: z.string(),
  reportsFiled: z.int(),
});
export type Surveyor = z.infer<typeof surveyor>;

export const getMySurveyorTerms = endpoint({
  name: 'getMySurveyorTerms',
  summary: 'My particulars as a surveyor; null until I have given them',
  method: 'GET',
  path: '/api/my/surveyor-terms',
  response: z.object({
    terms: surveyorTerms.nullable(),
    town: town.nullable(),
    number: z.string().nullable(),
    payoutsReady: z.boolean(),
  }),
});

export const saveMySurveyorTerms = endpoint({
  name: 'saveMySurveyorTerms',
  summary: 'Change my particulars as a surveyor',
  method: 'PUT',
  path: '/api/my/surveyor-terms',
  body: surveyorTerms,
  response: z.object({ terms: surveyorTerms, number: z.string() }),
});

export const startPayoutSetUp = endpoint({
  name: 'startPayoutSetUp',
  summary: 'Set up where my fees are paid, on the payment service’s own page',
  method: 'POST',
  path: '/api/my/payout-set-up',
  response: z.object({ url: z.string() }),
});
