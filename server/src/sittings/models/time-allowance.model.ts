import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** Approved extra time of a person; the newest row counts. */
@Table({ tableName: 'time_allowances' })
export class TimeAllowanceModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: string;

  @Column({ type: DataType.UUID })
  declare accountId: string;

  @Column({ type: DataType.INTEGER })
  declare percent: number;

  @Column({ type: DataType.TEXT })
  declare reason: string;

  @Column({ type: DataType.UUID })
  declare grantedBy: string;

  @Column({ type: DataType.DATE })
  declare grantedAt: Date;
}
