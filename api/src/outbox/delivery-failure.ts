import { LineBreakRefused } from './one-line';

/** About three days of tries at the longest wait; then somebody has to look. */
export const LAST_TRY = 80;
const LONGEST_WAIT_MS = 3_600_000;

type SmtpFault = { code?: unknown; responseCode?: unknown; response?: unknown; message?: unknown };

const asFault = (error: unknown): SmtpFault => (typeof error === 'object' && error !== null ? error : {});

/** What the server said, or what kept us from reaching it, in one line. */
export function reasonOf(error: unknown): string {
  const { response, message } = asFault(error);
  const text = typeof response === 'string' && response !== '' ? response : message;
  return String(text ?? error)
    .replace(/\s+/g, ' ')
    .trim();
}

/**
 * Whether trying again cannot help: the server refused this recipient or this message for good (5xx).
 * A refused sign-in or greeting concerns every mail and is mended at the server, so those wait.
 */
export function isPermanent(error: unknown): boolean {
  if (error instanceof LineBreakRefused) return true;
  const { code, responseCode } = asFault(error);
  const concernsThisMail = code === 'EENVELOPE' || code === 'EMESSAGE';
  return concernsThisMail && typeof responseCode === 'number' && responseCode >= 500 && responseCode < 600;
}

/**
 * How long to wait before the next try. [ms]
 *
 * Doubles from the first wait up to an hour; between half of that and all of it, at random, so that mails that failed
 * together do not come back together.
 */
export function waitBeforeNextTryMs(attempts: number, firstWaitMs: number, random: () => number = Math.random): number {
  const longest = Math.min(firstWaitMs * 2 ** Math.min(attempts - 1, 30), LONGEST_WAIT_MS);
  return longest * (0.5 + 0.5 * random());
}
