import { type BeforeApplicationShutdown, Injectable, Logger, type OnApplicationBootstrap } from '@nestjs/common';
import { env } from '../config/env';
import { OutboxSender } from './outbox-sender.service';

/** Looks for due mail again and again while the process lives. */
@Injectable()
export class OutboxPoller implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger(OutboxPoller.name);
  private timer: NodeJS.Timeout | undefined;
  private round: Promise<void> = Promise.resolve();
  private isStopping = false;

  constructor(private readonly sender: OutboxSender) {}

  onApplicationBootstrap(): void {
    this.schedule();
  }

  /** Lets the mail in hand finish, takes up no other. */
  async beforeApplicationShutdown(): Promise<void> {
    this.isStopping = true;
    clearTimeout(this.timer);
    await this.round;
  }

  private schedule(): void {
    if (this.isStopping) return;
    this.timer = setTimeout(() => {
      this.round = this.look().finally(() => this.schedule());
    }, env.OUTBOX_POLL_MS);
    this.timer.unref();
  }

  private async look(): Promise<void> {
    try {
      await this.sender.sendDue(() => this.isStopping);
    } catch (error) {
      // The database is away or two senders met: the next look tries again.
      this.logger.warn(`Looking for due mail failed: ${error instanceof Error ? error.message : String(error)}`);
    }
  }
}
