import type { ReleaseState, ReleaseView } from '@brimgate/rules';
import { BelongsTo, Column, DataType, Model, Table } from 'sequelize-typescript';
import { RationModel } from '../rations/ration.model';
import { ScreeningModel } from '../screenings/screening.model';
import { YardModel } from '../yards/yard.model';

@Table({ tableName: 'releases', underscored: true, timestamps: false })
export class ReleaseModel extends Model {
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
  declare rationVersionId: number;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare versionNumber: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare screeningId: number;

  @BelongsTo(() => ScreeningModel, { foreignKey: 'screeningId', constraints: false })
  declare screening: ScreeningModel;

  @Column({ type: DataType.CHAR(64), allowNull: false })
  declare contentHash: string;

  @Column({ type: DataType.STRING(16), allowNull: false })
  declare state: ReleaseState;

  @Column({ type: DataType.TEXT, allowNull: true })
  declare reason: string | null;

  /** What was frozen to be fed, so that lists need no screening. */
  @Column({ type: DataType.JSON, allowNull: false })
  declare fedLines: ReleaseView['lines'];

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare releasedById: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare releasedByName: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare releasedAt: Date;

  @Column({ type: DataType.BIGINT, allowNull: true })
  declare stoppedById: number | null;

  @Column({ type: DataType.STRING(120), allowNull: true })
  declare stoppedByName: string | null;

  @Column({ type: DataType.DATE(3), allowNull: true })
  declare stoppedAt: Date | null;

  @Column({ type: DataType.TEXT, allowNull: true })
  declare stopReason: string | null;
}
