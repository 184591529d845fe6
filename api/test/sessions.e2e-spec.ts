import { Problem, SessionView } from '@brimgate/rules';
import request from 'supertest';
import * as v from 'valibot';
import { ORIGIN, signedOutAgent } from './support/agent';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import { aFirm, aMembership, aPerson, aSession, aYard, PASSWORD } from './support/factories';

describe('sessions', () => {
  let test: TestApp;
  const owner = ownerConnection();
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(async () => {
    await test.close();
    await owner.close();
  });

  const inThePast = (sessionId: number, column: 'last_seen_at' | 'ends_at', minutes: number) =>
    owner.query(
      `UPDATE sessions SET ${column} = UTC_TIMESTAMP(3) - INTERVAL ${minutes} MINUTE WHERE id = ${sessionId}`,
    );
  const lastSeenSecondsAgo = async (sessionId: number) => {
    const [rows] = await owner.query(
      `SELECT TIMESTAMPDIFF(SECOND, last_seen_at, UTC_TIMESTAMP(3)) AS seconds FROM sessions WHERE id = ${sessionId}`,
    );
    return (rows as { seconds: number }[])[0]?.seconds;
  };

  describe('signing in', () => {
    it('answers with the session and sets a cookie that only our own pages send and no script reads', async () => {
      const firm = await aFirm(test);
      const { person } = await aPerson(test, firm, { role: 'nutritionist' });
      const response = await signedOutAgent(test.app)
        .post('/api/session')
        .send({ email: person.email, password: PASSWORD })
        .expect(201);
      const session = v.parse(SessionView, response.body);
      expect(session.person).toEqual({ id: person.uuid, name: person.name, email: person.email, licence: null });
      const cookie = String(response.headers['set-cookie']);
      expect(cookie).toMatch(/^__Host-brimgate-session=/);
      for (const flag of ['HttpOnly', 'Secure', 'SameSite=Strict', 'Path=/']) expect(cookie).toContain(flag);
      expect(cookie).not.toContain('Domain');
    });

    it('puts nothing about the person in the cookie', async () => {
      const { cookie } = await aPerson(test, await aFirm(test), { role: 'compliance' });
      const claims = JSON.parse(Buffer.from(cookie.split('.')[1] ?? '', 'base64url').toString()) as object;
      expect(Object.keys(claims).sort()).toEqual(['exp', 'iat', 'sid']);
    });

    it('stores no token that a reader of the database could sign in with', async () => {
      const { cookie } = await aPerson(test, await aFirm(test), { role: 'compliance' });
      const { sid } = JSON.parse(Buffer.from(cookie.split('.')[1] ?? '', 'base64url').toString()) as { sid: string };
      const [rows] = await owner.query('SELECT * FROM sessions');
      expect(JSON.stringify(rows)).not.toContain(sid);
    });

    it('finds the address in capitals and with blanks around it too', async () => {
      const { person } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const email = `  ${person.email.toUpperCase()} `;
      await signedOutAgent(test.app).post('/api/session').send({ email, password: PASSWORD }).expect(201);
    });

    it('says the same to a wrong password, an unknown person, an inactive one and one without a membership', async () => {
      const firm = await aFirm(test);
      const { person } = await aPerson(test, firm, { role: 'nutritionist' });
      const inactive = await aPerson(test, firm, { role: 'nutritionist', isActive: false });
      const memberless = await aPerson(test, firm, { role: 'nutritionist' });
      await memberless.membership.update({ isActive: false });
      const tries = [
        { email: person.email, password: 'not the password of anybody' },
        { email: 'nobody@people.example', password: PASSWORD },
        { email: inactive.person.email, password: PASSWORD },
        { email: memberless.person.email, password: PASSWORD },
      ];
      const answers = [];
      for (const body of tries) {
        const response = await signedOutAgent(test.app).post('/api/session').send(body).expect(401);
        expect(response.headers['set-cookie']).toBeUndefined();
        answers.push(response.text);
      }
      expect(new Set(answers).size).toBe(1);
      expect(v.parse(Problem, JSON.parse(answers[0] ?? '')).code).toBe('sign-in-refused');
    });

    it('works as long for an unknown person as for a known one', async () => {
      const { person } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const millisecondsOf = async (email: string) => {
        const started = performance.now();
        await signedOutAgent(test.app).post('/api/session').send({ email, password: 'a wrong password' }).expect(401);
        return performance.now() - started;
      };
      const known: number[] = [];
      const unknown: number[] = [];
      for (let turn = 0; turn < 7; turn += 1) {
        known.push(await millisecondsOf(person.email));
        unknown.push(await millisecondsOf('nobody-at-all@people.example'));
      }
      // The fastest of several: what a busy machine adds is left out. Without a hash for nobody, the unknown would be
      // several times faster.
      expect(Math.min(...unknown)).toBeGreaterThan(Math.min(...known) / 2);
      expect(Math.min(...unknown)).toBeLessThan(Math.min(...known) * 2);
    });

    it('names every faulty field at once', async () => {
      const response = await signedOutAgent(test.app)
        .post('/api/session')
        .send({ email: 'nora', extra: 1 })
        .expect(422);
      const { errors } = v.parse(Problem, response.body);
      expect(errors.map(({ path }) => path).sort()).toEqual(['email', 'extra', 'password']);
    });

    it('stops a guesser after ten failures, while the person can still sign in from elsewhere', async () => {
      const { person } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const guess = () =>
        signedOutAgent(test.app)
          .post('/api/session')
          .send({ email: person.email, password: 'a guess at the password' });
      for (let turn = 0; turn < 10; turn += 1) await guess().expect(401);
      const stopped = await guess().expect(429);
      expect(v.parse(Problem, stopped.body).code).toBe('too-many-tries');
      expect(Number(stopped.headers['retry-after'])).toBeGreaterThan(0);
      await signedOutAgent(test.app).post('/api/session').send({ email: person.email, password: PASSWORD }).expect(429);
      await request(await elsewhere(test))
        .post('/api/session')
        .set('Origin', ORIGIN)
        .send({ email: person.email, password: PASSWORD })
        .expect(201);
    });

    it('lets no more guesses through when they come at once', async () => {
      const { person } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const guess = () =>
        signedOutAgent(test.app)
          .post('/api/session')
          .send({ email: person.email, password: 'a guess at the password' });
      const answers = await Promise.all(Array.from({ length: 20 }, guess));
      expect(answers.filter(({ status }) => status === 401)).toHaveLength(10);
      expect(answers.filter(({ status }) => status === 429)).toHaveLength(10);
    });
  });

  describe('a session that runs', () => {
    it('is asked for on every route but the open ones', async () => {
      const response = await signedOutAgent(test.app).get('/api/session').expect(401);
      expect(v.parse(Problem, response.body).code).toBe('session-missing');
    });

    it('is refused with a cookie that somebody else signed', async () => {
      const { cookie } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const forged = cookie.slice(0, -4) + (cookie.endsWith('AAAA') ? 'BBBB' : 'AAAA');
      await request(test.app.getHttpServer()).get('/api/session').set('Cookie', forged).expect(401);
    });

    it('costs one statement a request and is touched at most once a minute', async () => {
      const { agent, user } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const first = await statementsOf(test.sequelize, () => agent.get('/api/yards').expect(200));
      expect(first.filter((sql) => sql.includes('sessions'))).toHaveLength(1);
      await inThePast(user.sessionId, 'last_seen_at', 5);
      await agent.get('/api/yards').expect(200);
      expect(await lastSeenSecondsAgo(user.sessionId)).toBeLessThan(60);
    });

    it('still runs after 29 idle minutes and has ended after 30', async () => {
      const { agent, user } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      await inThePast(user.sessionId, 'last_seen_at', 29);
      await agent.get('/api/session').expect(200);
      await inThePast(user.sessionId, 'last_seen_at', 30);
      const response = await agent.get('/api/session').expect(401);
      expect(v.parse(Problem, response.body).code).toBe('session-expired');
    });

    it('ends twelve hours after signing in, however busy', async () => {
      const { agent, user } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const running = await agent.get('/api/session').expect(200);
      const hours = (Date.parse(v.parse(SessionView, running.body).endsAt) - Date.now()) / 3_600_000;
      expect(hours).toBeGreaterThan(11.9);
      expect(hours).toBeLessThanOrEqual(12);
      await inThePast(user.sessionId, 'ends_at', 0);
      const response = await agent.get('/api/session').expect(401);
      expect(v.parse(Problem, response.body).code).toBe('session-expired');
    });

    it('ends on signing out, also for a copy of the cookie, and leaves other sessions alone', async () => {
      const { agent, cookie, membership } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const other = await aSession(test, membership);
      const response = await agent.delete('/api/session').expect(204);
      expect(String(response.headers['set-cookie'])).toMatch(/^__Host-brimgate-session=;.*Expires=Thu, 01 Jan 1970/);
      await request(test.app.getHttpServer()).get('/api/session').set('Cookie', cookie).expect(401);
      await other.agent.get('/api/session').expect(200);
    });

    it('ends at once for a person or a membership that was made inactive', async () => {
      const firm = await aFirm(test);
      const left = await aPerson(test, firm, { role: 'nutritionist' });
      await left.person.update({ isActive: false });
      await left.agent.get('/api/session').expect(401);
      const moved = await aPerson(test, firm, { role: 'nutritionist' });
      await moved.membership.update({ isActive: false });
      await moved.agent.get('/api/session').expect(401);
    });

    it('follows a change of role at once', async () => {
      const { agent, membership } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      await agent.get('/api/people').expect(403);
      await membership.update({ role: 'administrator' });
      await agent.get('/api/people').expect(200);
    });
  });

  describe('the membership a session acts under', () => {
    it('changes to another of the same person and takes role, firm and yards with it', async () => {
      const home = await aFirm(test);
      const { agent, person } = await aPerson(test, home, { role: 'veterinarian' });
      const away = await aFirm(test);
      const yard = await aYard(test, away);
      const membership = await aMembership(test, person, away, { role: 'compliance', yards: [yard] });
      const response = await agent.put('/api/session/membership').send({ membershipId: membership.uuid }).expect(200);
      const session = v.parse(SessionView, response.body);
      expect(session.membership).toMatchObject({ id: membership.uuid, role: 'compliance', firm: { id: away.uuid } });
      expect(session.permissions).toContain('edit-lots');
      const yards = await agent.get('/api/yards').expect(200);
      expect((yards.body as { items: { id: string }[] }).items.map(({ id }) => id)).toEqual([yard.uuid]);
    });

    it('cannot be that of somebody else', async () => {
      const firm = await aFirm(test);
      const { agent } = await aPerson(test, firm, { role: 'nutritionist' });
      const other = await aPerson(test, firm, { role: 'administrator' });
      const response = await agent
        .put('/api/session/membership')
        .send({ membershipId: other.membership.uuid })
        .expect(422);
      expect(v.parse(Problem, response.body).errors[0]?.path).toBe('membershipId');
    });
  });

  describe('where a write comes from', () => {
    const origins = ['https://elsewhere.example', 'http://127.0.0.1:3001', 'null', `${ORIGIN}.elsewhere.example`];
    it.each(origins)('refuses a write from the pages of %s', async (origin) => {
      const { cookie } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      const response = await request(test.app.getHttpServer())
        .delete('/api/session')
        .set('Cookie', cookie)
        .set('Origin', origin)
        .expect(403);
      expect(v.parse(Problem, response.body).code).toBe('origin-refused');
      await request(test.app.getHttpServer()).get('/api/session').set('Cookie', cookie).expect(200);
    });

    it('refuses a write that does not say where it comes from', async () => {
      const { person } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      await request(test.app.getHttpServer())
        .post('/api/session')
        .send({ email: person.email, password: PASSWORD })
        .expect(403);
    });

    it('takes the other names of the loopback address as the same', async () => {
      const { cookie } = await aPerson(test, await aFirm(test), { role: 'nutritionist' });
      await request(test.app.getHttpServer())
        .delete('/api/session')
        .set('Cookie', cookie)
        .set('Origin', 'http://localhost:3000')
        .expect(204);
    });
  });
});

/** The same application, reached from another address of the loopback network. */
async function elsewhere({ app }: TestApp): Promise<string> {
  const server = app.getHttpServer();
  if (!server.listening) await new Promise<void>((resolve) => server.listen(0, '::', () => resolve()));
  const { port } = server.address() as { port: number };
  return `http://[::1]:${port}`;
}
