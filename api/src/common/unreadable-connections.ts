import type { Server } from 'node:http';
import type { Duplex } from 'node:stream';

const ANSWERS: Readonly<Record<string, { status: string; code: string; title: string }>> = {
  HPE_HEADER_OVERFLOW: {
    status: '431 Request Header Fields Too Large',
    code: 'headers-too-large',
    title: 'The headers of the request are too large: delete the cookies of this address and sign in again',
  },
  ERR_HTTP_REQUEST_TIMEOUT: {
    status: '408 Request Timeout',
    code: 'request-timeout',
    title: 'The request did not arrive in time: send it again',
  },
};

const UNREADABLE = { status: '400 Bad Request', code: 'request-unreadable', title: 'The request could not be read' };

/** Answers what is no HTTP, or too long for it, as any other fault: Node.js alone would answer without a word. */
export function answerUnreadableConnections(server: Server): void {
  server.on('clientError', (error: NodeJS.ErrnoException, socket: Duplex) => {
    if (error.code === 'ECONNRESET' || !socket.writable) {
      socket.destroy();
      return;
    }
    const { status, code, title } = ANSWERS[error.code ?? ''] ?? UNREADABLE;
    const body = JSON.stringify({
      type: `urn:brimgate:problem:${code}`,
      title,
      status: Number(status.slice(0, 3)),
      code,
      errors: [],
    });
    const head = [
      `HTTP/1.1 ${status}`,
      'Content-Type: application/problem+json; charset=utf-8',
      `Content-Length: ${Buffer.byteLength(body)}`,
      'Cache-Control: no-store',
      'X-Content-Type-Options: nosniff',
      'Connection: close',
    ];
    socket.end(`${head.join('\r\n')}\r\n\r\n${body}`);
  });
}
