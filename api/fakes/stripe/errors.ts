/** An error in the service's own shape. */
export class ServiceError extends Error {
  readonly status: number;
  readonly body: Record<string, unknown>;

  constructor(status: number, type: string, message: string, more: Record<string, unknown> = {}) {
    super(message);
    this.status = status;
    this.body = { type, message, ...more };
  }
}

export const missing = (object: string, id: string): ServiceError =>
  new ServiceError(404, 'invalid_request_error', `No such ${object}: '${id}'`, {
    code: 'resource_missing',
    param: 'id',
  });

export const invalid = (message: string, param?: string, code?: string): ServiceError =>
  new ServiceError(400, 'invalid_request_error', message, {
    ...(param ? { param } : {}),
    ...(code ? { code } : {}),
  });

export const required = (param: string): ServiceError =>
  invalid(`Missing required param: ${param}.`, param, 'parameter_missing');

export const poor = (): ServiceError =>
  invalid(
    'You have insufficient available funds in your Stripe account. Try adding funds directly to your available balance.',
    undefined,
    'balance_insufficient',
  );
