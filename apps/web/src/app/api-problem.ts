import { problem } from '@halfpitch/contracts';
import type { Problem } from '@halfpitch/contracts';

/** What the server refused, or that it could not be reached: RFC 9457 problem details. */
export class ApiProblem extends Error implements Problem {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly errors: NonNullable<Problem['errors']>;

  constructor({ type, title, status, detail, errors = [] }: Problem) {
    super(detail);
    this.name = 'ApiProblem';
    this.type = type;
    this.title = title;
    this.status = status;
    this.detail = detail;
    this.errors = errors;
  }
}

const own = (status: number, title: string, detail: string) =>
  new ApiProblem({ type: 'about:blank', title, status, detail });

/** Status 0: no answer came at all. */
export const unreachable = () =>
  own(0, 'No connection', 'The workshop’s server could not be reached. Check the connection and try again.');

/** The answer has another shape than this page expects: most often a page from before an update. */
export const unreadable = (status: number) =>
  own(
    status,
    'Unexpected answer',
    'The server answered in a way this page does not understand. Reload the page.',
  );

/** The problem in an answer that is not 2xx. */
export function problemFrom(status: number, body: unknown): ApiProblem {
  const parsed = problem.safeParse(body);
  if (parsed.success) return new ApiProblem(parsed.data);
  return own(status, 'It did not work', 'The server could not do this just now. Try again in a moment.');
}

/** Any error as one plain sentence. */
export const errorSentence = (error: unknown): string =>
  error instanceof ApiProblem ? error.detail : 'Something went wrong on this page. Reload it and try again.';

export const isSignedOut = (error: unknown): boolean => error instanceof ApiProblem && error.status === 401;
