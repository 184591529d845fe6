import request from 'supertest';
import { ORIGIN, signedOutAgent } from './support/agent';
import { codeOf, problemOf } from './support/answers';
import { createTestApp, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import { aFirm, aPerson } from './support/factories';

describe('what goes over the wire', () => {
  let test: TestApp;
  const server = () => request(test.app.getHttpServer());
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());

  describe('security headers', () => {
    it.each(['/', '/rations/1', '/api/session', '/livez'])('stand on %s', async (path) => {
      const { headers } = await server().get(path);
      const policy = String(headers['content-security-policy']);
      for (const part of [
        "default-src 'none'",
        "script-src 'self'",
        "object-src 'none'",
        "base-uri 'none'",
        "frame-ancestors 'none'",
      ]) {
        expect(policy).toContain(part);
      }
      expect(policy).not.toMatch(/script-src[^;]*unsafe/);
      expect(headers['x-content-type-options']).toBe('nosniff');
      expect(headers['x-frame-options']).toBe('DENY');
      expect(headers['referrer-policy']).toBe('no-referrer');
      expect(headers['x-powered-by']).toBeUndefined();
      expect(headers['access-control-allow-origin']).toBeUndefined();
    });

    it('keep answers with data out of every cache', async () => {
      const { agent } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      expect((await agent.get('/api/yards').expect(200)).headers['cache-control']).toBe('no-store');
    });
  });

  describe('the pages', () => {
    it('are the built HTML at every address that is no file, asked for anew each time', async () => {
      for (const path of ['/', '/rations/0b2f', '/sign-in?next=/lots']) {
        const response = await server().get(path).expect(200);
        expect(response.text).toContain('the page');
        expect(response.headers['content-type']).toMatch(/^text\/html; charset=utf-8/i);
        expect(response.headers['cache-control']).toBe('no-cache');
      }
    });

    it('let files with a hash in their name be kept for a year', async () => {
      const response = await server().get('/assets/index-0a1b2c3d.css').expect(200);
      expect(response.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    });

    it('do not stand in for a file that is missing, nor reach outside their folder', async () => {
      await server().get('/assets/index-gone.js').expect(404);
      const outside = await server().get('/assets/..%2f..%2fapp.ts');
      expect(outside.text).not.toContain('createTestApp');
    });
  });

  describe('faults', () => {
    it('are problem+json below /api for an address that is none', async () => {
      const { agent } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      expect(codeOf(await agent.get('/api/moon').expect(404))).toBe('not-found');
      expect(codeOf(await agent.post('/moon').expect(404))).toBe('not-found');
      expect(codeOf(await agent.patch('/api/session').expect(404))).toBe('not-found');
    });

    it.each([
      ['half a document', 'application/json', '{"email": "a'],
      ['a bare word', 'application/json', 'null'],
      ['a form', 'application/x-www-form-urlencoded', 'email=a&password=b'],
      ['nothing', 'text/plain', ''],
    ])('answer 400 to %s', async (_, type, body) => {
      const response = await server().post('/api/session').set('Origin', ORIGIN).set('Content-Type', type).send(body);
      expect(response.status).toBe(400);
      problemOf(response);
    });

    it('answer 413 to a body larger than any form', async () => {
      const body = { email: 'a@people.example', password: 'x'.repeat(300_000) };
      expect(codeOf(await signedOutAgent(test.app).post('/api/session').send(body).expect(413))).toBe(
        'request-too-large',
      );
    });

    it('pollute no prototype', async () => {
      const body =
        '{"email":"a@people.example","password":"b","__proto__":{"isAdmin":true},"constructor":{"prototype":{}}}';
      await server()
        .post('/api/session')
        .set('Origin', ORIGIN)
        .set('Content-Type', 'application/json')
        .send(body)
        .expect(422);
      expect(({} as { isAdmin?: boolean }).isAdmin).toBeUndefined();
    });

    it('of the inside give a reference and tell nothing else', async () => {
      const { agent } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const owner = ownerConnection();
      await owner.query('RENAME TABLE feedstuffs TO feedstuffs_gone');
      try {
        const response = await agent.get('/api/feedstuffs').expect(500);
        const problem = problemOf(response);
        expect(problem.reference).toMatch(/^[0-9a-f-]{36}$/);
        expect(response.text).not.toMatch(/feedstuffs_gone|SELECT|Sequelize|node_modules/);
      } finally {
        await owner.query('RENAME TABLE feedstuffs_gone TO feedstuffs');
        await owner.close();
      }
    });
  });

  describe('health', () => {
    it('is alive without asking the database, and ready when database and schema are right', async () => {
      await server().get('/livez').expect(200);
      const response = await server().get('/readyz').expect(200);
      expect(response.body).toEqual({ status: 'ready', obstacles: [] });
    });

    it('is not ready while a migration is missing', async () => {
      const owner = ownerConnection();
      await owner.query("UPDATE migrations SET name = CONCAT(name, '-gone') WHERE name LIKE '%create-audit-events'");
      try {
        const response = await server().get('/readyz').expect(503);
        expect(response.text).toContain('create-audit-events is not applied');
      } finally {
        await owner.query("UPDATE migrations SET name = REPLACE(name, '-gone', '')");
        await owner.close();
      }
    });
  });
});
