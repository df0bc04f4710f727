import { invalid, required } from './errors.ts';
import type { Metadata } from './store.ts';

export type Body = Record<string, unknown>;

export const text = (body: Body, name: string): string | null => {
  const value = body[name];
  return typeof value === 'string' && value !== '' ? value : null;
};

export const needText = (body: Body, name: string): string => {
  const value = text(body, name);
  if (value === null) throw required(name);
  return value;
};

/** A whole positive amount of minor units; what the service refuses is refused in its words. */
export function needAmount(value: unknown, param: string): number {
  if (typeof value !== 'string' || value === '') throw required(param);
  if (!/^-?\d+$/.test(value)) throw invalid(`Invalid integer: ${value}`, param, 'parameter_invalid_integer');
  const amount = Number(value);
  if (amount < 1)
    throw invalid(`This value must be greater than or equal to 1.`, param, 'parameter_invalid_integer');
  if (amount > 99_999_999)
    throw invalid('Amount must be no more than 999,999.99.', param, 'amount_too_large');
  return amount;
}

export function metadataOf(body: Body): Metadata {
  const value = body['metadata'];
  if (typeof value !== 'object' || value === null) return {};
  return Object.fromEntries(Object.entries(value).map(([key, entry]) => [key, String(entry)]));
}

export const child = (body: Body, name: string): Body => {
  const value = body[name];
  return typeof value === 'object' && value !== null ? (value as Body) : {};
};
