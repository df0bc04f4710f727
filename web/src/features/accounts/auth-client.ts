import { Problem } from '#shared/problem.ts';

const words: Record<string, string> = {
  INVALID_EMAIL_OR_PASSWORD: 'The e-mail address or the password is not right.',
  USER_ALREADY_EXISTS: 'There is an account with that address already. Sign in, or set a new password.',
  USER_ALREADY_EXISTS_USE_ANOTHER_EMAIL:
    'There is an account with that address already. Sign in, or set a new password.',
  INVALID_TOKEN: 'This link has been used or has run out. Ask for a new one.',
  TOKEN_EXPIRED: 'This link has run out. Ask for a new one.',
  INVALID_CODE: 'That code is not right. Codes change every thirty seconds; try the next one.',
  INVALID_TWO_FACTOR_COOKIE: 'You took too long. Sign in again.',
  INVALID_PASSWORD: 'That is not your password.',
  INVALID_EMAIL: 'That is not an e-mail address.',
};

/**
 * Calls the sign-in service, which keeps its own addresses and its own way of saying no.
 * @throws Problem in our words.
 */
export async function authCall<T>(method: 'GET' | 'POST', path: string, body?: object): Promise<T> {
  let response: Response;
  try {
    response = await fetch(`/api/auth${path}`, {
      method,
      credentials: 'same-origin',
      headers: { 'Content-Type': 'application/json' },
      ...(body ? { body: JSON.stringify(body) } : {}),
    });
  } catch {
    throw new Problem('unexpected', 'The server could not be reached. Check the connection and try again.');
  }
  const answer = (await response.json().catch(() => null)) as
    (T & { code?: string; message?: string }) | null;
  if (response.ok) return answer as T;
  if (response.status === 429)
    throw new Problem('too-many', 'Too many tries. Wait a minute, then try again.');
  const known = answer?.code === undefined ? undefined : words[answer.code];
  throw new Problem('bad-request', known ?? answer?.message ?? 'The server could not do that. Try again.');
}
