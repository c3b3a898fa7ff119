import { once } from 'node:events';
import { dirname } from 'node:path';
import { fileURLToPath } from 'node:url';
import { Behaviour } from './behaviour.mjs';
import { createHttp } from './http.mjs';
import { createSmtp } from './smtp.mjs';
import { Store } from './store.mjs';

const host = '127.0.0.1';

/** The mail server and its mailbox: SMTP_PORT, MAILBOX_PORT (0 or none: any free one), MAILBOX_DIR, MAILBOX_MOST. */
async function main({ SMTP_PORT = '0', MAILBOX_PORT = '0', MAILBOX_DIR, MAILBOX_MOST = '1000' }) {
  const store = new Store({ dir: MAILBOX_DIR, most: Number(MAILBOX_MOST) });
  await store.open();
  const behaviour = new Behaviour();
  const smtp = createSmtp({ store, behaviour });
  const http = createHttp({ store, behaviour, here: dirname(fileURLToPath(import.meta.url)) });
  smtp.listen(Number(SMTP_PORT), host);
  http.listen(Number(MAILBOX_PORT), host);
  await Promise.all([once(smtp.server, 'listening'), once(http, 'listening')]);
  for (const signal of ['SIGINT', 'SIGTERM']) process.once(signal, () => process.exit(0));
  console.log(`SMTP_URL=smtp://${host}:${smtp.server.address().port}`);
  console.log(`MAILBOX_URL=http://${host}:${http.address().port}`);
}

main(process.env).catch((error) => {
  console.error(error.code === 'EADDRINUSE' ? `Port ${error.port} is taken.` : error);
  process.exit(1);
});
