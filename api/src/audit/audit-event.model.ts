import type { AuditEventView } from '@brimgate/rules';
import { BelongsTo, Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { YardModel } from '../yards/yard.model';

/** What somebody did, inserted in the transaction that did it; the application's user cannot change it afterwards. */
@Table({ tableName: 'audit_events' })
export class AuditEventModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare at: Date;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare personId: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare personName: string;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare role: string;

  @Column({ type: DataType.STRING(60), allowNull: false })
  declare act: string;

  @Column({ type: DataType.STRING(1000), allowNull: false })
  declare sentence: string;

  @Column({ type: DataType.STRING(40), allowNull: false })
  declare subjectKind: string;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare subjectUuid: string;

  @Column({ type: DataType.STRING(200), allowNull: false })
  declare subjectName: string;

  @ForeignKey(() => YardModel)
  @Column({ type: DataType.BIGINT, allowNull: true })
  declare yardId: number | null;

  @Column({ type: DataType.JSON, allowNull: false })
  declare changes: AuditEventView['changes'];

  @BelongsTo(() => YardModel)
  declare yard: YardModel | null;
}
