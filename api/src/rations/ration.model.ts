import { BelongsTo, Column, DataType, Model, Table } from 'sequelize-typescript';
import { YardModel } from '../yards/yard.model';

@Table({ tableName: 'rations', underscored: true, timestamps: false })
export class RationModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare yardId: number;

  @BelongsTo(() => YardModel, { foreignKey: 'yardId', constraints: false })
  declare yard: YardModel;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare name: string;

  /** The version that is being fed; null while none is released. */
  @Column({ type: DataType.INTEGER, allowNull: true })
  declare releasedVersionNumber: number | null;

  /** Grows with every act on the ration, so that a stale page is refused. */
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare version: number;
}
