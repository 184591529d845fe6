import { createHash } from 'node:crypto';
import { realpathSync } from 'node:fs';
import { createServer } from 'node:net';

/**
 * Holds a folder for one starter at a time: a socket in Linux's abstract namespace, which the kernel gives up the
 * moment its holder dies, also by `kill -9`. Returns false when another process holds the folder.
 */
export function holdFolder(folder) {
  const name = createHash('sha256').update(realpathSync(folder)).digest('hex').slice(0, 32);
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', (error) => (error.code === 'EADDRINUSE' ? resolve(false) : reject(error)));
    server.listen({ path: `\0brimgate-${name}` }, () => {
      server.unref();
      resolve(true);
    });
  });
}
