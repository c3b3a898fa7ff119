import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import express from 'express';
import request from 'supertest';
import { servePages } from './web-pages';

describe('the web pages', () => {
  const folder = mkdtempSync(join(tmpdir(), 'pages-'));
  const built = join(folder, '.build', 'web');
  const app = express();

  beforeAll(() => {
    mkdirSync(join(built, 'assets'), { recursive: true });
    writeFileSync(join(built, 'index.html'), '<title>the page</title>');
    writeFileSync(join(built, 'assets', 'code-1a2b.js'), 'export {};');
    servePages(app as unknown as NestExpressApplication, built);
    app.get('/api/answer', (_request, response) => void response.json({ from: 'the API' }));
  });
  afterAll(() => rmSync(folder, { recursive: true }));

  it('answer any address with the page, below a folder whose name begins with a dot too', async () => {
    const page = await request(app).get('/chains/some-id?from=letter').expect(200);
    expect(page.text).toContain('the page');
    expect(page.headers['cache-control']).toBe('no-cache');
  });

  it('keep what carries a hash in its name for a year', async () => {
    const code = await request(app).get('/assets/code-1a2b.js').expect(200);
    expect(code.headers['cache-control']).toContain('immutable');
  });

  it('leave the API and missing assets alone', async () => {
    await request(app).get('/api/answer').expect(200, { from: 'the API' });
    await request(app).get('/api/nothing').expect(404);
    await request(app).get('/assets/old-9z.js').expect(404);
    await request(app).post('/chains').expect(404);
  });
});
