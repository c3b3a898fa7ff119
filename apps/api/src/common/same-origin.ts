import type { NextFunction, Request, Response } from 'express';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Refuses writes that a browser says come from another site; programs send no Origin and no Sec-Fetch-Site. */
export function sameOrigin(publicUrl: string) {
  const own = new URL(publicUrl).origin;
  return (request: Request, response: Response, next: NextFunction): void => {
    const origin = request.get('origin');
    const foreign = origin ? origin !== own : request.get('sec-fetch-site') === 'cross-site';
    if (SAFE.has(request.method) || !foreign) return next();
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
