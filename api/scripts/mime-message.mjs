// Reads an e-mail as it came over the wire, enough to show it: headers, encoded words, multiparts, transfer encodings.

const CRLF_OR_LF = /\r?\n/;

function decodeCharset(bytes, charset) {
  try {
    return new TextDecoder(charset || 'utf-8').decode(bytes);
  } catch {
    return bytes.toString('latin1'); // a charset nobody knows: show what can be shown
  }
}

function decodeQuotedPrintable(text) {
  const joined = text.replace(/[ \t]+(?=\r?\n|$)/g, '').replace(/=\r?\n/g, '');
  return Buffer.from(
    joined.replace(/=([0-9A-Fa-f]{2})/g, (_, hex) => String.fromCharCode(parseInt(hex, 16))),
    'latin1',
  );
}

function decodeTransfer(text, encoding) {
  if (encoding === 'base64') return Buffer.from(text, 'base64');
  if (encoding === 'quoted-printable') return decodeQuotedPrintable(text);
  return Buffer.from(text, 'latin1');
}

/** RFC 2047: =?charset?Q|B?text?=. Blanks between two encoded words belong to neither. */
export function decodeWords(value) {
  return value
    .replace(/(\?=)\s+(?==\?)/g, '$1')
    .replace(/=\?([^?*]+)(?:\*[^?]*)?\?([QBqb])\?([^?]*)\?=/g, (_, charset, kind, text) => {
      const isQ = kind.toUpperCase() === 'Q';
      return decodeCharset(
        isQ ? decodeQuotedPrintable(text.replaceAll('_', ' ')) : Buffer.from(text, 'base64'),
        charset,
      );
    });
}

function splitHead(raw) {
  const gap = /\r?\n\r?\n/.exec(raw);
  return gap ? [raw.slice(0, gap.index), raw.slice(gap.index + gap[0].length)] : [raw, ''];
}

function parseHeaders(head) {
  const headers = [];
  for (const line of head.split(CRLF_OR_LF)) {
    const last = headers.at(-1);
    const colon = line.indexOf(':');
    if (/^[ \t]/.test(line) && last) last.value += ` ${line.trim()}`;
    else if (colon > 0) headers.push({ name: line.slice(0, colon), value: line.slice(colon + 1).trim() });
  }
  // Header text beyond ASCII is UTF-8 (SMTPUTF8); the message was read byte by byte.
  return headers.map(({ name, value }) => ({
    name,
    value: decodeWords(Buffer.from(value, 'latin1').toString('utf8')),
  }));
}

export function headerOf({ headers }, name) {
  return headers.find((header) => header.name.toLowerCase() === name)?.value ?? '';
}

function parameter(value, name) {
  const match = new RegExp(`;\\s*${name}\\s*=\\s*(?:"([^"]*)"|([^;\\s]+))`, 'i').exec(value);
  return match?.[1] ?? match?.[2] ?? '';
}

function multipartBodies(body, boundary) {
  const pieces = `\r\n${body}`.split(`\n--${boundary}`).slice(1);
  const end = pieces.findIndex((piece) => piece.startsWith('--'));
  // What follows the boundary's line is the part; the line break before the next boundary belongs to the boundary.
  return pieces
    .slice(0, end < 0 ? pieces.length : end)
    .map((piece) => piece.replace(/^[^\n]*\n/, '').replace(/\r$/, ''));
}

function parsePart(raw) {
  const [head, body] = splitHead(raw);
  const part = { headers: parseHeaders(head) };
  const contentType = headerOf(part, 'content-type') || 'text/plain';
  const type = contentType.split(';')[0].trim().toLowerCase();
  if (type.startsWith('multipart/')) {
    return { ...part, type, parts: multipartBodies(body, parameter(contentType, 'boundary')).map(parsePart) };
  }
  const disposition = headerOf(part, 'content-disposition');
  const content = decodeTransfer(body, headerOf(part, 'content-transfer-encoding').toLowerCase());
  return {
    ...part,
    type,
    content,
    text: type.startsWith('text/') ? decodeCharset(content, parameter(contentType, 'charset')) : '',
    fileName: parameter(disposition, 'filename') || parameter(contentType, 'name'),
    isAttachment: /^attachment/i.test(disposition),
    parts: [],
  };
}

function leaves(part) {
  return part.parts.length > 0 ? part.parts.flatMap(leaves) : [part];
}

/** { headers, text, html, attachments: [{ fileName, type, sizeBytes }] } of a message given as bytes. */
export function parseMessage(bytes) {
  const root = parsePart(bytes.toString('latin1'));
  const parts = leaves(root).filter(({ content }) => content);
  const shown = (type) => parts.find((part) => part.type === type && !part.isAttachment)?.text;
  return {
    headers: root.headers,
    text: shown('text/plain'),
    html: shown('text/html'),
    attachments: parts
      .filter(({ type, isAttachment }) => isAttachment || !['text/plain', 'text/html'].includes(type))
      .map(({ fileName, type, content }) => ({ fileName: fileName || 'unnamed', type, sizeBytes: content.length })),
  };
}
