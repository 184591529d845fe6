import { randomUUID } from 'node:crypto';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { getModelToken } from '@nestjs/sequelize';
import type { Role } from '@brimgate/rules';
import { hashPassword } from '../../src/accounts/hashing';
import { MembershipModel } from '../../src/accounts/membership.model';
import { MembershipYardModel } from '../../src/accounts/membership-yard.model';
import { PersonModel } from '../../src/accounts/person.model';
import { SESSION_COOKIE } from '../../src/accounts/session-cookie';
import { SessionTokens } from '../../src/accounts/session-tokens';
import { SessionsService } from '../../src/accounts/sessions.service';
import type { CurrentUser } from '../../src/common/current-user';
import { FirmModel } from '../../src/firms/firm.model';
import { YardModel } from '../../src/yards/yard.model';
import { Agent } from './agent';
import type { TestApp } from './app';

export const PASSWORD = 'a long enough password of tests';

// Hashing takes its time on purpose: every test person has the same password, hashed once.
let passwordHash: Promise<string> | undefined;
const hashOnce = () => (passwordHash ??= hashPassword(PASSWORD));

let count = 0;
const next = () => (count += 1);

const modelOf = <Model extends new () => unknown>(app: NestExpressApplication, model: Model): Model =>
  app.get<Model>(getModelToken(model), { strict: false });

export function aFirm({ app }: TestApp, overrides: Partial<{ name: string }> = {}): Promise<FirmModel> {
  return modelOf(app, FirmModel).create({
    uuid: randomUUID(),
    name: `Firm ${next()}`,
    createdAt: new Date(),
    ...overrides,
  });
}

type YardOverrides = Partial<
  Pick<
    YardModel,
    | 'name'
    | 'timeZone'
    | 'advisoryEmail'
    | 'complianceGate'
    | 'capSignOff'
    | 'capNitrogenKgPerHead'
    | 'capPhosphorusKgPerHead'
  >
>;

export function aYard({ app }: TestApp, firm: FirmModel, overrides: YardOverrides = {}): Promise<YardModel> {
  const number = next();
  return modelOf(app, YardModel).create({
    uuid: randomUUID(),
    firmId: firm.id,
    name: `Yard ${number}`,
    timeZone: 'America/Denver',
    advisoryEmail: `yard-${number}@yards.example`,
    complianceGate: false,
    capSignOff: 'notice',
    capNitrogenKgPerHead: null,
    capPhosphorusKgPerHead: null,
    version: 1,
    createdAt: new Date(),
    ...overrides,
  });
}

type PersonOverrides = {
  role: Role;
  yards?: readonly YardModel[];
  name?: string;
  email?: string;
  licence?: string | null;
  isActive?: boolean;
};

export type TestPerson = {
  person: PersonModel;
  membership: MembershipModel;
  /** As a service gets it. */
  user: CurrentUser;
  /** Signed in. */
  agent: Agent;
  cookie: string;
};

/** Gives a person one more membership. */
export async function aMembership(
  { app }: TestApp,
  person: PersonModel,
  firm: FirmModel,
  { role, yards = [] }: Pick<PersonOverrides, 'role' | 'yards'>,
): Promise<MembershipModel> {
  const membership = await modelOf(app, MembershipModel).create({
    uuid: randomUUID(),
    firmId: firm.id,
    personId: person.id,
    role,
    isActive: true,
    createdAt: new Date(),
  });
  await modelOf(app, MembershipYardModel).bulkCreate(
    yards.map((yard) => ({ firmId: firm.id, membershipId: membership.id, yardId: yard.id })),
  );
  return membership;
}

/** A new session of a person under a membership. */
export async function aSession(
  { app }: TestApp,
  membership: MembershipModel,
): Promise<Pick<TestPerson, 'user' | 'agent' | 'cookie'>> {
  const sessions = app.get(SessionsService, { strict: false });
  const { personId, firmId, id: membershipId } = membership;
  const token = await sessions.start({ personId, firmId, membershipId });
  const cookie = `${SESSION_COOKIE}=${app.get(SessionTokens, { strict: false }).sign(token)}`;
  return { user: await sessions.resume(token), agent: new Agent(app, cookie), cookie };
}

/** A person with one membership, signed in. An administrator needs no yards. */
export async function aPerson(test: TestApp, firm: FirmModel, overrides: PersonOverrides): Promise<TestPerson> {
  const number = next();
  const person = await modelOf(test.app, PersonModel).create({
    uuid: randomUUID(),
    name: overrides.name ?? `Person ${number}`,
    email: overrides.email ?? `person-${number}@people.example`,
    licence:
      overrides.licence === undefined && overrides.role === 'veterinarian'
        ? `DVM ${number}`
        : (overrides.licence ?? null),
    passwordHash: await hashOnce(),
    isActive: overrides.isActive ?? true,
    createdAt: new Date(),
  });
  const membership = await aMembership(test, person, firm, overrides);
  if (!person.isActive) return { person, membership } as TestPerson;
  return { person, membership, ...(await aSession(test, membership)) };
}
