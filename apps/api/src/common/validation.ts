import { StandardSchemaValidationPipe } from '@nestjs/common';
import { ProblemException } from './problems';

type Issue = { message: string; path?: readonly (PropertyKey | { key: PropertyKey })[] };

const pathOf = (issue: Issue) =>
  (issue.path ?? []).map((part) => String(typeof part === 'object' ? part.key : part)).join('.');

/** Holds what comes in against its zod schema; what is wrong is told field by field. */
export const validationPipe = new StandardSchemaValidationPipe({
  exceptionFactory: (issues) =>
    new ProblemException(
      400,
      'Please check what you entered',
      issues[0]?.message ?? 'The request could not be read.',
      issues.map((issue) => ({ path: pathOf(issue), message: issue.message })),
    ),
});
