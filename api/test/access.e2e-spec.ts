import { randomUUID } from 'node:crypto';
import { permissionsOf, type Permission, Problem, type Role } from '@brimgate/rules';
import * as v from 'valibot';
import { type Agent, signedOutAgent } from './support/agent';
import { createTestApp, type TestApp } from './support/app';
import { aFirm, aPerson, aYard, PASSWORD, type TestPerson } from './support/factories';
import { aLotInput } from './support/lots';
import {
  anOperation,
  aRation,
  aWithinContent,
  hashOf,
  idOf,
  inReview,
  type Operation,
  quoted,
  REASON,
  released,
  reviewIdOf,
  screened,
  screeningIdOf,
} from './support/operation';

type Subject = {
  rationId: string;
  rationVersion: number;
  screeningId: string;
  reviewId: string;
  contentHash: string;
  releaseId: string;
  advisoryId: string;
  deliveryId: string;
  lotId: string;
  yardId: string;
};

type Route = {
  method: 'get' | 'post' | 'put';
  path: (subject: Subject) => string;
  permissions: Permission[];
  body?: (subject: Subject, operation: Operation) => object;
};

const ROUTES: Route[] = [
  { method: 'get', path: (s) => `/api/rations/${s.rationId}`, permissions: ['read-rations'] },
  {
    method: 'put',
    path: (s) => `/api/rations/${s.rationId}`,
    permissions: ['edit-rations'],
    body: (_, operation) => ({ name: 'Taken over', draft: aWithinContent(operation) }),
  },
  {
    method: 'post',
    path: (s) => `/api/rations/${s.rationId}/screenings`,
    permissions: ['screen-rations'],
    body: (_, operation) => aWithinContent(operation),
  },
  { method: 'get', path: (s) => `/api/screenings/${s.screeningId}`, permissions: ['read-rations'] },
  {
    method: 'post',
    path: (s) => `/api/rations/${s.rationId}/reviews`,
    permissions: ['submit-rations'],
    body: (s) => ({ screeningId: s.screeningId, reason: REASON }),
  },
  { method: 'get', path: (s) => `/api/reviews/${s.reviewId}`, permissions: ['read-rations'] },
  { method: 'post', path: (s) => `/api/reviews/${s.reviewId}/withdrawal`, permissions: ['submit-rations'] },
  {
    method: 'post',
    path: (s) => `/api/reviews/${s.reviewId}/decisions`,
    permissions: ['sign-as-veterinarian', 'sign-as-compliance'],
    body: (s) => ({ decision: 'concur', reason: null, conditions: [], contentHash: s.contentHash, password: PASSWORD }),
  },
  { method: 'get', path: (s) => `/api/rations/${s.rationId}/advisory-preview`, permissions: ['release-rations'] },
  {
    method: 'post',
    path: (s) => `/api/rations/${s.rationId}/releases`,
    permissions: ['release-rations'],
    body: (s) => ({ screeningId: s.screeningId, reason: null }),
  },
  { method: 'get', path: (s) => `/api/releases/${s.releaseId}`, permissions: ['read-rations'] },
  {
    method: 'post',
    path: (s) => `/api/releases/${s.releaseId}/stop`,
    permissions: ['stop-releases'],
    body: () => ({ reason: REASON }),
  },
  { method: 'get', path: (s) => `/api/advisories/${s.advisoryId}`, permissions: ['read-advisories'] },
  {
    method: 'post',
    path: (s) => `/api/advisories/${s.advisoryId}/acknowledgement`,
    permissions: ['acknowledge-advisories'],
  },
  {
    method: 'post',
    path: (s) => `/api/advisories/${s.advisoryId}/deliveries/${s.deliveryId}/retry`,
    permissions: ['retry-deliveries'],
  },
  { method: 'get', path: (s) => `/api/lots/${s.lotId}`, permissions: ['read-lots'] },
  {
    method: 'put',
    path: (s) => `/api/lots/${s.lotId}`,
    permissions: ['edit-lots'],
    body: (_, operation) => aLotInput(operation),
  },
  {
    method: 'get',
    path: (s) => `/api/ledger?yardId=${s.yardId}&from=2026-01-01&to=2026-12-31`,
    permissions: ['read-ledger'],
  },
  {
    method: 'get',
    path: (s) => `/api/ledger.csv?yardId=${s.yardId}&from=2026-01-01&to=2026-12-31`,
    permissions: ['read-ledger'],
  },
];

const LISTS: { path: string; permission: Permission | null }[] = [
  { path: '/api/rations', permission: 'read-rations' },
  { path: '/api/reviews', permission: 'read-rations' },
  { path: '/api/releases', permission: 'read-rations' },
  { path: '/api/advisories', permission: 'read-advisories' },
  { path: '/api/lots', permission: 'read-lots' },
];

const ROLES = Object.keys(permissionsOf) as Role[];
const may = (role: Role, permissions: readonly Permission[]) =>
  permissions.some((permission) => permissionsOf[role].includes(permission));
const title = ({ method, path }: Route) => `${method.toUpperCase()} ${path(PLACEHOLDERS)}`;
const PLACEHOLDERS: Subject = {
  rationId: ':ration',
  rationVersion: 0,
  screeningId: ':screening',
  reviewId: ':review',
  contentHash: '',
  releaseId: ':release',
  advisoryId: ':advisory',
  deliveryId: ':delivery',
  lotId: ':lot',
  yardId: ':yard',
};

