import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** People are global: what they may do at a firm is in their memberships. */
@Table({ tableName: 'people' })
export class PersonModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare name: string;

  @Column({ type: DataType.STRING(254), allowNull: false })
  declare email: string;

  @Column({ type: DataType.STRING(200), allowNull: true })
  declare licence: string | null;

  @Column({ type: DataType.STRING(200), allowNull: false })
  declare passwordHash: string;

  @Column({ type: DataType.BOOLEAN, allowNull: false })
  declare isActive: boolean;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;
}
