import type { FindingStatus, Screening } from '@brimgate/rules';
import type { SignOff } from '@brimgate/reference-tables';
import { BelongsTo, Column, DataType, Model, Table } from 'sequelize-typescript';
import { RationModel } from '../rations/ration.model';
import { ScreeningRequestModel } from './screening-request.model';

/** Inserted, never updated: a correction is a new screening that names the one it follows. */
@Table({ tableName: 'screenings', underscored: true, timestamps: false })
export class ScreeningModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare yardId: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare rationId: number;

  @BelongsTo(() => RationModel, { foreignKey: 'rationId', constraints: false })
  declare ration: RationModel;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare rationVersionId: number;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare versionNumber: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare requestId: number;

  @BelongsTo(() => ScreeningRequestModel, { foreignKey: 'requestId', constraints: false })
  declare request: ScreeningRequestModel;

  @Column({ type: DataType.CHAR(64), allowNull: false })
  declare contentHash: string;

  /** The screening of the same ration that stood before. */
  @Column({ type: DataType.BIGINT, allowNull: true })
  declare followsId: number | null;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare rulesVersion: string;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare edition: string;

  @Column({ type: DataType.STRING(16), allowNull: false })
  declare verdict: FindingStatus;

  @Column({ type: DataType.STRING(16), allowNull: false })
  declare signOff: SignOff;

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare sulfurPctDm: number | null;

  /** The gravest finding in one sentence, for lists that do not load the whole screening. */
  @Column({ type: DataType.STRING(1000), allowNull: false })
  declare headline: string;

  @Column({ type: DataType.JSON, allowNull: false })
  declare screening: Screening;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare screenedById: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare screenedByName: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare screenedAt: Date;
}
