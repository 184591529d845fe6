import { Problem } from '@brimgate/rules';
import type { Response } from 'supertest';
import * as v from 'valibot';

/** A fault as it went over the wire: the right content type, and nothing but what the schema says. */
export function problemOf(response: Response): Problem {
  expect(response.headers['content-type']).toMatch(/^application\/problem\+json/);
  const problem = v.parse(Problem, JSON.parse(response.text));
  expect(problem.status).toBe(response.status);
  return problem;
}

export const pathsOf = (response: Response): string[] => problemOf(response).errors.map(({ path }) => path);

export const codeOf = (response: Response): string => problemOf(response).code;

/** An answer that holds what its schema says and nothing else. */
export function viewOf<Schema extends v.GenericSchema>(schema: Schema, response: Response): v.InferOutput<Schema> {
  return v.parse(schema, response.body);
}
