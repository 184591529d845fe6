import { BelongsTo, Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { YardModel } from '../yards/yard.model';

@Table({ tableName: 'water_sources' })
export class WaterSourceModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @ForeignKey(() => YardModel)
  @Column({ type: DataType.BIGINT, allowNull: false })
  declare yardId: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare name: string;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare version: number;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;

  @BelongsTo(() => YardModel)
  declare yard: YardModel;
}
