import assert from 'node:assert/strict';
import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { connect } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, test } from 'node:test';
import { startSmtpFake } from './smtp-fake.mjs';

let folder;
let fake;

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'brimgate-smtp-'));
  fake = await startSmtpFake({ folder });
});

afterEach(async () => {
  await fake.close();
  await rm(folder, { recursive: true });
});

/** Sends the whole conversation at once, as PIPELINING allows, and returns the replies up to the end. */
function converse(lines) {
  return new Promise((resolve, reject) => {
    const socket = connect(fake.port, '127.0.0.1', () => socket.write(`${lines.join('\r\n')}\r\n`));
    let replies = '';
    socket.setEncoding('utf8').on('data', (text) => (replies += text));
    socket.on('error', reject).on('close', () => resolve(replies.trimEnd().split('\r\n')));
  });
}

const codes = (replies) => replies.map((reply) => reply.slice(0, 3));

async function keptMessages() {
  const names = (await readdir(folder)).sort();
  return Promise.all(names.map((name) => readFile(join(folder, name), 'utf8')));
}

const envelope = ['EHLO here', 'MAIL FROM:<desk@example.org> SIZE=500', 'RCPT TO:<yard@example.org>', 'DATA'];

test('keeps a message with its envelope, and takes back the doubled dots', async () => {
  const replies = await converse([...envelope, 'Subject: Advisory', '', '..5 % of the ration', '.', 'QUIT']);
  assert.deepEqual(codes(replies), ['220', '250', '250', '250', '250', '250', '250', '250', '354', '250', '221']);
  assert.deepEqual(await keptMessages(), [
    'Return-Path: <desk@example.org>\r\nDelivered-To: yard@example.org\r\nSubject: Advisory\r\n\r\n.5 % of the ration\r\n',
  ]);
});

test('refuses for good or for now when the address asks for it, and keeps nothing', async () => {
  const replies = await converse([
    'HELO here',
    'MAIL FROM:<desk@example.org>',
    'RCPT TO:<reject-permanent@example.org>',
    'RCPT TO:<reject-later@example.org>',
    'DATA',
    'QUIT',
  ]);
  assert.deepEqual(codes(replies), ['220', '250', '250', '550', '451', '503', '221']);
  assert.deepEqual(await keptMessages(), []);
});

test('answers commands in a wrong order, unknown ones and an announced size that is too large', async () => {
  const replies = await converse([
    'RCPT TO:<yard@example.org>',
    'MAIL desk@example.org',
    'MAIL FROM:<desk@example.org> SIZE=99999999',
    'DATA',
    'DANCE',
    'NOOP',
    'QUIT',
  ]);
  assert.deepEqual(codes(replies), ['220', '503', '501', '552', '503', '500', '250', '221']);
});

test('forgets the envelope on RSET', async () => {
  const replies = await converse([...envelope.slice(0, 3), 'RSET', 'DATA', 'QUIT']);
  assert.deepEqual(codes(replies).slice(-3), ['250', '503', '221']);
});

test('shows a message with its words decoded, its HTML locked in and no way into other files', async () => {
  await converse([
    ...envelope,
    'From: =?UTF-8?Q?Caf=C3=A9_desk?= <desk@example.org>',
    'To: yard@example.org',
    'Subject: =?utf-8?B?U3VsZnVyIOKJpCBsaW1pdA==?=', // "Sulfur ≤ limit"
    'Content-Type: multipart/alternative; boundary="b1"',
    '',
    '--b1',
    'Content-Type: text/plain; charset=utf-8',
    'Content-Transfer-Encoding: quoted-printable',
    '',
    'Sulfur 0.42 =E2=89=A5 limit, soft=',
    ' break',
    '--b1',
    'Content-Type: text/html; charset=utf-8',
    'Content-Transfer-Encoding: base64',
    '',
    Buffer.from('<p>é<script>alert(1)</script></p>').toString('base64'),
    '--b1--',
    '.',
    'QUIT',
  ]);
  const list = await (await fetch(fake.pageAddress)).text();
  assert.match(list, /Sulfur ≤ limit/);
  const [link] = /\/messages\/[^"]+/.exec(list);
  const page = await (await fetch(fake.pageAddress + link)).text();
  assert.match(page, /Café desk &lt;desk@example.org&gt;/);
  assert.match(page, /<pre>Sulfur 0.42 ≥ limit, soft break<\/pre>/);
  assert.match(page, /<iframe sandbox /);
  const html = await fetch(`${fake.pageAddress}${link}/html`);
  assert.match(html.headers.get('content-security-policy'), /^sandbox; default-src 'none'/);
  assert.equal(await html.text(), '<p>é<script>alert(1)</script></p>');
  assert.equal((await fetch(`${fake.pageAddress}/messages/..%2F..%2Fsecrets`)).status, 404);
});
