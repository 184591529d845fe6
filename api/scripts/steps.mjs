const startedAt = performance.now();

function seconds(since) {
  return `${((performance.now() - since) / 1000).toFixed(1)} s`;
}

/** Runs one step of the set-up and prints its line: title, what came of it, seconds. */
export async function step(title, work) {
  const since = performance.now();
  process.stdout.write(`${title} ... `);
  try {
    const { note, value } = (await work()) ?? {};
    process.stdout.write(`${note ? `${note}, ` : ''}${seconds(since)}\n`);
    return value;
  } catch (error) {
    process.stdout.write(`failed after ${seconds(since)}\n`);
    throw error;
  }
}

export function secondsSinceStart() {
  return seconds(startedAt);
}
