import { buffer } from 'node:stream/consumers';
import { setTimeout as sleep } from 'node:timers/promises';
import { SMTPServer } from 'smtp-server';

const largest = 25 * 1024 * 1024;

const answer = (responseCode, text) => Object.assign(new Error(text), { responseCode });

const refusals = {
  refuse: () => answer(550, '5.1.1 Refused: this mailbox was told to refuse'),
  'try-later': () => answer(451, '4.3.0 Not now: this mailbox was told to put off'),
};

/** An SMTP server on the loopback address that keeps what arrives, as `behaviour` will have it. */
export function createSmtp({ store, behaviour }) {
  const sockets = new Map();

  async function keep(stream, session) {
    const raw = await buffer(stream);
    const { mode, delayMs = 0 } = session.treatment;
    if (stream.sizeExceeded) throw answer(552, `5.3.4 Too large: at most ${largest} bytes`);
    if (mode === 'drop') return sockets.get(session.remotePort)?.destroy();
    if (mode === 'delay') await sleep(delayMs);
    const { mailFrom, rcptTo } = session.envelope;
    await store.add(
      { from: mailFrom ? mailFrom.address : '', to: rcptTo.map(({ address }) => address) },
      raw,
    );
  }

  const smtp = new SMTPServer({
    name: 'halfpitch-mail-fake',
    banner: 'keeps letters, delivers none',
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: largest,
    logger: false,
    onMailFrom(_address, session, callback) {
      session.treatment = behaviour.next();
      callback();
    },
    onRcptTo(_address, session, callback) {
      callback(refusals[session.treatment.mode]?.());
    },
    onData(stream, session, callback) {
      keep(stream, session).then(() => callback(null, 'kept'), callback);
    },
  });
  smtp.server.on('connection', (socket) => {
    const port = socket.remotePort;
    sockets.set(port, socket);
    socket.once('close', () => sockets.delete(port));
  });
  smtp.on('error', ({ message, code }) => {
    if (code !== 'ECONNRESET' && code !== 'EPIPE') console.error(`SMTP: ${message}`);
  });
  return smtp;
}
