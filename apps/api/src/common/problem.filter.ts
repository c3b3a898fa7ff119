import { ArgumentsHost, Catch, ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import type { Problem } from '@halfpitch/contracts';
import type { Response } from 'express';
import { QueryFailedError } from 'typeorm';
import { ProblemException } from './problems';

const TITLES: Record<number, string> = {
  400: 'Please check what you entered',
  401: 'Not signed in',
  403: 'Not allowed',
  404: 'Not found',
  413: 'Too large',
  429: 'Too many tries',
};

/** PostgreSQL's own refusals that a person can act on, by SQLSTATE. */
const SQLSTATES: Record<string, [number, string]> = {
  '23505': [409, 'That is already there.'],
  '23503': [409, 'Something it depends on is no longer there. Reload and try again.'],
  '40001': [409, 'Somebody else changed this at the same moment. Try again.'],
};

/** Every error leaves as RFC 9457 problem details; what nobody foresaw is logged and told without its inside. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(error: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    if (response.headersSent) {
      response.end();
      return;
    }
    const problem = this.toProblem(error);
    if (problem.status >= 500) this.logger.error(error instanceof Error ? error.stack : String(error));
    response.status(problem.status).type('application/problem+json').send(JSON.stringify(problem));
  }

  private toProblem(error: unknown): Problem {
    if (error instanceof ProblemException) return error.getResponse() as Problem;
    if (error instanceof HttpException) return this.plain(error.getStatus(), error.message);
    if (error instanceof QueryFailedError) {
      const known = SQLSTATES[(error.driverError as { code?: string }).code ?? ''];
      if (known) return this.plain(...known);
    }
    const status = (error as { status?: unknown })?.status;
    if (typeof status === 'number' && status >= 400 && status < 500)
      return this.plain(status, (error as Error).message);
    return this.plain(500, 'Something went wrong on our side. Nothing was saved; try again in a moment.');
  }

  private plain(status: number, detail: string): Problem {
    return { type: 'about:blank', title: TITLES[status] ?? 'It did not work', status, detail };
  }
}
