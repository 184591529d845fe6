import { Fault } from './fault.mjs';

const PLAIN_NAME = /^[A-Za-z0-9_]{1,48}$/;
const DEFAULT_MARIADB_PORT = '3306';

function demanded(env, name, because) {
  if (!env[name]) throw new Fault(`${name} is not set, but ${because}.`);
  return env[name];
}

function plainName(env, name, fallback) {
  const value = env[name] || fallback;
  if (!PLAIN_NAME.test(value)) throw new Fault(`${name} is "${value}"; use letters, digits and _ only.`);
  return value;
}

/** Where the database is and who signs in to it. With DATABASE_HOST it is somebody else's server; else a private one. */
export function databaseSettings(env, secret) {
  if (env.DATABASE_HOST) {
    const because = 'DATABASE_HOST names a server of your own';
    const user = demanded(env, 'DATABASE_USER', because);
    const password = demanded(env, 'DATABASE_PASSWORD', because);
    return {
      isPrivate: false,
      host: env.DATABASE_HOST,
      port: env.DATABASE_PORT || DEFAULT_MARIADB_PORT,
      name: plainName(env, 'DATABASE_NAME', 'brimgate'),
      application: { user, password },
      owner: {
        user: env.DATABASE_OWNER_USER || user,
        password: env.DATABASE_OWNER_USER
          ? demanded(env, 'DATABASE_OWNER_PASSWORD', 'DATABASE_OWNER_USER is')
          : password,
      },
    };
  }
  const application = { user: plainName(env, 'DATABASE_USER', 'brimgate'), password: secret('DATABASE_PASSWORD') };
  const owner = {
    user: plainName(env, 'DATABASE_OWNER_USER', 'brimgate_owner'),
    password: secret('DATABASE_OWNER_PASSWORD'),
  };
  if (owner.user === application.user) {
    throw new Fault('DATABASE_USER and DATABASE_OWNER_USER must differ: the application may not change the schema.');
  }
  return {
    isPrivate: true,
    host: '127.0.0.1',
    port: env.DATABASE_PORT,
    name: plainName(env, 'DATABASE_NAME', 'brimgate'),
    application,
    owner,
  };
}

/** Whether mail goes to the fake. In production nobody would read it there, so a real server must be named. */
export function usesSmtpFake(env) {
  if (env.SMTP_HOST) return false;
  if (env.NODE_ENV === 'production') {
    throw new Fault('NODE_ENV is production: set SMTP_HOST to the mail server that delivers the advisories.');
  }
  return true;
}

const ONLY_FOR_SOME = new Set(['DATABASE_OWNER_USER', 'DATABASE_OWNER_PASSWORD', 'DEMO_PASSWORD']);

/** The environment of the API's programs. The owner's account is added only for the one that migrates. */
export function apiEnvironment(env, database, values) {
  const inherited = Object.entries(env).filter(([name]) => !ONLY_FOR_SOME.has(name));
  return {
    ...Object.fromEntries(inherited),
    DATABASE_HOST: database.host,
    DATABASE_PORT: String(database.port),
    DATABASE_NAME: database.name,
    DATABASE_USER: database.application.user,
    DATABASE_PASSWORD: database.application.password,
    ...values,
  };
}

export function ownerEnvironment(database) {
  return { DATABASE_OWNER_USER: database.owner.user, DATABASE_OWNER_PASSWORD: database.owner.password };
}
