import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'firms' })
export class FirmModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare name: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;
}
