import { constants } from 'node:os';

/** What a shell reports for a command ended by this signal: the work was not finished. */
export function signalExitCode(signal) {
  return 128 + constants.signals[signal];
}
