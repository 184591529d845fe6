import { Logger } from '@nestjs/common';
import { env } from '../config/env';
import { OutboxPoller } from './outbox-poller.service';
import type { OutboxSender } from './outbox-sender.service';

/** A sender that is at work until it is let go, and remembers what it was told. */
function aSlowSender() {
  let letGo = () => {};
  let looks = 0;
  let isStopping: (() => boolean) | undefined;
  const sender = {
    sendDue: (stop: () => boolean) => {
      looks += 1;
      isStopping = stop;
      return new Promise<number>((resolve) => (letGo = () => resolve(1)));
    },
  } as unknown as OutboxSender;
  return { sender, letGo: () => letGo(), looks: () => looks, isStopping: () => isStopping?.() };
}

describe('looking for due mail', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  it('happens again and again, one look after the other', async () => {
    const { sender, letGo, looks } = aSlowSender();
    const poller = new OutboxPoller(sender);
    poller.onApplicationBootstrap();
    await jest.advanceTimersByTimeAsync(5 * env.OUTBOX_POLL_MS);
    expect(looks()).toBe(1);
    letGo();
    await jest.advanceTimersByTimeAsync(env.OUTBOX_POLL_MS);
    expect(looks()).toBe(2);
    const stopped = poller.beforeApplicationShutdown();
    letGo();
    await stopped;
  });

  it('ends with the mail in hand sent and no other taken up', async () => {
    const { sender, letGo, looks, isStopping } = aSlowSender();
    const poller = new OutboxPoller(sender);
    poller.onApplicationBootstrap();
    await jest.advanceTimersByTimeAsync(env.OUTBOX_POLL_MS);
    let hasStopped = false;
    const stopped = poller.beforeApplicationShutdown().then(() => (hasStopped = true));
    await jest.advanceTimersByTimeAsync(0);
    expect(hasStopped).toBe(false);
    expect(isStopping()).toBe(true);
    letGo();
    await stopped;
    await jest.advanceTimersByTimeAsync(3 * env.OUTBOX_POLL_MS);
    expect(looks()).toBe(1);
  });

  it('goes on after a look that failed, and says so in the log', async () => {
    const warn = jest.spyOn(Logger.prototype, 'warn').mockImplementation(() => undefined);
    let looks = 0;
    const sender = {
      sendDue: () => {
        looks += 1;
        return Promise.reject(new Error('The database is away'));
      },
    } as unknown as OutboxSender;
    const poller = new OutboxPoller(sender);
    poller.onApplicationBootstrap();
    await jest.advanceTimersByTimeAsync(env.OUTBOX_POLL_MS);
    await jest.advanceTimersByTimeAsync(env.OUTBOX_POLL_MS);
    expect(looks).toBe(2);
    expect(warn).toHaveBeenCalledWith('Looking for due mail failed: The database is away');
    warn.mockRestore();
    await poller.beforeApplicationShutdown();
  });
});
