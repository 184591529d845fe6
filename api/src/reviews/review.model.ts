import type { ReviewState, SignerRole } from '@brimgate/rules';
import { BelongsTo, Column, DataType, HasMany, Model, Table } from 'sequelize-typescript';
import { RationModel } from '../rations/ration.model';
import { ScreeningModel } from '../screenings/screening.model';
import { YardModel } from '../yards/yard.model';
import { DecisionModel } from './decision.model';

@Table({ tableName: 'reviews', underscored: true, timestamps: false })
export class ReviewModel extends Model {
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

  @Column({ type: DataType.TEXT, allowNull: false })
  declare reason: string;

  @Column({ type: DataType.STRING(16), allowNull: false })
  declare state: ReviewState;

  /** Whose signatures it still waits for, comma-separated, so that lists need no gate. */
  @Column({ type: DataType.STRING(40), allowNull: false })
  declare awaits: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare submittedById: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare submittedByName: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare submittedAt: Date;

  @Column({ type: DataType.DATE(3), allowNull: true })
  declare closedAt: Date | null;

  @HasMany(() => DecisionModel, { foreignKey: 'reviewId', constraints: false })
  declare decisions: DecisionModel[];
}

export function awaitedOf(review: Pick<ReviewModel, 'awaits'>): SignerRole[] {
  return review.awaits === '' ? [] : (review.awaits.split(',') as SignerRole[]);
}
