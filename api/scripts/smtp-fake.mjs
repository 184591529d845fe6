// A mail server for trying out and for tests: it delivers nothing, keeps every message as a file and shows it on a page.
// By itself: node api/scripts/smtp-fake.mjs <smtp-port> <page-port> <folder>, where port 0 is any free one.
import { createServer } from 'node:net';
import { resolve as resolvePath } from 'node:path';
import { fileURLToPath } from 'node:url';
import { openMailFolder } from './mail-folder.mjs';
import { createMailPage } from './mail-page.mjs';
import { SmtpSession } from './smtp-session.mjs';

const HOST = '127.0.0.1';

function listen(server, port) {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, HOST, () => resolve(server.address().port));
  });
}

function createSmtpServer(mailFolder) {
  const sockets = new Set();
  const server = createServer((socket) => {
    sockets.add(socket);
    socket.once('close', () => sockets.delete(socket));
    socket.on('error', () => socket.destroy());
    const session = new SmtpSession({
      reply: (line) => socket.write(`${line}\r\n`),
      end: () => socket.end(),
      keep: (message) => mailFolder.add(message),
    });
    let turn = Promise.resolve(); // pieces are read strictly one after the other
    socket.on('data', (bytes) => (turn = turn.then(() => session.receive(bytes)).catch(() => socket.destroy())));
    session.greet();
  });
  const close = () =>
    new Promise((resolve) => {
      server.close(resolve);
      for (const socket of sockets) socket.destroy();
    });
  return { server, close };
}

/** Starts both servers. Returns { port, pagePort, pageAddress, close() }. */
export async function startSmtpFake({ port = 0, pagePort = 0, folder }) {
  const mailFolder = openMailFolder(folder);
  const smtp = createSmtpServer(mailFolder);
  const page = createMailPage(mailFolder);
  const smtpPort = await listen(smtp.server, port);
  const boundPagePort = await listen(page, pagePort);
  return {
    port: smtpPort,
    pagePort: boundPagePort,
    pageAddress: `http://${HOST}:${boundPagePort}`,
    async close() {
      page.closeAllConnections();
      await Promise.all([smtp.close(), new Promise((resolve) => page.close(resolve))]);
    },
  };
}

if (process.argv[1] && resolvePath(process.argv[1]) === fileURLToPath(import.meta.url)) {
  const [port = '0', pagePort = '0', folder = 'mail'] = process.argv.slice(2);
  const fake = await startSmtpFake({ port: Number(port), pagePort: Number(pagePort), folder });
  console.log(JSON.stringify({ port: fake.port, pageAddress: fake.pageAddress, folder: resolvePath(folder) }));
  for (const signal of ['SIGINT', 'SIGTERM']) process.once(signal, () => void fake.close());
}
