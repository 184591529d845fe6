import type { RationDraft, RationState } from '@brimgate/rules';
import { BelongsTo, Column, DataType, Model, Table } from 'sequelize-typescript';
import { ScreeningModel } from '../screenings/screening.model';
import { RationModel } from './ration.model';

@Table({ tableName: 'ration_versions', underscored: true, timestamps: false })
export class RationVersionModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare rationId: number;

  @BelongsTo(() => RationModel, { foreignKey: 'rationId', constraints: false })
  declare ration: RationModel;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare number: number;

  /** One version of a ration is the newest: the one that pages show and lists sort by. */
  @Column({ type: DataType.BOOLEAN, allowNull: false })
  declare isNewest: boolean;

  @Column({ type: DataType.STRING(16), allowNull: false })
  declare state: RationState;

  @Column({ type: DataType.JSON, allowNull: false })
  declare draft: RationDraft;

  /** Of the content as last screened; null while the draft has changed since. */
  @Column({ type: DataType.CHAR(64), allowNull: true })
  declare contentHash: string | null;

  @Column({ type: DataType.BIGINT, allowNull: true })
  declare screeningId: number | null;

  @BelongsTo(() => ScreeningModel, { foreignKey: 'screeningId', constraints: false })
  declare screening: ScreeningModel | null;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare savedById: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare savedByName: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare savedAt: Date;
}
