import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

// A socket's path may be 107 bytes long and no more.
const LONGEST_FOLDER = 80;

export function baseOfTemporaryFolders(prefix) {
  const base = tmpdir();
  return base.length + prefix.length > LONGEST_FOLDER ? '/tmp' : base;
}

/** A new folder for one run, private to this user, short enough to hold a socket. */
export function shortTemporaryFolder(prefix) {
  return mkdtempSync(join(baseOfTemporaryFolders(prefix), prefix));
}
