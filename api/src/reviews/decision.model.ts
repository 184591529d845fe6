import type { Decision, SignerRole } from '@brimgate/rules';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A signature at the review desk. Inserted, never updated. */
@Table({ tableName: 'decisions', underscored: true, timestamps: false })
export class DecisionModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare reviewId: number;

  @Column({ type: DataType.STRING(16), allowNull: false })
  declare signedAs: SignerRole;

  @Column({ type: DataType.STRING(24), allowNull: false })
  declare decision: Decision;

  @Column({ type: DataType.TEXT, allowNull: true })
  declare reason: string | null;

  @Column({ type: DataType.JSON, allowNull: false })
  declare conditions: string[];

  @Column({ type: DataType.CHAR(64), allowNull: false })
  declare contentHash: string;

  /** What the signature means, in words, as it stood when it was given. */
  @Column({ type: DataType.STRING(500), allowNull: false })
  declare meaning: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare signerId: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare signerName: string;

  @Column({ type: DataType.STRING(200), allowNull: true })
  declare signerLicence: string | null;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare signedAt: Date;

  @Column({ type: DataType.STRING(64), allowNull: false })
  declare timeZone: string;
}
