import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { PersonView } from '@brimgate/rules';
import type { CurrentUser } from '../common/current-user';
import { afterCursor, pageOf } from '../common/keyset';
import type { PageQuery } from '../common/page-query';
import { ofFirm } from '../database/firm-scope';
import { YardModel } from '../yards/yard.model';
import { MembershipModel } from './membership.model';
import { MembershipYardModel } from './membership-yard.model';
import { toPersonView } from './person.view';
import { PersonModel } from './person.model';

@Injectable()
export class PeopleService {
  constructor(
    @InjectModel(MembershipModel) private readonly memberships: typeof MembershipModel,
    @InjectModel(MembershipYardModel) private readonly assignments: typeof MembershipYardModel,
  ) {}

  /** The firm's people in the order they joined; one item a membership. */
  async list(
    { cursor, limit }: PageQuery,
    user: CurrentUser,
  ): Promise<{ items: PersonView[]; nextCursor: string | null }> {
    const rows = await this.memberships.findAll({
      where: { ...ofFirm(user), ...afterCursor(cursor, { column: 'createdAt', direction: 'ASC' }) },
      include: [PersonModel],
      order: [
        ['createdAt', 'ASC'],
        ['id', 'ASC'],
      ],
      limit: limit + 1,
    });
    const assignments = await this.assignments.findAll({
      where: { ...ofFirm(user), membershipId: rows.map(({ id }) => id) },
      include: [{ model: YardModel, attributes: ['uuid', 'name'] }],
      order: [[{ model: YardModel, as: 'yard' }, 'name', 'ASC']],
    });
    return pageOf(rows, limit, {
      toItem: (row) =>
        toPersonView(
          row,
          assignments.filter(({ membershipId }) => membershipId === row.id),
        ),
      position: (row) => ({ at: row.createdAt.toISOString(), id: row.id }),
    });
  }
}
