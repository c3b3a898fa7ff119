import { createServer } from 'node:net';

function listenOnce(port) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(undefined));
    server.listen({ port, host: '127.0.0.1', exclusive: true }, () => {
      const chosen = server.address().port;
      server.close(() => resolve(chosen));
    });
  });
}

/** Whether nothing listens on this port of the loopback address. */
export async function isFree(port) {
  return (await listenOnce(port)) !== undefined;
}

/** The preferred port if it is free, otherwise any free one. */
export async function freePort(preferred = 0) {
  const wished = preferred > 0 && preferred < 65_536 ? await listenOnce(preferred) : undefined;
  return wished ?? listenOnce(0);
}
