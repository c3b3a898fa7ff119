import type { NestExpressApplication } from '@nestjs/platform-express';
import { ConfigService } from '@nestjs/config';
import compression from 'compression';
import connectPgSimple from 'connect-pg-simple';
import session from 'express-session';
import helmet from 'helmet';
import passport from 'passport';
import { sameOrigin } from './common/same-origin';
import { Environment } from './config/environment';
import { SessionPool } from './database/session-pool';
import { mountDocs } from './docs';
import { servePages } from './web-pages';

const THIRTY_DAYS_MS = 30 * 86_400_000;

/** What stands before every handler: headers, sessions in PostgreSQL, and the origin check. */
export function configure(app: NestExpressApplication): void {
  const config = app.get<ConfigService<Environment, true>>(ConfigService);
  const publicUrl = config.get<string>('PUBLIC_URL');
  const secure = publicUrl.startsWith('https:');
  app.setGlobalPrefix('api');
  app.enableShutdownHooks();
  if (secure) app.set('trust proxy', 1);
  app.use(
    helmet({
      // Emotion writes its styles at run time; scripts stay strict.
      contentSecurityPolicy: {
        directives: {
          'style-src': ["'self'", "'unsafe-inline'"],
          'upgrade-insecure-requests': secure ? [] : null,
        },
      },
      strictTransportSecurity: secure,
    }),
  );
  app.use(compression());
  app.use('/api', sameOrigin(publicUrl));
  const store = new (connectPgSimple(session))({
    pool: app.get(SessionPool).pool,
    tableName: 'session',
    pruneSessionInterval: 3600,
  });
  app.use(
    '/api',
    session({
      store,
      name: 'halfpitch',
      secret: config.get<string>('SESSION_SECRET'),
      resave: false,
      saveUninitialized: false,
      rolling: true,
      cookie: { httpOnly: true, sameSite: 'lax', secure, maxAge: THIRTY_DAYS_MS },
    }),
    passport.initialize(),
    passport.session(),
  );
  mountDocs(app);
  servePages(app, config.get<string>('WEB_ROOT'));
  app.getHttpServer().on('close', () => store.close());
}
