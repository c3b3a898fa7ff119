import { QueryClient } from '@tanstack/react-query';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { chooseFirstPage } from './first-page';

const open = [{ path: 'sign-in' }, { path: 'reset/:token' }];
const answer = (status: number) => () =>
  Promise.resolve(
    new Response(JSON.stringify({ type: 'about:blank', title: 'No', status, detail: 'No.' }), { status }),
  );

async function startAt(address: string, fetched: () => Promise<Response>) {
  window.history.replaceState(null, '', address);
  const asked = vi.spyOn(window, 'fetch').mockImplementation(fetched);
  await chooseFirstPage(new QueryClient(), open);
  return { asked: asked.mock.calls.length, at: window.location.pathname + window.location.search };
}

afterEach(() => vi.restoreAllMocks());

describe('the first page', () => {
  it('is the sign-in for who is not signed in, and remembers the way', async () => {
    expect((await startAt('/', answer(401))).at).toBe('/sign-in');
    expect((await startAt('/chains/7?part=2', answer(401))).at).toBe('/sign-in?to=%2Fchains%2F7%3Fpart%3D2');
  });

  it('asks nothing for pages that are for everyone', async () => {
    expect(await startAt('/reset/abc', answer(401))).toEqual({ asked: 0, at: '/reset/abc' });
  });

  it('stays when the server is in trouble or away', async () => {
    expect((await startAt('/due', answer(500))).at).toBe('/due');
    expect((await startAt('/due', () => Promise.reject(new TypeError('offline')))).at).toBe('/due');
  });
});
