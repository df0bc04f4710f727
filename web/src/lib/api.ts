import type { AnyEndpoint, CallInput, ResponseOf } from '#shared/endpoint.ts';
import { Problem } from '#shared/problem.ts';

function addressOf(endpoint: AnyEndpoint, params: object, query: object): string {
  const path = endpoint.path.replaceAll(/:(\w+)/g, (_whole, name: string) =>
    encodeURIComponent(String((params as Record<string, unknown>)[name])),
  );
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) {
    if (value !== undefined && value !== null && value !== '') search.set(name, String(value));
  }
  const text = search.toString();
  return text ? `${path}?${text}` : path;
}

const unreachable = () =>
  new Problem(
    'unexpected',
    'The server could not be reached. Check the connection and try again; nothing you typed is lost.',
  );

async function bodyOf(response: Response): Promise<unknown> {
  try {
    return await response.json();
  } catch {
    return undefined;
  }
}

/**
 * Calls one operation of the API.
 * @throws Problem, always: what the server said, or that it could not be reached.
 */
export async function call<E extends AnyEndpoint>(
  endpoint: E,
  { params, query, body }: CallInput<E> = {},
  { signal, keepalive }: { signal?: AbortSignal; keepalive?: boolean } = {},
): Promise<ResponseOf<E>> {
  const hasBody = endpoint.method !== 'GET';
  let response: Response;
  try {
    response = await fetch(addressOf(endpoint, params ?? {}, query ?? {}), {
      method: endpoint.method,
      credentials: 'same-origin',
      headers: { Accept: 'application/json', ...(hasBody ? { 'Content-Type': 'application/json' } : {}) },
      ...(hasBody ? { body: JSON.stringify(body ?? {}) } : {}),
      ...(signal ? { signal } : {}),
      ...(keepalive ? { keepalive } : {}),
    });
  } catch (error) {
    if (signal?.aborted) throw error;
    throw unreachable();
  }
  const answer = await bodyOf(response);
  if (!response.ok) throw Problem.fromDetails(answer);
  const parsed = endpoint.response.safeParse(answer);
  if (!parsed.success)
    throw new Problem(
      'unexpected',
      'The server answered in a way this page does not understand. Reload the page.',
    );
  return parsed.data as ResponseOf<E>;
}
