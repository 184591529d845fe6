/** A failure whose message tells the person at the terminal what to do; it is printed without a stack. */
export class Fault extends Error {}

export function printFailure(error) {
  console.error(`\n${error instanceof Fault ? error.message : (error?.stack ?? error)}`);
}
