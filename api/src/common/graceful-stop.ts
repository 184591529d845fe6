import type { Server } from 'node:http';
import { type BeforeApplicationShutdown, Injectable } from '@nestjs/common';
import { HttpAdapterHost } from '@nestjs/core';

const LONGEST_WAIT_MS = 10_000;
const LOOK_EVERY_MS = 50;

/** Lets requests in flight finish while the server closes, without waiting for browsers that keep connections open. */
@Injectable()
export class GracefulStop implements BeforeApplicationShutdown {
  constructor(private readonly host: HttpAdapterHost) {}

  beforeApplicationShutdown(): void {
    const server = this.host.httpAdapter?.getHttpServer() as Server | undefined;
    if (!server?.listening) return;
    const idle = setInterval(() => server.closeIdleConnections(), LOOK_EVERY_MS);
    const all = setTimeout(() => server.closeAllConnections(), LONGEST_WAIT_MS);
    server.once('close', () => {
      clearInterval(idle);
      clearTimeout(all);
    });
  }
}
