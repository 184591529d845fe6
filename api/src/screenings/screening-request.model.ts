import type { ScreeningRequest } from '@brimgate/rules';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** The facts of a screening, stored once however often they are screened. */
@Table({ tableName: 'screening_requests', underscored: true, timestamps: false })
export class ScreeningRequestModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.BIGINT, allowNull: false })
  declare firmId: number;

  @Column({ type: DataType.CHAR(64), allowNull: false })
  declare requestHash: string;

  @Column({ type: DataType.JSON, allowNull: false })
  declare request: ScreeningRequest;
}
