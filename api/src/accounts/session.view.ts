import { type MembershipView, permissionsOf, type SessionView } from '@brimgate/rules';
import type { CurrentUser } from '../common/current-user';
import type { MembershipWithYards } from './memberships.service';

export function toMembershipView({ membership, yards }: MembershipWithYards): MembershipView {
  return {
    id: membership.uuid,
    firm: { id: membership.firm.uuid, name: membership.firm.name },
    role: membership.role,
    yards: yards.map(({ uuid, name, timeZone }) => ({ id: uuid, name, timeZone })),
  };
}

type Parts = {
  person: { uuid: string; name: string; email: string; licence: string | null };
  membershipId: CurrentUser['membershipId'];
  memberships: readonly MembershipWithYards[];
  endsAt: Date;
};

export function toSessionView({ person, membershipId, memberships, endsAt }: Parts): SessionView {
  const current = memberships.find(({ membership }) => membership.id === membershipId);
  if (!current) throw new Error('A session acts under a membership its person does not have');
  return {
    person: { id: person.uuid, name: person.name, email: person.email, licence: person.licence },
    membership: toMembershipView(current),
    memberships: memberships.map(toMembershipView),
    permissions: [...permissionsOf[current.membership.role]],
    endsAt: endsAt.toISOString(),
  };
}
