import { afterEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { request } from './api';
import { ApiProblem, errorSentence, isSignedOut } from './api-problem';

const schema = z.object({ name: z.string() });

function answer(status: number, body: string) {
  const fetched = vi.fn((_url: string, _options: RequestInit) =>
    Promise.resolve(new Response(body, { status })),
  );
  vi.stubGlobal('fetch', fetched);
  return fetched;
}

afterEach(() => vi.unstubAllGlobals());

describe('request', () => {
  it('asks on the same site, leaves out what is empty, and reads the answer by its schema', async () => {
    const fetched = answer(200, '{"name":"Alder","more":1}');
    expect(
      await request('/riders', { schema, query: { page: 2, search: '', from: undefined, on: false } }),
    ).toEqual({
      name: 'Alder',
    });
    const [url, options] = fetched.mock.calls[0]!;
    expect(url).toBe('/api/riders?page=2&on=false');
    expect(options).toMatchObject({ method: 'GET', credentials: 'same-origin', body: undefined });
  });

  it('sends JSON under its key', async () => {
    const fetched = answer(201, '{"name":"Alder"}');
    await request('/rides', { method: 'POST', body: { km: 12 }, idempotencyKey: 'k1', schema });
    const { headers, body } = fetched.mock.calls[0]![1];
    expect(body).toBe('{"km":12}');
    expect(Object.fromEntries(headers as Headers)).toMatchObject({
      'content-type': 'application/json',
      'idempotency-key': 'k1',
    });
  });

  // RFC 9457, section 3.1: type, title, status, detail (read).
  it('carries the server’s problem details', async () => {
    const errors = [{ path: 'day', message: 'Give the day.' }];
    answer(
      400,
      JSON.stringify({ type: 'about:blank', title: 'Check', status: 400, detail: 'Give the day.', errors }),
    );
    const error = await request('/rides', { schema }).catch((e: unknown) => e);
    expect(error).toBeInstanceOf(ApiProblem);
    expect(error).toMatchObject({ status: 400, title: 'Check', errors });
    expect(errorSentence(error)).toBe('Give the day.');
  });

  it('knows who is signed out', async () => {
    answer(
      401,
      JSON.stringify({ type: 'about:blank', title: 'Not signed in', status: 401, detail: 'Sign in.' }),
    );
    expect(isSignedOut(await request('/rides', { schema }).catch((e: unknown) => e))).toBe(true);
    expect(isSignedOut(new Error('401'))).toBe(false);
  });

  it('has a sentence for a broken gateway, a strange answer and no answer', async () => {
    answer(502, '<html>Bad gateway</html>');
    await expect(request('/x', { schema })).rejects.toMatchObject({ status: 502, title: 'It did not work' });
    answer(200, '{"name":1}');
    await expect(request('/x', { schema })).rejects.toMatchObject({ title: 'Unexpected answer' });
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    await expect(request('/x', { schema })).rejects.toMatchObject({ status: 0, title: 'No connection' });
  });

  it('lets a stopped call stay a stopped call', async () => {
    const stop = new AbortController();
    stop.abort();
    vi.stubGlobal('fetch', () => Promise.reject(new DOMException('stopped', 'AbortError')));
    await expect(request('/x', { schema, signal: stop.signal })).rejects.toHaveProperty('name', 'AbortError');
  });
});
