import { spawn } from 'node:child_process';
import { closeSync, openSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';
import { Fault } from './fault.mjs';
import { identityOf, isAlive } from './process-identity.mjs';

const POLL_MS = 20;
const TAIL_LINES = 30;

export function lastLines(text, count = TAIL_LINES) {
  return text.trimEnd().split('\n').slice(-count).join('\n');
}

function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

/** Asks a process to end, and after `graceSeconds` ends it with everything it started. */
async function endProcess(identity, graceSeconds) {
  if (!isAlive(identity)) return;
  process.kill(identity.pid, 'SIGTERM');
  const deadline = Date.now() + graceSeconds * 1000;
  while (isAlive(identity) && Date.now() < deadline) await wait(POLL_MS);
  if (isAlive(identity)) signalGroup(identity.pid, 'SIGKILL');
  while (isAlive(identity)) await wait(POLL_MS);
}

/** Ends what a killed starter left running: newest first, as an orderly stop would. Returns the names. */
export async function endLeftovers(record) {
  const ended = [];
  for (const child of [...record.children].reverse()) {
    if (!isAlive(child)) continue;
    await endProcess(child, child.graceSeconds);
    ended.push(child.name);
  }
  return ended;
}

export function readRecord(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined; // none, or cut short by a crash while it was written
  }
}

/**
 * The children of one starter. Each runs in a process group of its own, so that Ctrl-C reaches the starter alone and
 * the starter decides the order of the end. The record file says who they are if the starter itself is killed.
 */
export class Processes {
  #children = [];
  #notes = {};
  #isRecorded = false;
  #isEnding = false;

  constructor(recordFile) {
    this.recordFile = recordFile;
  }

  note(notes) {
    Object.assign(this.#notes, notes);
    this.#write();
  }

  #write() {
    const children = this.#children.map(({ name, identity, graceSeconds }) => ({ name, ...identity, graceSeconds }));
    const content = JSON.stringify({ starter: identityOf(process.pid), ...this.#notes, children });
    writeFileSync(`${this.recordFile}.new`, content);
    renameSync(`${this.recordFile}.new`, this.recordFile);
    this.#isRecorded = true;
  }

  #spawn(name, command, args, { graceSeconds = 10, ...options }) {
    if (this.#isEnding) throw new Fault('Stopping.');
    const child = spawn(command, args, { detached: true, ...options });
    const entry = { name, graceSeconds, hasEnded: false };
    entry.ended = new Promise((resolve) => {
      const end = (code, signal, error) => {
        entry.hasEnded = true;
        this.#children = this.#children.filter((other) => other !== entry);
        // While everything is being ended, whoever waits for this child is not to go on and report a failure.
        if (!this.#isEnding) resolve({ code, signal, error });
      };
      child.once('error', (error) => end(null, null, error));
      child.once('close', (code, signal) => end(code, signal));
    });
    if (child.pid) {
      entry.identity = identityOf(child.pid) ?? { pid: child.pid, startedAtTicks: -1 };
      this.#children.push(entry);
      this.#write();
    }
    return { child, entry };
  }

  /** Runs a command to its end and returns what it printed to standard output; throws with its last lines. */
  async run(command, args, { input, title = command, ...options } = {}) {
    const { child, entry } = this.#spawn(title, command, args, { ...options, stdio: ['pipe', 'pipe', 'pipe'] });
    const output = { stdout: '', all: '' };
    child.stdout.setEncoding('utf8').on('data', (text) => {
      output.stdout += text;
      output.all += text;
    });
    child.stderr.setEncoding('utf8').on('data', (text) => (output.all += text));
    child.stdin.on('error', () => {}); // a command may end before it has read everything; its exit code tells
    child.stdin.end(input);
    const { code, signal, error } = await entry.ended;
    if (error) throw new Fault(`${title} could not be started: ${error.message}`);
    if (code !== 0) throw new Fault(`${title} failed (${signal ?? `exit ${code}`}):\n${lastLines(output.all)}`);
    return output.stdout;
  }

  /** Runs a command whose output is for the person at the terminal; returns its exit code, null when it was killed. */
  async show(command, args, options = {}) {
    const { entry } = this.#spawn(command, command, args, { ...options, stdio: ['ignore', 'inherit', 'inherit'] });
    const { code, error } = await entry.ended;
    if (error) throw new Fault(`${command} could not be started: ${error.message}`);
    return code;
  }

  /** Starts a server that lives until it is ended. Its output goes to `logFile`. */
  start(name, command, args, { logFile, ...options }) {
    const log = openSync(logFile, 'w', 0o600);
    try {
      const { entry } = this.#spawn(name, command, args, { ...options, stdio: ['ignore', log, log] });
      return {
        name,
        ended: entry.ended,
        hasEnded: () => entry.hasEnded,
        log: () => lastLines(readFileSync(logFile, 'utf8')),
        end: () => (entry.identity ? endProcess(entry.identity, entry.graceSeconds) : undefined),
      };
    } finally {
      closeSync(log);
    }
  }

  /** Ends all children, newest first, and removes the record. Nothing can be started afterwards. */
  async endAll() {
    this.#isEnding = true;
    for (const { identity, graceSeconds } of [...this.#children].reverse()) await endProcess(identity, graceSeconds);
    if (this.#isRecorded) rmSync(this.recordFile, { force: true }); // else it is another starter's
  }

  killAll() {
    for (const { identity } of this.#children) signalGroup(identity.pid, 'SIGKILL');
  }
}
