import type { Role } from '@brimgate/rules';
import { BelongsTo, BelongsToMany, Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { FirmModel } from '../firms/firm.model';
import { YardModel } from '../yards/yard.model';
import { MembershipYardModel } from './membership-yard.model';
import { PersonModel } from './person.model';

/** What one person is at one firm. */
@Table({ tableName: 'memberships' })
export class MembershipModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @ForeignKey(() => FirmModel)
  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @ForeignKey(() => PersonModel)
  @Column({ type: DataType.BIGINT, allowNull: false })
  declare personId: number;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare role: Role;

  @Column({ type: DataType.BOOLEAN, allowNull: false })
  declare isActive: boolean;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;

  @BelongsTo(() => FirmModel)
  declare firm: FirmModel;

  @BelongsTo(() => PersonModel)
  declare person: PersonModel;

  @BelongsToMany(() => YardModel, {
    through: () => MembershipYardModel,
    foreignKey: 'membershipId',
    otherKey: 'yardId',
  })
  declare yards: YardModel[];
}
