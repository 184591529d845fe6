import { randomUUID } from 'node:crypto';
import type { AddressInfo } from 'node:net';
import { connect } from 'node:net';
import request, { type Response } from 'supertest';
import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import { ORIGIN } from './support/agent';
import { codeOf, pathsOf, problemOf } from './support/answers';
import { createTestApp, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import type { TestPerson } from './support/factories';
import { aLotInput } from './support/lots';
import { aContent, anOperation, aRation, current, idOf, type Operation, quoted } from './support/operation';

const JSON_TYPE = 'application/json';

type Write = { method: 'post' | 'put'; path: string; by: TestPerson };

describe('bad input', () => {
  let test: TestApp;
  let owner: Sequelize;
  let operation: Operation;
  let writes: Write[];

  beforeAll(async () => {
    test = await createTestApp();
    owner = ownerConnection();
    operation = await anOperation(test);
    writes = await everyWrite();
  }, 60_000);
  afterAll(async () => {
    await owner.close();
    await test.close();
  });

  /** Every route that takes a body, at something that is there. */
  async function everyWrite(): Promise<Write[]> {
    const { nutritionist, compliance, administrator, yard } = operation;
    const ration = await aRation(operation);
    const lot = await compliance.agent.post('/api/lots').send(aLotInput(operation)).expect(201);
    const water = await nutritionist.agent.post('/api/water-sources').send({ yardId: yard.uuid, name: 'Pond' });
    const post = (path: string, by = nutritionist): Write => ({ method: 'post', path, by });
    const put = (path: string, by = nutritionist): Write => ({ method: 'put', path, by });
    return [
      put('/api/session/membership'),
      put(`/api/yards/${yard.uuid}`, administrator),
      post('/api/feedstuffs'),
      put(`/api/feedstuffs/${randomUUID()}`),
      post('/api/water-sources'),
      post(`/api/water-sources/${idOf(water.body)}/analyses`),
      post('/api/rations'),
      put(`/api/rations/${ration.id}`),
      post(`/api/rations/${ration.id}/screenings`),
      post(`/api/rations/${ration.id}/reviews`),
      post(`/api/rations/${ration.id}/releases`),
      post(`/api/releases/${randomUUID()}/stop`),
      post(`/api/reviews/${randomUUID()}/decisions`, operation.veterinarian),
      post('/api/lots', compliance),
      put(`/api/lots/${idOf(lot.body)}`, compliance),
    ];
  }

  const send = ({ method, path, by }: Write, body: string, type = JSON_TYPE) => {
    const server = request(test.app.getHttpServer());
    const sent = method === 'post' ? server.post(path) : server.put(path);
    return sent
      .set({ Origin: ORIGIN, Cookie: by.cookie, 'If-Match': '"1"', 'Idempotency-Key': randomUUID() })
      .type(type)
      .send(body);
  };

  async function rowsInAll(): Promise<number> {
    const tables = ['rations', 'ration_versions', 'screenings', 'feedstuffs', 'water_analyses', 'lots', 'audit_events'];
    const counts = tables.map((table) => `(SELECT COUNT(*) FROM ${table})`).join(' + ');
    const [row] = await owner.query<{ rows: number }>(`SELECT ${counts} AS \`rows\``, { type: QueryTypes.SELECT });
    return Number(row?.rows);
  }

  describe('to every route that takes a body', () => {
    it.each<[what: string, status: number, body: string, type: string]>([
      ['a list', 422, '[{"name":"x"}]', JSON_TYPE],
      ['an object without a field', 422, '{}', JSON_TYPE],
      ['fields nobody knows, __proto__ among them', 422, '{"__proto__":{"isAdmin":true},"surprise":1}', JSON_TYPE],
      ['half a document', 400, '{"name":', JSON_TYPE],
      ['NaN, which is no JSON', 400, '{"name":NaN}', JSON_TYPE],
      ['a bare word', 400, '"x"', JSON_TYPE],
      ['a form', 400, 'name=x', 'application/x-www-form-urlencoded'],
      ['XML', 400, '<a/>', 'application/xml'],
      ['two megabytes', 413, JSON.stringify({ name: 'x'.repeat(2_000_000) }), JSON_TYPE],
      ['brackets twenty thousand deep', 422, `{"draft":${'['.repeat(20_000)}${']'.repeat(20_000)}}`, JSON_TYPE],
    ])('%s is answered with %d and writes nothing', async (_, status, body, type) => {
      const before = await rowsInAll();
      for (const write of writes) {
        const response = await send(write, body, type);
        expect([write.path, response.status]).toEqual([write.path, status]);
        problemOf(response);
        expect(response.text).not.toMatch(/Invalid (key|type)|Expected |node_modules|sequelize/i);
      }
      expect(await rowsInAll()).toBe(before);
    });
  });

  it('names unknown fields and missing ones in words, all at once', async () => {
    const response = await operation.nutritionist.agent.post('/api/rations').send({ surprise: 1 }).expect(422);
    expect(problemOf(response).errors).toEqual([
      { path: 'yardId', message: 'This field is missing' },
      { path: 'name', message: 'This field is missing' },
      { path: 'surprise', message: 'There is no field named "surprise" here: leave it out' },
    ]);
  });

  describe('in a ration', () => {
    const screen = async (content: object): Promise<Response> => {
      const ration = await aRation(operation);
      const { agent } = operation.nutritionist;
      const response = await agent
        .post(`/api/rations/${ration.id}/screenings`)
        .set('If-Match', quoted(ration.version))
        .send(content);
      expect((await current(operation, ration)).version).toBe(ration.version);
      return response;
    };
    const withShare = (sharePctDm: unknown) => ({
      ...aContent(operation.waters.sweet),
      lines: [
        { feedstuffId: 'corn-grain-dry-rolled', sharePctDm },
        { feedstuffId: 'limestone', sharePctDm: 2 },
      ],
    });

    it.each<[share: unknown, path: string, message: RegExp]>([
      [98.02, 'lines', /100\.02/],
      [-1, 'lines.0.sharePctDm', /below 0/],
      [1e9, 'lines.0.sharePctDm', /above 100/],
      ['NaN', 'lines.0.sharePctDm', /Enter a share/],
      [null, 'lines.0.sharePctDm', /Enter a share/],
      [[98], 'lines.0.sharePctDm', /Enter a share/],
    ])('a share of %j is refused by its place', async (share, path, message) => {
      const { errors } = problemOf(await screen(withShare(share)));
      expect(errors.map((error) => error.path)).toEqual([path]);
      expect(errors[0]?.message).toMatch(message);
    });

    it('an object where a list is asked, and the other way round, is named', async () => {
      const content = { ...aContent(operation.waters.sweet), lines: { 0: {} }, waterIntake: [1] };
      expect(pathsOf(await screen(content))).toEqual(expect.arrayContaining(['lines']));
    });
  });

  describe('a date', () => {
    it.each(['2026-02-31', '0000-01-01', '2999-01-01', 'yesterday'])(
      'such as %s is refused once',
      async (sampledOn) => {
        const write = writes.find(({ path }) => path.endsWith('/analyses'));
        const body = {
          sampledOn,
          samplingPoint: null,
          laboratory: null,
          treatment: null,
          sulfate: null,
          nitrate: null,
        };
        if (!write) throw new Error('No route for water analyses');
        const response = await send(write, JSON.stringify({ ...body, totalDissolvedSolidsMgPerL: null })).expect(422);
        expect(pathsOf(response)).toEqual(['sampledOn']);
      },
    );

    it('a year later than meant makes no lot of three thousand years', async () => {
      const lot = aLotInput(operation, { startedOn: '2026-01-10', endedOn: '2036-06-12' });
      expect(pathsOf(await operation.compliance.agent.post('/api/lots').send(lot).expect(422))).toEqual(['endedOn']);
    });
  });

  describe('headers', () => {
    it('too long to read are a fault like any other', async () => {
      await test.app.listen(0, '127.0.0.1');
      const { port } = (test.app.getHttpServer() as { address: () => AddressInfo }).address();
      const answer = await rawAnswer(
        port,
        `GET /api/yards HTTP/1.1\r\nHost: a\r\nX-Long: ${'x'.repeat(20_000)}\r\n\r\n`,
      );
      expect(answer).toMatch(/^HTTP\/1\.1 431 /);
      expect(answer).toContain('application/problem+json');
      expect(answer).toContain('urn:brimgate:problem:headers-too-large');
      expect(await rawAnswer(port, 'no HTTP at all\r\n\r\n')).toContain('urn:brimgate:problem:request-unreadable');
    });

    it.each(['1', '"x"', '*', 'W/"1"', '"-1"', '"1", "2"'])(
      'of If-Match that hold no version (%s) are',
      async (header) => {
        const response = await operation.administrator.agent
          .put(`/api/yards/${operation.yard.uuid}`)
          .set('If-Match', header)
          .send({})
          .expect(400);
        expect(codeOf(response)).toBe('if-match-unreadable');
      },
    );
  });

  it('in a name is made one line that can be seen, wherever it goes', async () => {
    const name = 'Finisher\r\nBcc: all@yards.example\u0000\u202E';
    const { agent } = operation.nutritionist;
    const response = await agent.post('/api/rations').send({ yardId: operation.yard.uuid, name }).expect(201);
    expect((response.body as { name: string }).name).toBe('Finisher Bcc: all@yards.example');
  });
});

function rawAnswer(port: number, words: string): Promise<string> {
  return new Promise((resolve, reject) => {
    const socket = connect(port, '127.0.0.1', () => socket.write(words));
    let answer = '';
    socket.on('data', (part) => (answer += part.toString('utf8')));
    socket.on('end', () => resolve(answer));
    socket.on('error', reject);
  });
}
