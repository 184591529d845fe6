import { readFileSync } from 'node:fs';

/**
 * A process id alone may have been given to somebody else since it was written down. Together with the start time the
 * kernel keeps (field 22 of /proc/<pid>/stat) it names one process. Undefined when there is no such process.
 */
export function identityOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'latin1');
    // The name in field 2 may hold spaces and brackets: count from the last bracket, where field 3 begins.
    const [state, ...later] = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return state === 'Z' ? undefined : { pid, startedAtTicks: Number(later[18]) };
  } catch {
    return undefined;
  }
}

export function isAlive(identity) {
  return identityOf(identity.pid)?.startedAtTicks === identity.startedAtTicks;
}
