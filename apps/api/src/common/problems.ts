import { HttpException } from '@nestjs/common';
import type { Problem } from '@halfpitch/contracts';

type FieldErrors = Problem['errors'];

/** A refusal in plain words: RFC 9457 problem details, with the fields concerned where there are any. */
export class ProblemException extends HttpException {
  constructor(status: number, title: string, detail: string, errors?: FieldErrors) {
    super({ type: 'about:blank', title, status, detail, errors } satisfies Problem, status);
  }
}

export const notFound = (what: string) =>
  new ProblemException(404, 'Not found', `There is no such ${what} here. It may have been removed.`);

export const forbidden = (detail: string) => new ProblemException(403, 'Not allowed', detail);

export const conflict = (detail: string) => new ProblemException(409, 'Already there', detail);

/** The input has the right shape but can't be so; `path` names the field. */
export const unprocessable = (path: string, message: string) =>
  new ProblemException(422, 'Please check what you entered', message, [{ path, message }]);
