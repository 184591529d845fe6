import { randomBytes, randomInt } from 'node:crypto';
import { chmodSync, existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { Fault } from './fault.mjs';

// No letter or digit that is taken for another when read aloud or typed from a screen.
const READABLE = 'abcdefghjkmnpqrstuvwxyz23456789';

export function randomToken() {
  return randomBytes(36).toString('base64url');
}

/** Four groups of four: about 79 bits, and long enough for the rule of 15 characters. */
export function readablePassword() {
  const group = () => Array.from({ length: 4 }, () => READABLE[randomInt(READABLE.length)]).join('');
  return Array.from({ length: 4 }, group).join('-');
}

const GENERATORS = {
  DATABASE_PASSWORD: randomToken,
  DATABASE_OWNER_PASSWORD: randomToken,
  JWT_SECRET: randomToken,
  DEMO_PASSWORD: readablePassword,
};

function readSecrets(file) {
  if (!existsSync(file)) return {};
  chmodSync(file, 0o600); // a copied checkout may have lost its mode
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    throw new Fault(`${file} cannot be read as JSON. Restore it; without it the database's passwords are lost.`);
  }
}

/** `secret(name)`: from the environment, else from the file, else generated once and kept there with mode 0600. */
export function openSecrets(file, env) {
  const kept = readSecrets(file);
  return (name) => {
    if (env[name]) return env[name];
    if (kept[name]) return kept[name];
    if (env.NODE_ENV === 'production') {
      throw new Fault(`NODE_ENV is production, where secrets are not generated. Set ${name} in the environment.`);
    }
    kept[name] = GENERATORS[name]();
    writeFileSync(`${file}.new`, `${JSON.stringify(kept, null, 2)}\n`, { mode: 0o600 });
    renameSync(`${file}.new`, file);
    return kept[name];
  };
}
