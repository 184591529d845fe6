import * as v from 'valibot';
import { type Env, EnvSchema } from './env.schema';

/** Every fault of the environment at once, one a line, without any value: secrets stay out of logs. */
export class EnvironmentFaulty extends Error {
  constructor(faults: readonly string[]) {
    super(`The environment is not complete:\n${faults.map((fault) => `  ${fault}`).join('\n')}`);
    this.name = 'EnvironmentFaulty';
  }
}

export function parseEnv(source: Readonly<Record<string, string | undefined>>): Env {
  const result = v.safeParse(EnvSchema, source);
  if (!result.success) throw new EnvironmentFaulty(result.issues.map((issue) => issue.message));
  return result.output;
}

/** The only reader of process.env. */
export const env: Env = parseEnv(process.env);
