import { mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { demoSignIns, loadDemo, migrate, startDatabase } from './database.mjs';
import { startService } from './service.mjs';
import { sessionSecret } from './settings.mjs';

const loopback = '127.0.0.1';

/** Variables of the caller's that must not leak into a server of ours. */
const notInherited = { DATABASE_OWNER_URL: undefined, TEST_HOOKS: undefined, DATABASE_POOL: undefined };

/**
 * Starts the built product with everything behind it: database, migrations, demo, mail, server.
 * Each part is handed to `life`, which stops them in the opposite order.
 * @param options root of the checkout, `dist` with the build, `dir` for the data, `ports`
 *   { http, mailbox, smtp, postgres }, `stage` that announces each step, `throwAway` and `testHooks` for tests
 */
export async function runProduct({
  root,
  dist,
  dir,
  ports,
  life,
  stage,
  throwAway = false,
  testHooks = false,
}) {
  const api = join(dist, 'apps/api/apps/api/src');
  const logs = join(dir, 'logs');
  const baseUrl = `http://${loopback}:${ports.http}`;
  const mailboxUrl = `http://${loopback}:${ports.mailbox}`;
  mkdirSync(logs, { recursive: true });
  let database;
  await stage('PostgreSQL', async () => {
    database = await startDatabase({ dir, port: ports.postgres, throwAway, life });
    return database.isNew ? `new cluster on port ${ports.postgres}` : `port ${ports.postgres}`;
  });
  const base = { ...process.env, ...notInherited, NODE_ENV: 'development' };
  const owner = { ...base, DATABASE_URL: database.urls.app, DATABASE_OWNER_URL: database.urls.owner };
  const tools = { cli: join(api, 'cli'), dir, env: owner };
  await stage('Database structure', async () => void (await migrate(tools)));
  await stage('Demo', (progress) => loadDemo({ ...tools, isNew: database.isNew, onLine: progress }));
  await stage('Mail', () =>
    startService({
      name: 'The mail server',
      script: join(root, 'tools/mail-fake/main.mjs'),
      env: {
        ...process.env,
        SMTP_PORT: ports.smtp,
        MAILBOX_PORT: ports.mailbox,
        MAILBOX_DIR: throwAway ? undefined : join(dir, 'mailbox'),
      },
      log: join(logs, 'mail.log'),
      readyUrl: `${mailboxUrl}/api/behaviour`,
      life,
    }),
  );
  await stage('Server and scheduler', () =>
    startService({
      name: 'The server',
      script: join(api, 'main.js'),
      env: {
        ...base,
        ROLE: 'both',
        HOST: loopback,
        PORT: ports.http,
        PUBLIC_URL: baseUrl,
        DATABASE_URL: database.urls.app,
        SESSION_SECRET: sessionSecret(dir),
        SMTP_URL: `smtp://${loopback}:${ports.smtp}`,
        MAIL_FROM: 'Halfpitch <post@halfpitch.example>',
        WEB_ROOT: resolve(dist, 'apps/web'),
        ...(testHooks ? { TEST_HOOKS: '1' } : {}),
      },
      log: join(logs, 'server.log'),
      readyUrl: `${baseUrl}/api/ready`,
      life,
    }),
  );
  return { baseUrl, mailboxUrl, databaseUrls: database.urls, signIns: await demoSignIns(tools) };
}
