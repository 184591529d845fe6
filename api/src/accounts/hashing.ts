import { hash, verify } from '@node-rs/argon2';
import { DomainError } from '../common/domain-error';

// The package's enum exists in its types only.
const ARGON2ID = 2;
// OWASP's advice: 19 MiB, two passes, one lane.
const OPTIONS = { algorithm: ARGON2ID, memoryCost: 19 * 1024, timeCost: 2, parallelism: 1 };

const AT_ONCE = 4;
const LONGEST_QUEUE = 200;

export class HashingBusy extends DomainError {
  constructor() {
    super({
      status: 503,
      code: 'sign-in-busy',
      title: 'Too many people sign in at once: try again in a moment',
      retryAfterSeconds: 1,
    });
  }
}

let running = 0;
const waiting: (() => void)[] = [];

/** Keeps sign-ins from taking all memory and both cores: four hashes at once, the rest in turn. */
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (waiting.length >= LONGEST_QUEUE) throw new HashingBusy();
  if (running >= AT_ONCE) await new Promise<void>((resolve) => waiting.push(resolve));
  else running += 1;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next) next();
    else running -= 1;
  }
}

export const hashPassword = (password: string): Promise<string> => inTurn(() => hash(password, OPTIONS));

export const passwordMatches = (passwordHash: string, password: string): Promise<boolean> =>
  inTurn(() => verify(passwordHash, password));
