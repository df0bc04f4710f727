export * from './auth.ts';
export * from './people.ts';
export * from './engines.ts';
export * from './listings.ts';
export * from './survey-orders.ts';
export * from './payments.ts';
export * from './surveys.ts';
export * from './office.ts';
