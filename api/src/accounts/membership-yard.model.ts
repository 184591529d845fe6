import { BelongsTo, Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { YardModel } from '../yards/yard.model';

/** A yard a membership is assigned to. */
@Table({ tableName: 'membership_yards' })
export class MembershipYardModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true })
  declare firmId: number;

  @Column({ type: DataType.BIGINT, primaryKey: true })
  declare membershipId: number;

  @ForeignKey(() => YardModel)
  @Column({ type: DataType.BIGINT, primaryKey: true })
  declare yardId: number;

  @BelongsTo(() => YardModel)
  declare yard: YardModel;
}
