import { mkdirSync, readdirSync, readFileSync } from 'node:fs';
import { rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';

const ID = /^[\w.-]+$/;

/** Received messages as files, one `<id>.eml` each; ids sort by time of receipt. */
export function openMailFolder(folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  let received = 0;
  return {
    /** Keeps a message. It appears under its name only when it is complete. */
    async add({ sender, recipients, bytes }) {
      received += 1;
      const time = new Date().toISOString().replaceAll(':', '-');
      const id = `${time}-${process.pid}-${String(received).padStart(6, '0')}`;
      // What the last mail server on the way writes: the envelope, which the headers need not repeat.
      const envelope = [`Return-Path: <${sender}>`, ...recipients.map((address) => `Delivered-To: ${address}`)];
      const file = join(folder, `${id}.eml`);
      await writeFile(`${file}.new`, Buffer.concat([Buffer.from(`${envelope.join('\r\n')}\r\n`), bytes]));
      await rename(`${file}.new`, file);
      return id;
    },
    /** Newest first. */
    ids() {
      const names = readdirSync(folder).filter((name) => name.endsWith('.eml'));
      return names
        .map((name) => name.slice(0, -'.eml'.length))
        .sort()
        .reverse();
    },
    /** The bytes of one message, undefined when there is none of that id. */
    read(id) {
      if (!ID.test(id)) return undefined;
      try {
        return readFileSync(join(folder, `${id}.eml`));
      } catch {
        return undefined;
      }
    },
  };
}
