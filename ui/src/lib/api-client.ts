import { Problem } from '@brimgate/rules';
import * as v from 'valibot';
import { ApiProblem, networkUnreachable, replyUnreadable } from './api-problem';
import { signInAgain } from './session-expiry';

export interface SendOptions {
  body?: unknown;
  /** The version that was read; goes out as If-Match. */
  ifMatch?: number;
  idempotencyKey?: string;
}

type Method = 'POST' | 'PUT' | 'DELETE';

/** One key per opened form or act: kept over retries, so that acting twice has one effect. */
export const newIdempotencyKey = (): string => crypto.randomUUID();

function requestOf(method: 'GET' | Method, options: SendOptions, signal?: AbortSignal): RequestInit {
  const headers = new Headers({ Accept: 'application/json' });
  if (options.body !== undefined) headers.set('Content-Type', 'application/json');
  if (options.ifMatch !== undefined) headers.set('If-Match', `"${options.ifMatch}"`);
  if (options.idempotencyKey !== undefined) headers.set('Idempotency-Key', options.idempotencyKey);
  return {
    method,
    headers,
    credentials: 'same-origin',
    body: options.body === undefined ? undefined : JSON.stringify(options.body),
    signal,
  };
}

async function fetchReply(path: string, request: RequestInit): Promise<Response> {
  try {
    return await fetch(`/api${path}`, request);
  } catch (error) {
    // A query that is no longer wanted is not a fault to show.
    if (request.signal?.aborted) throw error;
    throw networkUnreachable();
  }
}

async function bodyOf(response: Response): Promise<unknown> {
  const text = await response.text();
  if (text === '') return undefined;
  try {
    return JSON.parse(text);
  } catch {
    throw replyUnreadable(response.status);
  }
}

function problemIn(response: Response, body: unknown): ApiProblem {
  const parsed = v.safeParse(Problem, body);
  return parsed.success ? new ApiProblem(parsed.output) : replyUnreadable(response.status);
}

const isSignedOut = (problem: ApiProblem) =>
  problem.status === 401 && (problem.code === 'session-expired' || problem.code === 'session-missing');

async function call<Schema extends v.GenericSchema>(
  path: string,
  schema: Schema,
  request: RequestInit,
): Promise<v.InferOutput<Schema>> {
  let response = await fetchReply(path, request);
  let body = await bodyOf(response);
  if (response.status === 401 && !path.startsWith('/session') && isSignedOut(problemIn(response, body))) {
    if (await signInAgain()) {
      response = await fetchReply(path, request);
      body = await bodyOf(response);
    }
  }
  if (!response.ok) throw problemIn(response, body);
  const parsed = v.safeParse(schema, body);
  if (!parsed.success) throw replyUnreadable(response.status);
  return parsed.output;
}

/** The only way to the server. Paths are those below /api; replies are parsed by their schema. */
export const api = {
  get: <Schema extends v.GenericSchema>(path: string, schema: Schema, signal?: AbortSignal) =>
    call(path, schema, requestOf('GET', {}, signal)),
  send: <Schema extends v.GenericSchema>(method: Method, path: string, schema: Schema, options: SendOptions = {}) =>
    call(path, schema, requestOf(method, options)),
};

/** `?a=1&b=2` of what is given; empty when nothing is. */
export function queryText(parameters: Readonly<Record<string, string | number | null | undefined>>): string {
  const given = Object.entries(parameters).filter(([, value]) => value !== null && value !== undefined && value !== '');
  const text = new URLSearchParams(given.map(([name, value]) => [name, String(value)])).toString();
  return text === '' ? '' : `?${text}`;
}
