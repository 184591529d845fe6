import { vi } from 'vitest';

export interface ApiCall {
  method: string;
  path: string;
  headers: Headers;
  body: unknown;
}

/** What the stand-in for the server says: a body (200), or a status with its body; `offline` when nothing answers. */
export type Reply = { status?: number; body?: unknown } | 'offline';

/** Answers by "GET /api/lots"; several replies are given one after the other, the last one again and again. */
export function stubApi(replies: Readonly<Record<string, Reply | Reply[]>>): ApiCall[] {
  const calls: ApiCall[] = [];
  vi.stubGlobal('fetch', async (path: string, request: RequestInit = {}) => {
    const method = request.method ?? 'GET';
    const asked = `${method} ${path}`;
    const before = calls.filter((call) => `${call.method} ${call.path}` === asked).length;
    const text = typeof request.body === 'string' ? request.body : null;
    calls.push({ method, path, headers: new Headers(request.headers), body: text === null ? null : JSON.parse(text) });
    const given = replies[asked];
    const reply = Array.isArray(given) ? (given[before] ?? given.at(-1)) : given;
    if (reply === undefined) throw new Error(`The test did not expect ${asked}`);
    if (reply === 'offline') throw new TypeError('Failed to fetch');
    return Promise.resolve(new Response(JSON.stringify(reply.body ?? null), { status: reply.status ?? 200 }));
  });
  return calls;
}

/** The server's refusal, in the shape it answers with. */
export function aRefusal(
  status: number,
  code: string,
  title: string,
  errors: { path: string; message: string }[] = [],
): Reply {
  return { status, body: { type: 'about:blank', title, status, code, errors } };
}
