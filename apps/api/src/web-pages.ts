import { resolve, sep } from 'node:path';
import type { DynamicModule } from '@nestjs/common';
import { ServeStaticModule } from '@nestjs/serve-static';
import type { Response } from 'express';
import type { Environment } from './config/environment';

const A_YEAR = 'public, max-age=31536000, immutable';

/** The built web pages. Every address that is not the API's answers the one page, which finds its own way. */
export function webPages({ WEB_ROOT }: Pick<Environment, 'WEB_ROOT'>): DynamicModule {
  return ServeStaticModule.forRoot({
    rootPath: resolve(WEB_ROOT),
    exclude: ['/api/{*rest}'],
    serveStaticOptions: {
      // Files under assets carry a hash of their content in their names; the page itself is asked for each time.
      setHeaders: (response: Response, path: string) =>
        response.setHeader('Cache-Control', path.includes(`${sep}assets${sep}`) ? A_YEAR : 'no-cache'),
    },
  });
}
