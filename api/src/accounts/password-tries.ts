import { Injectable } from '@nestjs/common';
import { TooManyTries } from './account.errors';
import { ThrottleStorage } from './throttle.storage';

const QUARTER_HOUR_MS = 15 * 60_000;
const HOUR_MS = 60 * 60_000;

type Limit = { key: string; failures: number; windowMs: number };

/**
 * A stranger who guesses is stopped at his own address first, so that the person can still sign in from elsewhere;
 * only a hundred failures in an hour from anywhere stop the account itself, and only for that hour.
 */
function limitsOf(account: string, address: string): Limit[] {
  return [
    { key: `account-and-address:${account}:${address}`, failures: 10, windowMs: QUARTER_HOUR_MS },
    { key: `address:${address}`, failures: 100, windowMs: QUARTER_HOUR_MS },
    { key: `account:${account}`, failures: 100, windowMs: HOUR_MS },
  ];
}

/** Counts failed passwords. */
@Injectable()
export class PasswordTries {
  constructor(private readonly storage: ThrottleStorage) {}

  /** Counts before the password is looked at, so that a thousand guesses at once pass no more than one by one. */
  async take(account: string, address: string): Promise<void> {
    for (const { key, failures, windowMs } of limitsOf(account.toLowerCase(), address)) {
      const { hits, millisecondsLeft } = await this.storage.count(key, windowMs);
      if (hits > failures) throw new TooManyTries(Math.ceil(millisecondsLeft / 1000));
    }
  }

  /** The password was right: this try does not count. */
  async giveBack(account: string, address: string): Promise<void> {
    for (const { key } of limitsOf(account.toLowerCase(), address)) await this.storage.giveBack(key);
  }
}