describe('who reaches what', () => {
  let test: TestApp;
  let operation: Operation;
  let subject: Subject;
  /** The same roles at the next yard of the firm, and at another firm. */
  const neighbours = new Map<Role, TestPerson>();
  const strangers = new Map<Role, TestPerson>();

  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test);
    subject = await aSubject(operation);
    const nextYard = await aYard(test, operation.firm);
    const otherFirm = await aFirm(test);
    const otherYard = await aYard(test, otherFirm);
    for (const role of ROLES) {
      // An administrator sees every yard of the firm, so the next yard keeps nothing from them.
      if (role !== 'administrator')
        neighbours.set(role, await aPerson(test, operation.firm, { role, yards: [nextYard] }));
      strangers.set(role, await aPerson(test, otherFirm, { role, yards: [otherYard] }));
    }
    // Fifteen people and one of everything: more than the time of one test.
  }, 90_000);
  afterAll(() => test.close());

  const send = (agent: Agent, { method, path, body }: Route, seen: Subject = subject) => {
    const request = agent[method](path(seen))
      .set('If-Match', quoted(seen.rationVersion))
      .set('Idempotency-Key', randomUUID());
    return method === 'get' ? request : request.send(body?.(seen, operation) ?? {});
  };

  describe.each(ROUTES.map((route) => [title(route), route] as const))('%s', (_, route) => {
    it('asks for a session', async () => {
      const response = await send(signedOutAgent(test.app), route).expect(401);
      expect(v.parse(Problem, response.body).code).toBe('session-missing');
    });

    it('refuses every role that lacks the act', async () => {
      for (const role of ROLES.filter((each) => !may(each, route.permissions))) {
        const response = await send(personOf(operation, role).agent, route);
        expect([role, response.status]).toEqual([role, 403]);
      }
    });

    it('answers the same to another yard and to another firm as to what is not there', async () => {
      for (const role of ROLES.filter((each) => may(each, route.permissions))) {
        const mine = personOf(operation, role).agent;
        const nowhere = await send(mine, route, somewhereElse(subject));
        expect([role, nowhere.status]).toEqual([role, 404]);
        for (const outsider of [neighbours.get(role), strangers.get(role)]) {
          if (!outsider) continue;
          const response = await send(outsider.agent, route);
          expect([role, response.status, response.body]).toEqual([role, 404, nowhere.body]);
        }
      }
    });
  });

  describe.each(LISTS)('GET $path', ({ path, permission }) => {
    it('asks for a session', async () => {
      await signedOutAgent(test.app).get(path).expect(401);
    });

    it('shows the yard’s own people something, and others nothing of it', async () => {
      for (const role of ROLES) {
        const expected = permission === null || may(role, [permission]) ? 200 : 403;
        const own = await personOf(operation, role).agent.get(path);
        expect([role, own.status]).toEqual([role, expected]);
        if (expected !== 200) continue;
        expect(itemsOf(own.body).length).toBeGreaterThan(0);
        for (const outsider of [neighbours.get(role), strangers.get(role)]) {
          if (!outsider) continue;
          const response = await outsider.agent.get(path).expect(200);
          expect(itemsOf(response.body)).toEqual([]);
        }
      }
    });

    it.each(['cursor=not-a-cursor', 'limit=0', 'limit=101', 'limit=x', 'surprise=1'])(
      'refuses ?%s by name',
      async (query) => {
        const response = await operation.nutritionist.agent.get(`${path}?${query}`).expect(422);
        expect(v.parse(Problem, response.body).errors[0]?.path).toBe(query.split('=')[0]);
      },
    );
  });
});

const itemsOf = (body: unknown) => (body as { items: unknown[] }).items;

function personOf(operation: Operation, role: Role): TestPerson {
  const people: Record<Role, TestPerson> = {
    nutritionist: operation.nutritionist,
    veterinarian: operation.veterinarian,
    compliance: operation.compliance,
    'yard-manager': operation.yardManager,
    administrator: operation.administrator,
  };
  return people[role];
}

function somewhereElse(subject: Subject): Subject {
  const nowhere = randomUUID();
  return {
    ...subject,
    rationId: nowhere,
    screeningId: nowhere,
    reviewId: nowhere,
    releaseId: nowhere,
    advisoryId: nowhere,
    deliveryId: nowhere,
    lotId: nowhere,
    yardId: nowhere,
  };
}

/** One of everything: a ration in review, a release with its advisory, a lot. */
async function aSubject(operation: Operation): Promise<Subject> {
  const reviewed = await inReview(operation);
  const fed = await released(
    operation,
    await screened(operation, aWithinContent(operation), await aRation(operation, 'Fed now')),
  );
  const { agent } = operation.nutritionist;
  const advisories = await agent.get('/api/advisories').expect(200);
  const [advisory] = itemsOf(advisories.body) as { id: string; deliveries: { id: string }[] }[];
  const lot = await operation.compliance.agent.post('/api/lots').send(aLotInput(operation)).expect(201);
  return {
    rationId: reviewed.id,
    rationVersion: reviewed.version,
    screeningId: screeningIdOf(reviewed),
    reviewId: reviewIdOf(reviewed),
    contentHash: hashOf(reviewed),
    releaseId: fed.releaseId ?? '',
    advisoryId: advisory?.id ?? '',
    deliveryId: advisory?.deliveries[0]?.id ?? '',
    lotId: idOf(lot.body),
    yardId: operation.yard.uuid,
  };
}
