import { Problem } from '#shared/problem.ts';

interface TusError {
  originalResponse?: { getBody: () => string } | null;
}

/** The server's own sentence in a failed upload, if it sent one. */
export function refusalIn(error: unknown): string | undefined {
  const body = (error as TusError | null)?.originalResponse?.getBody();
  if (!body) return undefined;
  try {
    return Problem.fromDetails(JSON.parse(body)).message;
  } catch {
    return undefined;
  }
}
