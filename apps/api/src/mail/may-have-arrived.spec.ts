import { createServer, Server, Socket } from 'node:net';
import type { AddressInfo } from 'node:net';
import { createTransport } from 'nodemailer';
import { mayHaveArrived } from './may-have-arrived';

const letter = { from: 'a@shop.example', to: 'b@rider.example', subject: 'S', text: 'T' };

/** What sending fails with, at a server that plays its part over one connection. */
async function failure(play: (socket: Socket) => void): Promise<unknown> {
  const server: Server = createServer(play);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  const transport = createTransport({ host: '127.0.0.1', port, ignoreTLS: true });
  const error: unknown = await transport.sendMail(letter).catch((e: unknown) => e);
  server.close();
  return error;
}

/** Answers each command with what `answers` has for its first word; null ends the connection. */
const dialogue = (answers: Record<string, string | null>) => (socket: Socket) => {
  socket.on('error', () => undefined);
  socket.write('220 hello\r\n');
  socket.on('data', (data) => {
    const text = data.toString();
    const word = text.endsWith('\r\n.\r\n') ? 'END' : text.slice(0, 4).toUpperCase();
    const answer = word in answers ? answers[word] : '250 ok';
    if (answer === null) socket.destroy();
    else socket.write(`${answer}\r\n`);
  });
};

it('cannot when nobody listens', async () => {
  const error: unknown = await createTransport({ host: '127.0.0.1', port: 1 })
    .sendMail(letter)
    .catch((e: unknown) => e);
  expect(mayHaveArrived(error)).toBe(false);
});

it.each([
  ['the address', { RCPT: '550 no' }],
  ['the letter for now', { DATA: '354 go', END: '451 later' }],
])('cannot when the server refuses %s', async (_, answers) => {
  expect(mayHaveArrived(await failure(dialogue(answers)))).toBe(false);
});

it('may when the connection ends after the letter was handed over', async () => {
  expect(mayHaveArrived(await failure(dialogue({ DATA: '354 go', END: null })))).toBe(true);
});
