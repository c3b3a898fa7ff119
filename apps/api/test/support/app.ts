import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import type { Session } from '@halfpitch/contracts';
import request from 'supertest';
import { MailFake, startMailFake } from './mail-fake';
import { AppModule } from '../../src/app.module';
import { readEnvironment } from '../../src/config/environment';
import { configure } from '../../src/configure';
import { scratchDatabase } from './database';

export interface BootedApp {
  app: NestExpressApplication;
  mail: MailFake;
  databaseUrl: string;
  ownerUrl: string;
  /** A browser of its own: keeps its cookies. */
  browser(): ReturnType<typeof request.agent>;
  close(): Promise<void>;
}

/** The whole program on a database and an SMTP server of its own, with real migrations, roles both. */
export async function bootApp(environment: Record<string, string> = {}): Promise<BootedApp> {
  const database = await scratchDatabase();
  const mail = await startMailFake();
  const env = readEnvironment({
    NODE_ENV: 'test',
    ROLE: 'both',
    PORT: '0',
    PUBLIC_URL: 'http://127.0.0.1:4190',
    DATABASE_URL: database.url,
    SMTP_URL: `smtp://127.0.0.1:${mail.smtpPort}`,
    MAIL_FROM: 'Test workshop <post@workshop.example>',
    TEST_HOOKS: '1',
    ...environment,
  });
  const module = await Test.createTestingModule({ imports: [AppModule.in(env)] }).compile();
  const app = module.createNestApplication<NestExpressApplication>({ logger: ['error', 'fatal'] });
  configure(app);
  await app.listen(0, '127.0.0.1');
  return {
    app,
    mail,
    databaseUrl: database.url,
    ownerUrl: database.ownerUrl,
    browser: () => request.agent(app.getHttpServer()),
    close: async () => {
      await app.close();
      await mail.stop();
      await database.drop();
    },
  };
}

export const PASSWORD = 'a long enough password';

/** A browser signed in as the owner of a new workshop. */
export async function ownerOfNewWorkshop(booted: BootedApp, name: string) {
  const browser = booted.browser();
  const email = `owner@${name.toLowerCase().replaceAll(' ', '-')}.example`;
  await browser
    .post('/api/workshops')
    .send({
      workshopName: name,
      town: 'Tarnwick',
      timeZone: 'Europe/Berlin',
      name: 'Olive Owner',
      email,
      password: PASSWORD,
    })
    .expect(201);
  const session = (await browser.get('/api/session').expect(200)).body as Session;
  return { browser, email, session };
}

/** A browser signed in as somebody the owner invited, by the link in the letter. */
export async function invited(
  booted: BootedApp,
  owner: Awaited<ReturnType<typeof ownerOfNewWorkshop>>['browser'],
  who: { name: string; email: string; role: 'mechanic' | 'desk' | 'owner' },
) {
  await owner.post('/api/staff').send(who).expect(201);
  const letter = await booted.mail.letterTo(who.email);
  const token = /\/invitation\/([\w-]+)/.exec(letter.text)?.[1];
  const browser = booted.browser();
  await browser.post(`/api/invitations/${token}`).send({ name: who.name, password: PASSWORD }).expect(201);
  return browser;
}
