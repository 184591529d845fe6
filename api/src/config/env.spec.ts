import { parseEnv } from './env';

const complete = {
  DATABASE_USER: 'brimgate',
  DATABASE_PASSWORD: 'secret-of-the-database',
  JWT_SECRET: 'a secret of thirty-two characters and more',
};

describe('the environment', () => {
  it('has defaults for everything but secrets', () => {
    expect(parseEnv(complete)).toMatchObject({ HOST: '127.0.0.1', PORT: 3000, PUBLIC_URL: 'http://127.0.0.1:3000' });
  });

  it('names everything that is missing or wrong at once, and no value', () => {
    const faulty = { ...complete, PORT: '99999', JWT_SECRET: 'short', SMTP_PORT: 'mail', DATABASE_USER: undefined };
    const parse = () => parseEnv(faulty);
    for (const name of ['PORT', 'JWT_SECRET', 'SMTP_PORT', 'DATABASE_USER']) expect(parse).toThrow(name);
    for (const value of ['99999', 'short', 'secret-of-the-database']) expect(parse).not.toThrow(value);
  });

  it('relaxes durability for tests but never in production', () => {
    const relaxed = { ...complete, DATABASE_RELAX_DURABILITY: 'true' };
    expect(parseEnv(relaxed).DATABASE_RELAX_DURABILITY).toBe(true);
    const production = { ...relaxed, NODE_ENV: 'production', PUBLIC_URL: 'https://brimgate.example' };
    expect(() => parseEnv(production)).toThrow('Durability cannot be relaxed in production');
  });

  it('wants to be told its address in production', () => {
    expect(() => parseEnv({ ...complete, NODE_ENV: 'production' })).toThrow('Set PUBLIC_URL');
  });
});
