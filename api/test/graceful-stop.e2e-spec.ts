import { Agent, get, type IncomingMessage } from 'node:http';
import type { AddressInfo } from 'node:net';
import { setTimeout as wait } from 'node:timers/promises';
import { Controller, Get, type INestApplication, Module } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import { GracefulStop } from '../src/common/graceful-stop';

const SLOW_MS = 400;

@Controller()
class SlowController {
  @Get('slow')
  async slow() {
    await wait(SLOW_MS);
    return { isDone: true };
  }

  @Get('quick')
  quick() {
    return { isDone: true };
  }
}

@Module({ controllers: [SlowController], providers: [GracefulStop] })
class SlowModule {}

describe('stopping', () => {
  let app: INestApplication;
  let port: number;
  const browser = new Agent({ keepAlive: true });
  const ask = (path: string) =>
    new Promise<number | undefined>((resolve, reject) => {
      get({ host: '127.0.0.1', port, path, agent: browser }, (answer: IncomingMessage) => {
        answer.resume().on('end', () => resolve(answer.statusCode));
      }).on('error', reject);
    });

  beforeEach(async () => {
    app = await NestFactory.create(SlowModule, { logger: false });
    await app.listen(0, '127.0.0.1');
    port = (app.getHttpServer() as { address: () => AddressInfo }).address().port;
  });
  afterAll(() => browser.destroy());

  it('lets a request in flight finish and does not wait for connections that only stay open', async () => {
    await ask('/quick');
    const slow = ask('/slow');
    await wait(SLOW_MS / 4);
    const started = performance.now();
    await app.close();
    expect(await slow).toBe(200);
    // Without closing idle connections, the browser's would hold the server for its five seconds of keep-alive.
    expect(performance.now() - started).toBeLessThan(3000);
    await expect(ask('/quick')).rejects.toThrow();
  });
});
