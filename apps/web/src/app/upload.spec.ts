import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { upload } from './upload';

/** Stands in for the browser's own request, which jsdom can't make without a server. */
class Call {
  static last: Call;
  upload: { onprogress?: (event: { loaded: number; total: number }) => void } = {};
  status = 0;
  responseText = '';
  onload?: () => void;
  onerror?: () => void;
  onabort?: () => void;
  open = vi.fn();
  setRequestHeader = vi.fn();
  send = vi.fn();
  abort = () => this.onabort?.();
  constructor() {
    Call.last = this;
  }
  answer(status: number, body: unknown) {
    this.status = status;
    this.responseText = JSON.stringify(body);
    this.onload?.();
  }
}

const schema = z.object({ added: z.number() });
beforeEach(() => vi.stubGlobal('XMLHttpRequest', Call));
afterEach(() => vi.unstubAllGlobals());

describe('upload', () => {
  it('tells how far it is, then what the server answered', async () => {
    const onProgress = vi.fn();
    const form = new FormData();
    const result = upload('/imports', form, { schema, onProgress });
    expect(Call.last.open).toHaveBeenCalledWith('POST', '/api/imports');
    expect(Call.last.send).toHaveBeenCalledWith(form);
    Call.last.upload.onprogress?.({ loaded: 5, total: 20 });
    Call.last.upload.onprogress?.({ loaded: 0, total: 0 });
    Call.last.answer(201, { added: 12 });
    expect(await result).toEqual({ added: 12 });
    expect(onProgress.mock.calls).toEqual([[0.25], [0]]);
  });

  it('fails as the server says, without a connection, and when it is stopped', async () => {
    const refused = upload('/imports', new FormData(), { schema });
    Call.last.answer(413, { type: 'about:blank', title: 'Too large', status: 413, detail: 'At most 20 MB.' });
    await expect(refused).rejects.toMatchObject({ status: 413, detail: 'At most 20 MB.' });
    const lost = upload('/imports', new FormData(), { schema });
    Call.last.onerror?.();
    await expect(lost).rejects.toMatchObject({ status: 0 });
    const stop = new AbortController();
    const stopped = upload('/imports', new FormData(), { schema, signal: stop.signal });
    stop.abort();
    await expect(stopped).rejects.toHaveProperty('name', 'AbortError');
  });
});
