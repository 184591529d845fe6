import type { DeliveryState, DeliveryView } from '@brimgate/rules';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** One mail to one address: written with the act it reports, sent afterwards by whoever claims it. */
@Table({ tableName: 'outbox_mails', underscored: true, timestamps: false })
export class OutboxMailModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare advisoryId: number;

  @Column({ type: DataType.STRING(254), allowNull: false })
  declare recipient: string;

  @Column({ type: DataType.STRING(16), allowNull: false })
  declare role: DeliveryView['role'];

  /** Frozen with the mail: a mail that goes out twice after a crash is known as one. */
  @Column({ type: DataType.STRING(200), allowNull: false })
  declare messageId: string;

  @Column({ type: DataType.STRING(8), allowNull: false })
  declare state: DeliveryState;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare attempts: number;

  @Column({ type: DataType.STRING(1000), allowNull: true })
  declare lastError: string | null;

  /** When a sender may take it up: the next try, or while it is being sent the end of the lease; null: never again. */
  @Column({ type: DataType.DATE(3), allowNull: true })
  declare dueAt: Date | null;

  /** Which claim holds the row, so that a sender whose lease ran out cannot mark it. */
  @Column({ type: DataType.CHAR(36), allowNull: true })
  declare leaseToken: string | null;

  @Column({ type: DataType.DATE(3), allowNull: true })
  declare sentAt: Date | null;
}
