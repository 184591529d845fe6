import type { WaterAnalysisInput } from '@brimgate/rules';
import { BelongsTo, Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { PersonModel } from '../accounts/person.model';
import { WaterSourceModel } from './water-source.model';

type Sulfate = NonNullable<WaterAnalysisInput['sulfate']>;
type Nitrate = NonNullable<WaterAnalysisInput['nitrate']>;

/** A laboratory's result as printed. It is inserted and never changed: a correction is another analysis. */
@Table({ tableName: 'water_analyses' })
export class WaterAnalysisModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare uuid: string;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare yardId: number;

  @ForeignKey(() => WaterSourceModel)
  @Column({ type: DataType.BIGINT, allowNull: false })
  declare waterSourceId: number;

  @Column({ type: DataType.DATEONLY, allowNull: false })
  declare sampledOn: string;

  @Column({ type: DataType.STRING(500), allowNull: true })
  declare samplingPoint: string | null;

  @Column({ type: DataType.STRING(500), allowNull: true })
  declare laboratory: string | null;

  @Column({ type: DataType.STRING(500), allowNull: true })
  declare treatment: string | null;

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare sulfateValue: number | null;

  @Column({ type: DataType.STRING(10), allowNull: true })
  declare sulfateAs: Sulfate['as'] | null;

  @Column({ type: DataType.STRING(10), allowNull: true })
  declare sulfateUnit: Sulfate['unit'] | null;

  @Column({ type: DataType.CHAR(1), allowNull: true })
  declare sulfateQualifier: Sulfate['qualifier'];

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare nitrateValue: number | null;

  @Column({ type: DataType.STRING(10), allowNull: true })
  declare nitrateAs: Nitrate['as'] | null;

  @Column({ type: DataType.STRING(10), allowNull: true })
  declare nitrateUnit: Nitrate['unit'] | null;

  @Column({ type: DataType.CHAR(1), allowNull: true })
  declare nitrateQualifier: Nitrate['qualifier'];

  @Column({ type: DataType.DOUBLE, allowNull: true, field: 'total_dissolved_solids_mg_per_l' })
  declare totalDissolvedSolidsMgPerL: number | null;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare enteredAt: Date;

  @ForeignKey(() => PersonModel)
  @Column({ type: DataType.BIGINT, allowNull: false })
  declare enteredById: number;

  @BelongsTo(() => WaterSourceModel)
  declare waterSource: WaterSourceModel;

  @BelongsTo(() => PersonModel)
  declare enteredBy: PersonModel;
}
