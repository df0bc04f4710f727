import { makeTemplate } from './db-template.ts';

export const setup = makeTemplate;
