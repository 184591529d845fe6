import { existsSync, realpathSync } from 'node:fs';
import { join } from 'node:path';
import { Fault } from './fault.mjs';
import { rootFolder } from './paths.mjs';

/** The script of a program from npm, as the workspace sees it. Run by Node.js itself: one process, no shell between. */
export function npmProgram(name, workspace = '.') {
  const places = [join(rootFolder, workspace), rootFolder].map((folder) => join(folder, 'node_modules', '.bin', name));
  const found = places.find((place) => existsSync(place));
  if (!found) throw new Fault(`${name} is not installed; package-lock.json does not hold it.`);
  return realpathSync(found);
}
