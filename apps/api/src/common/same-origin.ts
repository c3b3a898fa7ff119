import type { NextFunction, Request, Response } from 'express';
import { bearerOf } from './bearer';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses writes that a browser says come from another site; programs send no Origin and no Sec-Fetch-Site. A call with
 * a token is let by: it acts by the token it names and never by the browser's session.
 */
export function sameOrigin(publicUrl: string) {
  const own = new URL(publicUrl).origin;
  return (request: Request, response: Response, next: NextFunction): void => {
    const origin = request.get('origin');
    const foreign = origin ? origin !== own : request.get('sec-fetch-site') === 'cross-site';
    const byToken = bearerOf(request.get('authorization')) !== undefined;
    if (SAFE.has(request.method) || !foreign || byToken) return next();
    response
      .status(403)
      .type('application/problem+json')
      .send(
        JSON.stringify({
          type: 'about:blank',
          title: 'Not allowed',
          status: 403,
          detail: `This request came from another address than ${own}. Open the page there and try again.`,
        }),
      );
  };
}
