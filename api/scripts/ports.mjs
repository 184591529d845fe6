import { createServer } from 'node:net';
import { Fault } from './fault.mjs';

const HIGHEST_PORT = 65535;
const PORTS_TRIED = 100;

function bind(port, host) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port, host, exclusive: true }, () => {
      const { port: bound } = server.address();
      server.close(() => resolve(bound));
    });
  });
}

/** Why the port cannot be listened on, or undefined when it can. */
export async function reasonPortIsUnusable(port, host = '127.0.0.1') {
  try {
    await bind(port, host);
    return undefined;
  } catch (error) {
    if (error.code === 'EADDRINUSE') return 'another program already listens there';
    if (error.code === 'EACCES') return 'this user may not listen there';
    return error.message;
  }
}

export async function firstFreePort(from, host = '127.0.0.1') {
  for (let port = from; port < from + PORTS_TRIED; port += 1) {
    if (!(await reasonPortIsUnusable(port, host))) return port;
  }
  throw new Fault(`No free port between ${from} and ${from + PORTS_TRIED - 1}.`);
}

/** A port nobody listens on, chosen by the operating system. */
export function anyFreePort() {
  return bind(0, '127.0.0.1');
}

/** A port named in the environment: it is taken as it stands or refused with the reason, never replaced. */
export async function demandedPort(name, text, host) {
  const port = Number(text);
  if (!/^\d+$/.test(text) || port < 1 || port > HIGHEST_PORT) {
    throw new Fault(`${name} is "${text}"; it must be a whole number from 1 to ${HIGHEST_PORT}.`);
  }
  const reason = await reasonPortIsUnusable(port, host);
  if (reason) throw new Fault(`${name} is ${port}, but ${reason}. Stop that program or choose another port.`);
  return port;
}
