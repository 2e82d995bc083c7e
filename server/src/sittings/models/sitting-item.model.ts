import type { DrawnQuestion } from '@ferrule/assessments';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'sitting_items' })
export class SittingItemModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare sittingId: string;

  @Column({ type: DataType.TEXT, primaryKey: true })
  declare key: string;

  @Column({ type: DataType.INTEGER })
  declare number: number;

  @Column({ type: DataType.UUID })
  declare questionRevisionId: string;

  @Column({ type: DataType.TEXT })
  declare subject: string;

  @Column({ type: DataType.INTEGER })
  declare marks: number;

  @Column({ type: DataType.JSONB })
  declare drawn: DrawnQuestion;
}
