import { once } from 'node:events';
import { createServer } from 'node:net';

const host = '127.0.0.1';

/** Holds a port of the loopback address, or says nothing when it is taken or not allowed. */
async function hold(port) {
  const server = createServer();
  server.listen({ port, host, exclusive: true });
  try {
    await once(server, 'listening');
    return server;
  } catch {
    return undefined;
  }
}

const letGo = (server) => new Promise((resolve) => server.close(resolve));

/** Whether nothing listens on this port of the loopback address. */
export async function isFree(port) {
  const server = await hold(port);
  if (server) await letGo(server);
  return server !== undefined;
}

/** For each wish that port if it is free, otherwise any free one; 0 wishes for any. All differ. */
export async function freePorts(...wishes) {
  const servers = [];
  for (const wish of wishes) servers.push((wish < 65_536 && (await hold(wish))) || (await hold(0)));
  const ports = servers.map((server) => server.address().port);
  await Promise.all(servers.map(letGo));
  return ports;
}
