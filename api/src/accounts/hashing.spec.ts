import * as argon2 from '@node-rs/argon2';
import { HashingBusy, hashPassword, passwordMatches } from './hashing';

jest.mock('@node-rs/argon2', () => ({ __esModule: true, ...jest.requireActual<typeof argon2>('@node-rs/argon2') }));

describe('password hashes', () => {
  afterEach(() => jest.restoreAllMocks());

  it('are Argon2id with 19 MiB, two passes and one lane, each with a salt of its own', async () => {
    const [one, two] = [await hashPassword('the same password'), await hashPassword('the same password')];
    expect(one).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(one).not.toBe(two);
  });

  it('match their password to its last character and no other', async () => {
    const password = `${'x'.repeat(200)}a`;
    const hash = await hashPassword(password);
    expect(await passwordMatches(hash, password)).toBe(true);
    expect(await passwordMatches(hash, `${'x'.repeat(200)}b`)).toBe(false);
  });

  it('are worked on four at once, and a line that grows too long is refused', async () => {
    let running = 0;
    let most = 0;
    const finish: (() => void)[] = [];
    jest.spyOn(argon2, 'hash').mockImplementation(async () => {
      running += 1;
      most = Math.max(most, running);
      await new Promise<void>((resolve) => finish.push(resolve));
      running -= 1;
      return 'hash';
    });
    const hashes = Array.from({ length: 204 }, (_, index) => hashPassword(`password ${index}`));
    await expect(hashPassword('one too many')).rejects.toBeInstanceOf(HashingBusy);
    let done = false;
    const all = Promise.all(hashes).then(() => (done = true));
    while (!done) {
      finish.splice(0).forEach((resolve) => resolve());
      await new Promise<void>((resolve) => setImmediate(resolve));
    }
    await all;
    expect(most).toBe(4);
  });
});
