import * as v from 'valibot';

const text = (name: string) => v.pipe(v.string(`Set ${name}`), v.nonEmpty(`Set ${name}`));
const wholeNumber = (name: string, lowest: number, highest: number) =>
  v.pipe(
    v.string(`Set ${name}`),
    v.regex(/^\d+$/, `${name} is a whole number`),
    v.transform(Number),
    v.minValue(lowest, `${name} is at least ${lowest}`),
    v.maxValue(highest, `${name} is at most ${highest}`),
  );
const flag = v.pipe(
  v.picklist(['true', 'false', '1', '0', '']),
  v.transform((value) => value === 'true' || value === '1'),
);

/** What the process reads from its environment, parsed once. */
export const EnvSchema = v.pipe(
  v.object({
    NODE_ENV: v.optional(v.string(), 'development'),
    PORT: v.optional(wholeNumber('PORT', 0, 65_535), '3000'),
    HOST: v.optional(text('HOST'), '127.0.0.1'),
    DATABASE_HOST: v.optional(text('DATABASE_HOST'), '127.0.0.1'),
    DATABASE_PORT: v.optional(wholeNumber('DATABASE_PORT', 1, 65_535), '3306'),
    DATABASE_NAME: v.optional(text('DATABASE_NAME'), 'brimgate'),
    DATABASE_USER: text('DATABASE_USER'),
    DATABASE_PASSWORD: text('DATABASE_PASSWORD'),
    DATABASE_OWNER_USER: v.optional(v.string(), ''),
    DATABASE_OWNER_PASSWORD: v.optional(v.string(), ''),
    /** Lets tests run on a database that trades durability for speed. */
    DATABASE_RELAX_DURABILITY: v.optional(flag, 'false'),
    JWT_SECRET: v.pipe(v.string('Set JWT_SECRET'), v.minLength(32, 'JWT_SECRET has at least 32 characters')),
    /** The address people open; where it is left out, the loopback address that the server listens on. */
    PUBLIC_URL: v.optional(v.pipe(v.string(), v.url('PUBLIC_URL is the address people open, in full'))),
    SMTP_HOST: v.optional(text('SMTP_HOST'), '127.0.0.1'),
    SMTP_PORT: v.optional(wholeNumber('SMTP_PORT', 1, 65_535), '2525'),
    SMTP_SECURE: v.optional(flag, 'false'),
    SMTP_USER: v.optional(v.string(), ''),
    SMTP_PASSWORD: v.optional(v.string(), ''),
    SMTP_FROM: v.optional(text('SMTP_FROM'), 'Brimgate <advisories@brimgate.example>'),
    UI_FOLDER: v.optional(v.string(), ''),
    LOG_LEVEL: v.optional(v.picklist(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']), 'info'),
    DEMO_PASSWORD: v.optional(v.string(), ''),
    OUTBOX_POLL_MS: v.optional(wholeNumber('OUTBOX_POLL_MS', 50, 3_600_000), '1000'),
    /** First wait after a failed try; it doubles from there. */
    OUTBOX_BACKOFF_MS: v.optional(wholeNumber('OUTBOX_BACKOFF_MS', 10, 3_600_000), '30000'),
  }),
  v.forward(
    v.partialCheck(
      [['NODE_ENV'], ['DATABASE_RELAX_DURABILITY']],
      (env) => env.NODE_ENV !== 'production' || !env.DATABASE_RELAX_DURABILITY,
      'Durability cannot be relaxed in production',
    ),
    ['DATABASE_RELAX_DURABILITY'],
  ),
  v.forward(
    v.partialCheck(
      [['NODE_ENV'], ['PUBLIC_URL']],
      (env) => env.NODE_ENV !== 'production' || env.PUBLIC_URL !== undefined,
      'Set PUBLIC_URL',
    ),
    ['PUBLIC_URL'],
  ),
  v.transform((env) => ({ ...env, PUBLIC_URL: env.PUBLIC_URL ?? `http://127.0.0.1:${env.PORT}` })),
);
export type Env = v.InferOutput<typeof EnvSchema>;
