/** A plain page with the mail caught on this machine, for a browser with nothing else. */
import type { LocalMessage } from '../../model/contracts/mail';
import { word } from '../words';

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escape(text: string): string {
  return text.replace(/[&<>"']/g, (sign) => ENTITIES[sign] ?? sign);
}

function withLinks(text: string): string {
  return escape(text).replace(/https?:\/\/[^\s<]+/g, (link) => `<a href="${link}">${link}</a>`);
}

function writeMessage({ to, subject, text, at }: LocalMessage): string {
  return `<article>
<h2>${escape(subject)}</h2>
<p class="quiet">${escape(word('server.mailPage.to', { address: to }))} · <time datetime="${escape(at)}">${escape(at)}</time></p>
<pre>${withLinks(text)}</pre>
</article>`;
}

export function writeMailPage(messages: readonly LocalMessage[]): string {
  const title = escape(word('server.mailPage.title'));
  const list = messages.map(writeMessage).join('\n') || `<p>${escape(word('server.mailPage.none'))}</p>`;
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width">
<title>${title}</title>
<style>
body { margin: 0 auto; max-width: 44rem; padding: 24px; background: #f7f2e8; color: #24201b; font: 17px/1.5 Barlow, sans-serif; }
article { border-top: 1px solid #d9cfbd; padding: 8px 0; }
h1, h2 { font-weight: 600; font-size: 22px; }
pre { white-space: pre-wrap; overflow-wrap: anywhere; font: inherit; }
a { color: #8a4b1f; }
.quiet { color: #5e564b; }
</style>
</head>
<body>
<h1>${title}</h1>
<p class="quiet">${escape(word('server.mailPage.explain'))}</p>
${list}
</body>
</html>
`;
}
