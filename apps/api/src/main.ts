import 'reflect-metadata';
import { ConsoleLogger } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module';
import { readEnvironment } from './config/environment';
import { configure } from './configure';

/** One program, three roles: http, scheduler, or both (ROLE). */
async function main(): Promise<void> {
  const env = readEnvironment(process.env);
  const logger = new ConsoleLogger({
    json: env.NODE_ENV === 'production',
    logLevels: ['log', 'warn', 'error', 'fatal'],
  });
  if (env.ROLE === 'scheduler') {
    const app = await NestFactory.createApplicationContext(AppModule.in(env), { logger });
    app.enableShutdownHooks();
    return;
  }
  const app = await NestFactory.create<NestExpressApplication>(AppModule.in(env), { logger });
  configure(app);
  await app.listen(env.PORT, env.HOST);
}

main().catch((error: Error) => {
  console.error(error.message);
  process.exit(1);
});
