import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'schemes' })
export class SchemeModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare id: string;

  @Column({ type: DataType.TEXT })
  declare slug: string;

  @Column({ type: DataType.TEXT })
  declare revision: string;

  @Column({ type: DataType.TEXT })
  declare title: string;

  @Column({ type: DataType.JSONB })
  declare scope: string[];

  @Column({ type: DataType.JSONB })
  declare limits: string[];

  @Column({ type: DataType.INTEGER })
  declare validYears: number;

  @Column({ type: DataType.TEXT })
  declare zone: string;
}
