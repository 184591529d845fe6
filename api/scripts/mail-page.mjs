import { createServer } from 'node:http';
import { headerOf, parseMessage } from './mime-message.mjs';

const SHOWN_AT_MOST = 200;
const OWN_PAGE_POLICY =
  "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'; base-uri 'none'; form-action 'none'";
// What a message brings along may not run, load or go anywhere.
const MESSAGE_POLICY = "sandbox; default-src 'none'; style-src 'unsafe-inline'; img-src data:";

const STYLE = `
:root { color-scheme: light dark; font: 16px/1.5 'Work Sans', system-ui, sans-serif; }
body { margin: 0 auto; max-width: 60rem; padding: 1.5rem 1rem 4rem; }
h1 { font-size: 1.5rem; line-height: 1.25; margin: 0 0 .25rem; overflow-wrap: anywhere; }
h2 { font-size: 1rem; margin: 2rem 0 .5rem; }
p { margin: 0 0 1rem; }
ol { list-style: none; margin: 1.5rem 0; padding: 0; }
li { border-top: 1px solid #8885; padding: .75rem 0; overflow-wrap: anywhere; }
li a { font-weight: 600; }
small, dt { color: #777; color: color-mix(in srgb, currentColor 70%, transparent); font-size: .875rem; }
dl { display: grid; gap: .25rem 1rem; grid-template-columns: minmax(7rem, auto) 1fr; }
dd { margin: 0; overflow-wrap: anywhere; }
pre { border: 1px solid #8885; border-radius: .5rem; overflow-x: auto; padding: 1rem; white-space: pre-wrap; }
iframe { background: #fff; border: 1px solid #8885; border-radius: .5rem; height: 40rem; width: 100%; }
@media (max-width: 30rem) { dl { grid-template-columns: 1fr; } dd { margin-bottom: .5rem; } }`;

const ENTITIES = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

function escaped(text) {
  return text.replace(/[&<>"']/g, (character) => ENTITIES[character]);
}

function page(title, body, refreshSeconds) {
  const refresh = refreshSeconds ? `<meta http-equiv="refresh" content="${refreshSeconds}">` : '';
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">${refresh}
<title>${escaped(title)}</title><style>${STYLE}</style></head><body><main>${body}</main></body></html>`;
}

function receivedAt(id) {
  return `${id.slice(0, 10)} ${id.slice(11, 19).replaceAll('-', ':')} UTC`;
}

function subjectOf(message) {
  return headerOf(message, 'subject') || '(no subject)';
}

function listPage(mailFolder) {
  const ids = mailFolder.ids();
  const items = ids.slice(0, SHOWN_AT_MOST).flatMap((id) => {
    const bytes = mailFolder.read(id);
    if (!bytes) return []; // removed since the folder was read
    const message = parseMessage(bytes);
    return `<li><a href="/messages/${id}">${escaped(subjectOf(message))}</a><br>
      to ${escaped(headerOf(message, 'to'))}<br><small>${receivedAt(id)}, from ${escaped(headerOf(message, 'from'))}</small></li>`;
  });
  const older =
    ids.length > SHOWN_AT_MOST ? `<p>${ids.length - SHOWN_AT_MOST} older ones are in the folder only.</p>` : '';
  const list = items.length > 0 ? `<ol>${items.join('')}</ol>${older}` : '<p>No message yet.</p>';
  return page('Mail', `<h1>Mail</h1><p>What Brimgate has sent. Nothing here left this computer.</p>${list}`, 5);
}

function messagePage(id, message) {
  const headers = message.headers.map(({ name, value }) => `<dt>${escaped(name)}</dt><dd>${escaped(value)}</dd>`);
  const attachments = message.attachments.map(
    ({ fileName, type, sizeBytes }) =>
      `<li>${escaped(fileName)} <small>${escaped(type)}, ${sizeBytes} bytes</small></li>`,
  );
  const sections = [
    `<p><a href="/">All mail</a></p><h1>${escaped(subjectOf(message))}</h1><small>Received ${receivedAt(id)}</small>`,
    message.html !== undefined &&
      `<h2>As HTML</h2><iframe sandbox title="The message as HTML" src="/messages/${id}/html"></iframe>`,
    message.text !== undefined && `<h2>As text</h2><pre>${escaped(message.text)}</pre>`,
    attachments.length > 0 && `<h2>Attachments</h2><ol>${attachments.join('')}</ol>`,
    `<h2>Headers</h2><dl>${headers.join('')}</dl><p><a href="/messages/${id}/source">Source</a></p>`,
  ];
  return page(subjectOf(message), sections.filter(Boolean).join('\n'));
}

const HTML = 'text/html; charset=utf-8';

function answer(mailFolder, path) {
  if (path === '/') return { type: HTML, body: listPage(mailFolder) };
  const [, id, part] = /^\/messages\/([^/]+)(?:\/(html|source))?$/.exec(path) ?? [];
  const bytes = id && mailFolder.read(id);
  if (!bytes)
    return { status: 404, type: HTML, body: page('Not found', '<h1>Not found</h1><p><a href="/">All mail</a></p>') };
  if (part === 'source') return { type: 'text/plain; charset=utf-8', body: bytes };
  const message = parseMessage(bytes);
  if (part === 'html') return { type: HTML, body: message.html ?? '', policy: MESSAGE_POLICY };
  return { type: HTML, body: messagePage(id, message) };
}

/** The page's server: a list at /, a message at /messages/<id>, its HTML and source below that. */
export function createMailPage(mailFolder) {
  return createServer((request, response) => {
    const { status = 200, type, body, policy = OWN_PAGE_POLICY } = answer(mailFolder, request.url.split('?')[0]);
    response.writeHead(status, {
      'Content-Type': type,
      'Content-Security-Policy': policy,
      'X-Content-Type-Options': 'nosniff',
      'Cache-Control': 'no-store',
    });
    response.end(request.method === 'HEAD' ? undefined : body);
  });
}
