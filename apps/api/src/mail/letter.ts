import type { Letter } from './mail.service';

/** What every letter consists of: paragraphs, at most one link to follow, and a closing line. */
export interface LetterText {
  to: string;
  subject: string;
  greeting: string;
  paragraphs: string[];
  link?: { label: string; url: string };
  closing: string;
  /** A small link below everything. */
  footer?: { label: string; url: string };
  headers?: Record<string, string>;
}

const escape = (text: string) => text.replace(/[&<>"']/g, (c) => `&#${c.charCodeAt(0)};`);

/** The same letter as text and as html; colours are the product's paper, ink and blued steel. */
export function writeLetter({
  to,
  subject,
  greeting,
  paragraphs,
  link,
  closing,
  footer,
  headers,
}: LetterText): Letter {
  const written = (to?: { label: string; url: string }) => (to ? [`${to.label}: ${to.url}`] : []);
  const text = [greeting, ...paragraphs, ...written(link), closing, ...written(footer)].join('\n\n');
  const p = (inner: string, style = '') => `<p style="margin:0 0 16px;${style}">${inner}</p>`;
  const button = link
    ? p(
        `<a href="${escape(link.url)}" style="display:inline-block;background:#2c4a6b;color:#ffffff;padding:12px 20px;border-radius:6px;text-decoration:none">${escape(link.label)}</a>`,
      )
    : '';
  const html = `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escape(subject)}</title></head>
<body style="margin:0;background:#f7f3ea;color:#26282b;font:16px/1.5 'Source Sans 3',Helvetica,Arial,sans-serif">
<div style="max-width:560px;margin:0 auto;padding:32px 24px">
${p(escape(greeting), 'font-size:18px')}
${paragraphs.map((paragraph) => p(escape(paragraph))).join('\n')}
${button}
${p(escape(closing).replaceAll('\n', '<br>'), 'color:#5b5e63;font-size:14px')}
${footer ? p(`<a href="${escape(footer.url)}" style="color:#5b5e63">${escape(footer.label)}</a>`, 'font-size:14px') : ''}
</div></body></html>`;
  return { to, subject, text: `${text}\n`, html, headers };
}
