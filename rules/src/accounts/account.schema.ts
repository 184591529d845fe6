import * as v from 'valibot';
import { Id, Instant, Reference } from '../common/wire.schema';

export const Role = v.picklist(['nutritionist', 'veterinarian', 'compliance', 'yard-manager', 'administrator']);
export type Role = v.InferOutput<typeof Role>;

/** What a person may do; the server decides from the role, the interface explains with it. */
export const Permission = v.picklist([
  'read-rations',
  'edit-rations',
  'screen-rations',
  'submit-rations',
  'sign-as-veterinarian',
  'sign-as-compliance',
  'release-rations',
  'stop-releases',
  'read-feedstuffs',
  'edit-feedstuffs',
  'read-water',
  'edit-water',
  'read-advisories',
  'acknowledge-advisories',
  'retry-deliveries',
  'read-lots',
  'edit-lots',
  'read-ledger',
  'read-yards',
  'edit-yards',
  'read-people',
  'read-audit',
]);
export type Permission = v.InferOutput<typeof Permission>;

/** The one table of who may do what. */
export const permissionsOf: Readonly<Record<Role, readonly Permission[]>> = {
  nutritionist: [
    'read-rations',
    'edit-rations',
    'screen-rations',
    'submit-rations',
    'release-rations',
    'stop-releases',
    'read-feedstuffs',
    'edit-feedstuffs',
    'read-water',
    'edit-water',
    'read-advisories',
    'retry-deliveries',
    'read-lots',
    'read-ledger',
    'read-yards',
  ],
  veterinarian: [
    'read-rations',
    'sign-as-veterinarian',
    'stop-releases',
    'read-feedstuffs',
    'read-water',
    'read-advisories',
    'read-lots',
    'read-yards',
  ],
  compliance: [
    'read-rations',
    'sign-as-compliance',
    'read-feedstuffs',
    'read-water',
    'read-advisories',
    'read-lots',
    'edit-lots',
    'read-ledger',
    'read-yards',
  ],
  'yard-manager': [
    'read-rations',
    'read-feedstuffs',
    'read-water',
    'edit-water',
    'read-advisories',
    'acknowledge-advisories',
    'read-lots',
    'read-yards',
  ],
  administrator: [
    'read-rations',
    'read-feedstuffs',
    'read-water',
    'read-advisories',
    'retry-deliveries',
    'read-lots',
    'read-ledger',
    'read-yards',
    'edit-yards',
    'read-people',
    'read-audit',
  ],
};

export const SignInInput = v.strictObject({
  email: v.pipe(v.string('Enter your e-mail address'), v.trim(), v.email('Enter the e-mail address in full')),
  password: v.pipe(v.string('Enter your password'), v.nonEmpty('Enter your password'), v.maxLength(256)),
});
export type SignInInput = v.InferOutput<typeof SignInInput>;

export const MembershipView = v.strictObject({
  id: Id,
  firm: Reference,
  role: Role,
  /** The yards this person is assigned to; an administrator sees all yards of the firm. */
  yards: v.array(v.strictObject({ id: Id, name: v.string(), timeZone: v.string() })),
});
export type MembershipView = v.InferOutput<typeof MembershipView>;

export const SessionView = v.strictObject({
  person: v.strictObject({
    id: Id,
    name: v.string(),
    email: v.string(),
    /** A veterinarian's licence as it is printed in the signature. */
    licence: v.nullable(v.string()),
  }),
  /** The membership that this session acts under. */
  membership: MembershipView,
  memberships: v.array(MembershipView),
  permissions: v.array(Permission),
  /** When the session ends whatever is done (12 hours after sign-in). */
  endsAt: Instant,
});
export type SessionView = v.InferOutput<typeof SessionView>;

export const MembershipChoice = v.strictObject({ membershipId: Id });
export type MembershipChoice = v.InferOutput<typeof MembershipChoice>;

export const PersonView = v.strictObject({
  id: Id,
  name: v.string(),
  email: v.string(),
  role: Role,
  licence: v.nullable(v.string()),
  yards: v.array(Reference),
  isActive: v.boolean(),
});
export type PersonView = v.InferOutput<typeof PersonView>;
