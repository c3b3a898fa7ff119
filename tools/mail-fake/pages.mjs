import { html, toText } from './html.mjs';

const when = (iso) => html`<time datetime="${iso}">${iso.slice(0, 10)} ${iso.slice(11, 19)} UTC</time>`;

function page(title, body) {
  return `<!doctype html>\n${toText(
    html`<html lang="en-GB">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <title>${title} – Halfpitch mailbox</title>
        <link rel="stylesheet" href="/look.css" />
      </head>
      <body>
        <header>
          <a class="mark" href="/">Halfpitch <span>mailbox</span></a>
          <p>Everything the workshop sends lands here and goes no further.</p>
        </header>
        <main>${body}</main>
      </body>
    </html>`,
  )}`;
}

const words = {
  accept: 'taking in every letter',
  refuse: 'refusing every letter for good (550)',
  'try-later': 'asking senders to try later (451)',
  delay: 'answering late',
  drop: 'dropping the line',
};

const row = ({ id, receivedAt, to, subject, attachments }) =>
  html`<li>
    <a href="/messages/${id}">
      <strong>${subject || '(no subject)'}</strong>
      <span>to ${to.join(', ')}</span>
      <span class="quiet"
        >${when(receivedAt)}${attachments.length > 0 && html` · ${attachments.length} attached`}</span
      >
    </a>
  </li>`;

/** The list of letters, newest first. */
export function listPage(messages, { to, mode }) {
  const count = `${messages.length} ${messages.length === 1 ? 'letter' : 'letters'}`;
  const none = html`<p class="empty">Nothing has arrived${to && html` for ${to}`} yet.</p>`;
  return page(
    count,
    html`<form class="bar" method="get" action="/">
        <label for="to">Recipient</label>
        <input id="to" name="to" type="search" value="${to ?? ''}" placeholder="any" autocomplete="off" />
        <button>Look</button>
      </form>
      <h1>${count}</h1>
      <p class="quiet">The server is ${words[mode]}.</p>
      ${
        messages.length > 0
          ? html`<ol class="letters">
              ${messages.map(row)}
            </ol>`
          : none
      }
      ${messages.length > 0 && html`<form method="post" action="/clear"><button>Delete all letters</button></form>`}`,
  );
}

const attachment = (id) => (file) =>
  html`<li>
    <a href="/messages/${id}/attachments/${file.index}" download="${file.filename}">${file.filename}</a>
    <span class="quiet">${file.contentType}, ${Math.ceil(file.size / 1024)} kB</span>
  </li>`;

/** One letter: as it looks, as plain text, its headers, its attachments. */
export function messagePage(message) {
  const { id, subject, from, to, receivedAt, text, headers, attachments } = message;
  const headerRows = Object.entries(headers).map(
    ([name, value]) =>
      html`<dt>${name}</dt>
        <dd>${value}</dd>`,
  );
  return page(
    subject,
    html`<p><a href="/">All letters</a></p>
      <h1>${subject || '(no subject)'}</h1>
      <p>From ${from}<br />To ${to.join(', ')}<br /><span class="quiet">${when(receivedAt)}</span></p>
      ${
        attachments.length > 0 &&
        html`<ul class="files">
          ${attachments.map(attachment(id))}
        </ul>`
      }
      ${
        message.html &&
        html`<iframe
          title="The letter as it looks"
          src="/messages/${id}/html"
          sandbox="allow-popups allow-popups-to-escape-sandbox"
        ></iframe>`
      }
      <details ${!message.html && html`open`}>
        <summary>Plain text</summary>
        <pre>${text}</pre>
      </details>
      <details>
        <summary>Headers</summary>
        <dl>${headerRows}</dl>
      </details>`,
  );
}
