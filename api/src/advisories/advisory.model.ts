import { BelongsTo, Column, DataType, HasMany, Model, Table } from 'sequelize-typescript';
import { OutboxMailModel } from '../outbox/outbox-mail.model';
import { RationModel } from '../rations/ration.model';
import { YardModel } from '../yards/yard.model';

/** The mail as it was rendered and frozen at release or stop. */
@Table({ tableName: 'advisories', underscored: true, timestamps: false })
export class AdvisoryModel extends Model {
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

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare rationId: number;

  @BelongsTo(() => RationModel, { foreignKey: 'rationId', constraints: false })
  declare ration: RationModel;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare releaseId: number;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare versionNumber: number;

  @Column({ type: DataType.STRING(8), allowNull: false })
  declare kind: 'release' | 'stop';

  @Column({ type: DataType.STRING(300), allowNull: false })
  declare subject: string;

  @Column({ type: DataType.TEXT('medium'), allowNull: false })
  declare html: string;

  @Column({ type: DataType.TEXT('medium'), allowNull: false })
  declare text: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare writtenAt: Date;

  @Column({ type: DataType.BIGINT, allowNull: true })
  declare acknowledgedById: number | null;

  @Column({ type: DataType.STRING(120), allowNull: true })
  declare acknowledgedByName: string | null;

  @Column({ type: DataType.DATE(3), allowNull: true })
  declare acknowledgedAt: Date | null;

  @HasMany(() => OutboxMailModel, { foreignKey: 'advisoryId', constraints: false })
  declare deliveries: OutboxMailModel[];
}
