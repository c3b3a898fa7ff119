import { createServer } from 'node:http';
import { answerApi } from './api.mjs';
import { answerWeb } from './web.mjs';

const pagePolicy =
  "default-src 'none'; style-src 'self'; frame-src 'self'; form-action 'self'; base-uri 'none'; frame-ancestors 'none'";

const everywhere = {
  'content-security-policy': pagePolicy,
  'x-content-type-options': 'nosniff',
  'referrer-policy': 'no-referrer',
  'cache-control': 'no-store',
};

/** Only a browser or program on this machine, and no form of another site. */
function isFromHere({ headers }) {
  const host = /^(127\.0\.0\.1|localhost)(:\d+)?$/.test(headers.host ?? '');
  return host && (!headers.origin || headers.origin === `http://${headers.host}`);
}

/** The mailbox over HTTP: pages for people, JSON and switches for tests. */
export function createHttp(context) {
  const answer = async (request) => {
    if (!isFromHere(request)) return { status: 403 };
    const url = new URL(request.url, 'http://127.0.0.1');
    return url.pathname.startsWith('/api/')
      ? answerApi(request, url, context)
      : answerWeb(request, url, context);
  };
  return createServer((request, response) => {
    answer(request)
      .catch((error) => {
        console.error(error);
        return { status: 500 };
      })
      .then(({ status, headers, body }) =>
        response.writeHead(status, { ...everywhere, ...headers }).end(body),
      );
  });
}
