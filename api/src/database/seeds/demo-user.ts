import { MembershipModel } from '../../accounts/membership.model';
import { PersonModel } from '../../accounts/person.model';
import type { CurrentUser } from '../../common/current-user';
import { FirmModel } from '../../firms/firm.model';
import { YardModel } from '../../yards/yard.model';

/** A person of the demo as the services know who acts. */
export async function demoUser(firmName: string, email: string): Promise<CurrentUser> {
  const firm = await FirmModel.findOne({ where: { name: firmName }, rejectOnEmpty: true });
  const person = await PersonModel.findOne({ where: { email }, rejectOnEmpty: true });
  const membership = await MembershipModel.findOne({
    where: { firmId: firm.id, personId: person.id },
    include: [{ model: YardModel, through: { attributes: [] } }],
    rejectOnEmpty: true,
  });
  return {
    personId: person.id,
    personUuid: person.uuid,
    name: person.name,
    email: person.email,
    licence: person.licence,
    membershipId: membership.id,
    role: membership.role,
    firmId: firm.id,
    firmUuid: firm.uuid,
    firmName: firm.name,
    yardIds: membership.yards.map(({ id }) => id),
    sessionId: 0,
  };
}
