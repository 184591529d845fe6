import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { acrossFirms } from '../database/firm-scope';
import { FirmModel } from '../firms/firm.model';
import { YardModel } from '../yards/yard.model';
import { MembershipModel } from './membership.model';

export type MembershipWithYards = { membership: MembershipModel; yards: YardModel[] };

@Injectable()
export class MembershipsService {
  constructor(
    @InjectModel(MembershipModel) private readonly memberships: typeof MembershipModel,
    @InjectModel(YardModel) private readonly yards: typeof YardModel,
  ) {}

  /** All active memberships of one person, oldest first: the first is the one a new session acts under. */
  async ofPerson(personId: number): Promise<MembershipWithYards[]> {
    const rows = await this.memberships.findAll(
      acrossFirms(
        {
          where: { personId, isActive: true },
          include: [FirmModel, { model: YardModel, through: { attributes: [] } }],
          order: [['id', 'ASC'] as [string, string]],
        },
        'a person is global and chooses among firms here',
      ),
    );
    const administered = rows.filter(({ role }) => role === 'administrator').map(({ firmId }) => firmId);
    const allYards =
      administered.length === 0
        ? []
        : await this.yards.findAll({ where: { firmId: administered }, order: [['name', 'ASC']] });
    return rows.map((membership) => ({
      membership,
      yards:
        membership.role === 'administrator'
          ? allYards.filter(({ firmId }) => firmId === membership.firmId)
          : membership.yards.toSorted((a, b) => a.name.localeCompare(b.name, 'en')),
    }));
  }
}
