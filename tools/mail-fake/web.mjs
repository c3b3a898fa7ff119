import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { listPage, messagePage } from './pages.mjs';

const htmlPage = (body) => ({ status: 200, headers: { 'content-type': 'text/html; charset=utf-8' }, body });
const missing = () => ({ status: 404, headers: { 'content-type': 'text/plain' }, body: 'No such letter.\n' });

/** A letter's html: no script, nothing fetched, links open in a window of their own. */
const letterPolicy =
  "default-src 'none'; img-src data:; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'; " +
  "frame-ancestors 'self'; sandbox allow-popups allow-popups-to-escape-sandbox";

function letter(message) {
  if (!message.html) return missing();
  const page = htmlPage(message.html.replace(/<a\s/gi, '<a target="_blank" rel="noreferrer" '));
  page.headers['content-security-policy'] = letterPolicy;
  return page;
}

function attachment(message, index) {
  const file = message.attachments[Number(index)];
  if (!file) return missing();
  const name = encodeURIComponent(file.filename);
  const headers = {
    'content-type': 'application/octet-stream',
    'content-disposition': `attachment; filename*=UTF-8''${name}`,
  };
  return { status: 200, headers, body: file.content };
}

/** The pages for people. Returns what to answer. */
export async function answerWeb(request, url, { store, behaviour, here }) {
  const [, what, id, part, index] = url.pathname.split('/');
  if (request.method === 'POST' && what === 'clear') {
    await store.clear();
    return { status: 303, headers: { location: '/' } };
  }
  if (request.method !== 'GET') return { status: 405 };
  if (what === '') {
    const to = url.searchParams.get('to') || undefined;
    return htmlPage(listPage(store.list({ to }), { to, mode: behaviour.now.mode }));
  }
  if (what === 'look.css') {
    return {
      status: 200,
      headers: { 'content-type': 'text/css' },
      body: readFileSync(join(here, 'look.css')),
    };
  }
  const message = what === 'messages' && id ? store.get(id) : undefined;
  if (!message) return missing();
  if (part === 'html') return letter(message);
  if (part === 'attachments') return attachment(message, index);
  return htmlPage(messagePage(message));
}
