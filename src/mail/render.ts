import type { Message } from './messages';

const escapes: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
const escaped = (text: string) => text.replace(/[&<>"']/g, (sign) => escapes[sign]);

/** A header is one line, whatever a name contains. */
const oneLine = (text: string) => text.replace(/[\r\n\u0000-\u001f\u007f]+/g, ' ').trim();

export type Rendered = { subject: string; text: string; html: string };

/** Text and HTML of the same words; nothing is fetched when it is read. */
export function render({ subject, paragraphs, link }: Message): Rendered {
  const closing = 'Chaffline';
  const text = [...paragraphs, ...(link ? [link.href] : []), closing].join('\n\n');
  const linkHtml = link ? [`<p><a href="${escaped(link.href)}">${escaped(link.words)}</a></p>`] : [];
  const html = [
    ...paragraphs.map((paragraph) => `<p>${escaped(paragraph)}</p>`),
    ...linkHtml,
    `<p>${closing}</p>`,
  ].join('\n');
  return {
    subject: oneLine(subject).slice(0, 300),
    text: `${text}\n`,
    html: `<!doctype html><html lang="en"><body>\n${html}\n</body></html>`,
  };
}
