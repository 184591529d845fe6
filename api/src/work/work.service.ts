import type { Role, WorkGroup, WorkView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { CurrentUser } from '../common/current-user';
import { DeskWork } from './desk-work.service';
import { LotWork } from './lot-work.service';
import { MailWork } from './mail-work.service';
import { RationWork } from './ration-work.service';

type Groups = (user: CurrentUser) => Promise<WorkGroup[]>;

/** What waits for a person in their role, the most pressing first. */
@Injectable()
export class WorkService {
  private readonly groupsOf: Readonly<Record<Role, Groups>> = {
    nutritionist: async (user) => {
      const [rations, waiting, mail] = await Promise.all([
        this.rations.groups(user),
        this.desk.waitingForOthers(user),
        this.mail.notDelivered(user),
      ]);
      return [...rations, waiting, mail];
    },
    veterinarian: (user) => Promise.all([this.desk.toSign(user, 'veterinarian'), this.desk.recentlyReleased(user)]),
    compliance: (user) =>
      Promise.all([this.desk.toSign(user, 'compliance'), this.lots.incomplete(user), this.desk.recentlyReleased(user)]),
    'yard-manager': (user) => Promise.all([this.mail.toAcknowledge(user), this.desk.recentlyReleased(user)]),
    administrator: (user) =>
      Promise.all([this.mail.notDelivered(user), this.desk.waitingForOthers(user), this.desk.recentlyReleased(user)]),
  };

  constructor(
    private readonly rations: RationWork,
    private readonly desk: DeskWork,
    private readonly mail: MailWork,
    private readonly lots: LotWork,
  ) {}

  async view(user: CurrentUser): Promise<WorkView> {
    return { groups: await this.groupsOf[user.role](user) };
  }
}
