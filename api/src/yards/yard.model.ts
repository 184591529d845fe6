import type { YardInput } from '@brimgate/rules';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'yards' })
export class YardModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare name: string;

  @Column({ type: DataType.STRING(64), allowNull: false })
  declare timeZone: string;

  @Column({ type: DataType.STRING(254), allowNull: false })
  declare advisoryEmail: string;

  @Column({ type: DataType.BOOLEAN, allowNull: false })
  declare complianceGate: boolean;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare capSignOff: YardInput['capSignOff'];

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare capNitrogenKgPerHead: number | null;

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare capPhosphorusKgPerHead: number | null;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare version: number;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;
}
