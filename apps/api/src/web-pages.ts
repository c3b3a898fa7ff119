import { resolve, sep } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import express, { type NextFunction, type Request, type Response } from 'express';

const A_YEAR = 'public, max-age=31536000, immutable';

/**
 * The built web pages in a folder. Every address that is not the API's answers the one page, which finds its own way.
 * The page is sent by its name under the folder: by a whole path it would not be found below a folder like `.build`.
 */
export function servePages(app: NestExpressApplication, folder: string): void {
  const root = resolve(folder);
  app.use(
    express.static(root, {
      // Files under assets carry a hash of their content in their names; the page itself is asked for each time.
      setHeaders: (response, path) =>
        response.setHeader('Cache-Control', path.includes(`${sep}assets${sep}`) ? A_YEAR : 'no-cache'),
    }),
  );
  app.use((request: Request, response: Response, next: NextFunction) => {
    const isPage = ['GET', 'HEAD'].includes(request.method) && !/^\/(api|assets)(\/|$)/.test(request.path);
    if (!isPage) return next();
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile('index.html', { root }, (error) => error && next());
  });
}
