import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const rootFolder = dirname(dirname(dirname(fileURLToPath(import.meta.url))));
export const apiFolder = join(rootFolder, 'api');
export const uiFolder = join(rootFolder, 'ui');
export const uiOutputFolder = join(uiFolder, 'dist');

/** Everything `npm start` keeps: the database, secrets, received mail, logs. Ignored by git. */
export const dataFolder = join(apiFolder, '.data');
