import type { PersonView } from '@brimgate/rules';
import type { MembershipModel } from './membership.model';
import type { MembershipYardModel } from './membership-yard.model';

export function toPersonView(
  { person, role, isActive }: MembershipModel,
  assignments: readonly MembershipYardModel[],
): PersonView {
  return {
    id: person.uuid,
    name: person.name,
    email: person.email,
    role,
    licence: person.licence,
    yards: assignments.map(({ yard }) => ({ id: yard.uuid, name: yard.name })),
    isActive: isActive && person.isActive,
  };
}
