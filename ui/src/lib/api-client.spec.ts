import * as v from 'valibot';
import { describe, expect, it, vi } from 'vitest';
import { aRefusal, stubApi } from '../../test/stub-api';
import { api, newIdempotencyKey, queryText } from './api-client';
import { ApiProblem } from './api-problem';
import { registerSignInAgain } from './session-expiry';

const Lot = v.strictObject({ name: v.string() });
const expired = aRefusal(401, 'session-expired', 'Your session has ended');

async function problemFrom(call: Promise<unknown>): Promise<ApiProblem> {
  const error: unknown = await call.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  if (error instanceof ApiProblem) return error;
  throw new Error('The call was expected to be refused');
}

describe('the API client', () => {
  it('parses what the server answers', async () => {
    stubApi({ 'GET /api/lots/1': { body: { name: '121' } } });
    await expect(api.get('/lots/1', Lot)).resolves.toEqual({ name: '121' });
  });

  it('says what it read, and acts once', async () => {
    const calls = stubApi({ 'PUT /api/lots/1': { body: { name: '122' } } });
    const idempotencyKey = newIdempotencyKey();
    await api.send('PUT', '/lots/1', Lot, { body: { name: '122' }, ifMatch: 7, idempotencyKey });
    const [call] = calls;
    expect(call?.headers.get('If-Match')).toBe('"7"');
    expect(call?.headers.get('Idempotency-Key')).toBe(idempotencyKey);
    expect(call?.body).toEqual({ name: '122' });
  });

  it('throws the server’s refusal with all of its faults', async () => {
    stubApi({ 'PUT /api/lots/1': aRefusal(422, 'invalid', 'Not saved', [{ path: 'head', message: 'Whole number' }]) });
    const { status, code, problem } = await problemFrom(api.send('PUT', '/lots/1', Lot, { body: {} }));
    expect([status, code]).toEqual([422, 'invalid']);
    expect(problem.errors).toEqual([{ path: 'head', message: 'Whole number' }]);
  });

  it('says that nothing answers, with status 0', async () => {
    stubApi({ 'GET /api/lots/1': 'offline' });
    const { status, code } = await problemFrom(api.get('/lots/1', Lot));
    expect([status, code]).toEqual([0, 'network-unreachable']);
  });

  it('does not trust an answer that is not in the agreed form', async () => {
    stubApi({ 'GET /api/lots/1': { body: { name: 121 } } });
    expect((await problemFrom(api.get('/lots/1', Lot))).code).toBe('reply-unreadable');
  });

  it('does not mistake a proxy’s page for an answer', async () => {
    vi.stubGlobal('fetch', () => Promise.resolve(new Response('<html>Bad gateway</html>', { status: 502 })));
    expect((await problemFrom(api.get('/lots/1', Lot))).code).toBe('reply-unreadable');
  });

  it('takes an answer without a body', async () => {
    vi.stubGlobal('fetch', () => Promise.resolve(new Response(null, { status: 204 })));
    await expect(api.send('DELETE', '/session', v.undefined())).resolves.toBeUndefined();
  });
});

describe('an expired session', () => {
  it('asks to sign in and lets the call through afterwards', async () => {
    const calls = stubApi({ 'POST /api/lots': [expired, { status: 201, body: { name: '121' } }] });
    const ask = vi.fn(() => Promise.resolve(true));
    const unregister = registerSignInAgain(ask);
    const options = { body: { name: '121' }, idempotencyKey: newIdempotencyKey() };
    await expect(api.send('POST', '/lots', Lot, options)).resolves.toEqual({ name: '121' });
    unregister();
    expect(ask).toHaveBeenCalledOnce();
    // The same key and body go out again: the act has one effect.
    expect(calls[1]?.headers.get('Idempotency-Key')).toBe(options.idempotencyKey);
    expect(calls[1]?.body).toEqual(options.body);
  });

  it('asks once for all calls that find out at the same time', async () => {
    stubApi({
      'GET /api/lots/1': [expired, { body: { name: '1' } }],
      'GET /api/lots/2': [expired, { body: { name: '2' } }],
    });
    let signIn = (): void => undefined;
    const ask = vi.fn(() => new Promise<boolean>((resolve) => (signIn = () => resolve(true))));
    const unregister = registerSignInAgain(ask);
    const both = Promise.all([api.get('/lots/1', Lot), api.get('/lots/2', Lot)]);
    await vi.waitFor(() => expect(ask).toHaveBeenCalled());
    signIn();
    await expect(both).resolves.toEqual([{ name: '1' }, { name: '2' }]);
    unregister();
    expect(ask).toHaveBeenCalledOnce();
  });

  it('stays a refusal when the person does not sign in', async () => {
    stubApi({ 'GET /api/lots/1': expired });
    const unregister = registerSignInAgain(() => Promise.resolve(false));
    expect((await problemFrom(api.get('/lots/1', Lot))).code).toBe('session-expired');
    unregister();
  });

  it('never asks because a sign-in was refused', async () => {
    stubApi({ 'POST /api/session': aRefusal(401, 'sign-in-refused', 'Not signed in') });
    const ask = vi.fn(() => Promise.resolve(true));
    const unregister = registerSignInAgain(ask);
    expect((await problemFrom(api.send('POST', '/session', Lot))).code).toBe('sign-in-refused');
    unregister();
    expect(ask).not.toHaveBeenCalled();
  });
});

it('writes only what is given into a query', () => {
  expect(queryText({ yard: 'a b', cursor: null, limit: 5, from: undefined, to: '' })).toBe('?yard=a+b&limit=5');
  expect(queryText({})).toBe('');
});
