import { json } from 'node:stream/consumers';
import { detailOf, summaryOf } from './message.mjs';

const reply = (status, body) => ({
  status,
  headers: { 'content-type': 'application/json; charset=utf-8' },
  body: JSON.stringify(body),
});
const missing = () => reply(404, { title: 'No such message' });

/** The JSON side: messages and the switches. Returns what to answer, or nothing for other addresses. */
export async function answerApi(request, url, { store, behaviour }) {
  const { method } = request;
  const [, , what, id] = url.pathname.split('/');
  if (what === 'messages' && !id && method === 'GET') {
    const messages = store.list({ to: url.searchParams.get('to') ?? undefined }).map(summaryOf);
    return reply(200, { messages, total: messages.length });
  }
  if (what === 'messages' && !id && method === 'DELETE') {
    await store.clear();
    return { status: 204 };
  }
  if (what === 'messages' && method === 'GET') {
    const message = store.get(id);
    return message ? reply(200, detailOf(message)) : missing();
  }
  if (what === 'behaviour' && method === 'GET') return reply(200, behaviour.now);
  if (what === 'behaviour' && method === 'PUT') {
    const complaint = behaviour.change(await json(request).catch(() => undefined));
    return complaint
      ? reply(400, { title: 'No such behaviour', detail: complaint })
      : reply(200, behaviour.now);
  }
  return reply(404, { title: 'Nothing at this address' });
}
