import type { Composition } from '@brimgate/rules';
import { Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { PersonModel } from '../accounts/person.model';

/** A firm's own feedstuff: what was analysed, resting on a book feedstuff for the rest. */
@Table({ tableName: 'feedstuffs' })
export class FeedstuffModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare name: string;

  @Column({ type: DataType.STRING(80), allowNull: true })
  declare bookFeedstuffId: string | null;

  @Column({ type: DataType.DATEONLY, allowNull: true })
  declare analysedOn: string | null;

  @Column({ type: DataType.STRING(500), allowNull: true })
  declare laboratory: string | null;

  @Column({ type: DataType.STRING(500), allowNull: true })
  declare note: string | null;

  @Column({ type: DataType.JSON, allowNull: false })
  declare analysed: Composition;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare version: number;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare savedAt: Date;

  @ForeignKey(() => PersonModel)
  @Column({ type: DataType.BIGINT, allowNull: false })
  declare savedById: number;
}
