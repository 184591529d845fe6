import { printFailure } from './fault.mjs';

// On Ctrl-C the terminal signals npm and this process, and npm passes its own on: two signals, one wish.
const ONE_WISH_MS = 1000;

/**
 * Runs the flow of an entry and makes sure that `cleanUp` runs on every way out: its end, its failure, Ctrl-C,
 * SIGTERM, a closed terminal or pipe. Whoever asks a second time does not wait any longer.
 * `flow` returns the exit code; a signal ends with `codeOnSignal(signal)`.
 */
export async function runToTheEnd(flow, { cleanUp, killNow, codeOnSignal }) {
  let ending;
  const end = (code) =>
    (ending ??= cleanUp()
      .catch(fail)
      .then((cleanUpFailed) => process.exit(cleanUpFailed ?? code)));
  const fail = (error) => {
    printFailure(error);
    return 1;
  };
  let askedAt;
  const stop = (signal) => {
    if (askedAt && performance.now() - askedAt < ONE_WISH_MS) return;
    if (askedAt) {
      killNow();
      process.exit(1);
    }
    askedAt = performance.now();
    process.stdout.write('\nStopping.\n');
    void end(codeOnSignal(signal));
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, stop);
  // The reader of our output may go away (`npm start | head`): then it ends as on a signal, and leaves no server behind.
  for (const stream of [process.stdout, process.stderr]) {
    stream.on('error', () => void end(codeOnSignal('SIGPIPE')));
  }

  let code;
  try {
    code = await flow();
  } catch (error) {
    code = 1;
    if (!ending) printFailure(error); // while stopping, a step that was cut short is no news
  }
  await end(code);
}
