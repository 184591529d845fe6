import * as v from 'valibot';
import { ScreeningRequest } from './screening-request.schema';

/** One fault of a request: where it is (`lines.2.sharePctDm`) and how to mend it. */
export interface RequestProblem {
  readonly path: string;
  readonly message: string;
}

export type ParsedRequest =
  | { readonly request: ScreeningRequest; readonly problems: null }
  | { readonly request: null; readonly problems: readonly RequestProblem[] };

/** Judges what claims to be a screening request; all faults at once, each with its full path. */
export function parseScreeningRequest(input: unknown): ParsedRequest {
  const result = v.safeParse(ScreeningRequest, input);
  if (result.success) return { request: result.output, problems: null };
  const problems = result.issues.map((issue) => ({ path: v.getDotPath(issue) ?? 'request', message: issue.message }));
  return { request: null, problems };
}
