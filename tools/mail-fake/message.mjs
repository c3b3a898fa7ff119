import { simpleParser } from 'mailparser';

const unfolded = (line) =>
  line
    .replace(/\r?\n\s+/g, ' ')
    .slice(line.indexOf(':') + 1)
    .trim();

function headersOf(headerLines) {
  const headers = {};
  for (const { key, line } of headerLines) {
    headers[key] = key in headers ? `${headers[key]}\n${unfolded(line)}` : unfolded(line);
  }
  return headers;
}

/** Reads a message as it came over SMTP: `{ id, receivedAt, envelope }` and its raw bytes. */
export async function readMessage(slip, raw) {
  const mail = await simpleParser(raw);
  return {
    ...slip,
    from: mail.from?.text ?? slip.envelope.from,
    to: slip.envelope.to,
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    html: mail.html || undefined,
    headers: headersOf(mail.headerLines),
    attachments: mail.attachments.map(({ filename, contentType, size, content }, index) => ({
      index,
      filename: filename ?? `attachment-${index + 1}`,
      contentType,
      size,
      content,
    })),
  };
}

/** One line of the list. */
export function summaryOf({ id, receivedAt, from, to, subject, attachments }) {
  return { id, receivedAt, from, to, subject, attachments: attachments.length };
}

/** The whole message for the wire, attachments by address. */
export function detailOf(message) {
  const attachments = message.attachments.map(({ content: _content, ...about }) => ({
    ...about,
    href: `/messages/${message.id}/attachments/${about.index}`,
  }));
  return { ...message, attachments };
}
