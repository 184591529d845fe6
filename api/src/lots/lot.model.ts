import type { LotExcretion, LotView } from '@brimgate/rules';
import { BelongsTo, Column, DataType, Model, Table } from 'sequelize-typescript';
import { ReleaseModel } from '../releases/release.model';
import { YardModel } from '../yards/yard.model';

@Table({ tableName: 'lots', underscored: true, timestamps: false })
export class LotModel extends Model {
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

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare name: string;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare head: number;

  @Column({ type: DataType.DATEONLY, allowNull: false })
  declare startedOn: string;

  @Column({ type: DataType.DATEONLY, allowNull: true })
  declare endedOn: string | null;

  @Column({ type: DataType.DOUBLE, allowNull: false })
  declare entryWeightKg: number;

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare exitWeightKg: number | null;

  @Column({ type: DataType.STRING(8), allowNull: false })
  declare weightBasis: LotView['weightBasis'];

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare dryMatterIntakeKgPerDay: number | null;

  @Column({ type: DataType.BIGINT, allowNull: true })
  declare releaseId: number | null;

  @BelongsTo(() => ReleaseModel, { foreignKey: 'releaseId', constraints: false })
  declare release: ReleaseModel | null;

  /** As computed when the lot was saved; the ledger adds these up and computes nothing. */
  @Column({ type: DataType.JSON, allowNull: false })
  declare excretion: LotExcretion;

  /** Whether nitrogen and phosphorus excreted are both known. */
  @Column({ type: DataType.BOOLEAN, allowNull: false })
  declare isDetermined: boolean;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare rulesVersion: string;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare edition: string;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare version: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare savedById: number;

  @Column({ type: DataType.STRING(120), allowNull: false })
  declare savedByName: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare savedAt: Date;
}
