import { createRequire } from 'node:module';
import { join } from 'node:path';

/**
 * One night's work of the built program, in a process of its own: node nightly-worker.mjs DIST WORKSHOP_ID.
 * Prints one JSON line: wall and CPU seconds, and the largest memory the process ever had.
 */
async function main([dist, workshopId]) {
  const require = createRequire(join(dist, 'main.js'));
  require('reflect-metadata');
  const { NestFactory } = require('@nestjs/core');
  const { AppModule } = require(join(dist, 'app.module.js'));
  const { readEnvironment } = require(join(dist, 'config/environment.js'));
  const { EstimatesTasks } = require(join(dist, 'estimates/estimates.tasks.js'));
  const app = await NestFactory.createApplicationContext(AppModule.in(readEnvironment(process.env)), {
    logger: ['error', 'fatal'],
  });
  const began = performance.now();
  const cpu = process.cpuUsage();
  await app.get(EstimatesTasks, { strict: false }).estimateWorkshop({ workshopId });
  const { user, system } = process.cpuUsage(cpu);
  const seconds = (performance.now() - began) / 1000;
  await app.close();
  const peakMb = process.resourceUsage().maxRSS / 1024;
  console.log(JSON.stringify({ seconds, cpuSeconds: (user + system) / 1e6, peakMb }));
}

await main(process.argv.slice(2));
