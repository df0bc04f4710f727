import { z } from 'zod';

/** Every way an operation can fail, as seen by a caller. Slug → HTTP status and title (RFC 9457). */
export const problems = {
  'invalid-input': { status: 422, title: 'Some of what you entered needs mending' },
  'bad-request': { status: 400, title: 'The request could not be read' },
  'not-signed-in': { status: 401, title: 'Sign in first' },
  'second-factor-required': { status: 403, title: 'A second factor is required for the office' },
  'not-permitted': { status: 403, title: 'That is not yours to do' },
  'wrong-origin': { status: 403, title: 'The request came from another site' },
  'not-found': { status: 404, title: 'There is nothing here' },
  'wrong-state': { status: 409, title: 'That cannot be done at this stage' },
  'changed-meanwhile': { status: 409, title: 'Somebody else changed this first' },
  'not-complete': { status: 409, title: 'Something is still missing' },
  'result-differs': { status: 409, title: 'The result computed here differs from yours' },
  'stale-version': { status: 412, title: 'You were working from an older version' },
  'too-large': { status: 413, title: 'That is too large' },
  'wrong-kind': { status: 415, title: 'That kind of file cannot be used' },
  'too-many': { status: 429, title: 'Too many requests from you just now' },
  'payment-service': { status: 502, title: 'The payment service did not answer as expected' },
  unexpected: { status: 500, title: 'The server met a fault of its own' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemSlug = keyof typeof problems;

/** One mistake: what is wrong, and a JSON pointer in fragment form to where (`#/price/minor`). */
export const fieldError = z.object({ detail: z.string(), pointer: z.string() });
export type FieldError = z.infer<typeof fieldError>;

/** RFC 9457 problem details as sent on the wire. */
export const problemDetails = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string().optional(),
  instance: z.string().optional(),
  errors: z.array(fieldError).optional(),
});
export type ProblemDetails = z.infer<typeof problemDetails>;

const isSlug = (text: string): text is ProblemSlug => Object.hasOwn(problems, text);

/** The one error class that crosses from the rules to the server to the browser. */
export class Problem extends Error {
  readonly slug: ProblemSlug;
  readonly errors: readonly FieldError[];
  readonly instance: string | undefined;

  constructor(slug: ProblemSlug, detail?: string, errors: readonly FieldError[] = [], instance?: string) {
    super(detail ?? problems[slug].title);
    this.name = 'Problem';
    this.slug = slug;
    this.errors = errors;
    this.instance = instance;
  }

  get status(): number {
    return problems[this.slug].status;
  }

  /** @param base absolute address of the page that explains problems, ending in a slash. */
  toDetails(base: string, instance?: string): ProblemDetails {
    return {
      type: base + this.slug,
      title: problems[this.slug].title,
      status: this.status,
      detail: this.message,
      ...(instance ? { instance } : {}),
      ...(this.errors.length > 0 ? { errors: [...this.errors] } : {}),
    };
  }

  /** Rebuilds the problem a server sent; anything unknown becomes `unexpected`. */
  static fromDetails(body: unknown): Problem {
    const parsed = problemDetails.safeParse(body);
    if (!parsed.success)
      return new Problem('unexpected', 'The server answered in a way this page does not understand.');
    const slug = parsed.data.type.split('/').at(-1) ?? '';
    return new Problem(
      isSlug(slug) ? slug : 'unexpected',
      parsed.data.detail ?? parsed.data.title,
      parsed.data.errors,
      parsed.data.instance,
    );
  }
}

/** JSON pointer in fragment form (RFC 6901 §6) for a path such as `['price', 0]`. */
export const pointer = (path: readonly PropertyKey[]): string =>
  '#' +
  path
    .map((part) => '/' + encodeURIComponent(String(part).replaceAll('~', '~0').replaceAll('/', '~1')))
    .join('');

/** A failed zod parse as a problem that names every field at fault. */
export function invalidInput(error: z.ZodError): Problem {
  const errors = error.issues.map((issue) => ({ detail: issue.message, pointer: pointer(issue.path) }));
  const count = errors.length === 1 ? 'One entry needs' : `${String(errors.length)} entries need`;
  return new Problem('invalid-input', `${count} mending.`, errors);
}

/** One named field at fault. */
export const invalidField = (path: readonly PropertyKey[], detail: string): Problem =>
  new Problem('invalid-input', detail, [{ detail, pointer: pointer(path) }]);
