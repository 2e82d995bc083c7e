import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { AnswersByItem, KeptItem, KeptRecall, MarkedByItem } from '../worksheet-attempt.ts';

@Table({ tableName: 'worksheet_attempts' })
export class WorksheetAttemptModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare id: string;

  @Column({ type: DataType.UUID })
  declare accountId: string;

  @Column({ type: DataType.TEXT })
  declare worksheet: string;

  @Column({ type: DataType.UUID })
  declare courseRevisionId: string;

  @Column({ type: DataType.INTEGER })
  declare attempt: number;

  @Column({ type: DataType.TEXT })
  declare variant: string;

  @Column({ type: DataType.JSONB })
  declare items: KeptItem[];

  @Column({ type: DataType.JSONB })
  declare recall: KeptRecall[];

  @Column({ type: DataType.JSONB })
  declare answers: AnswersByItem;

  @Column({ type: DataType.INTEGER })
  declare outOf: number;

  @Column({ type: DataType.DATE })
  declare startedAt: Date;

  @Column({ type: DataType.DATE })
  declare savedAt: Date | null;

  @Column({ type: DataType.DATE })
  declare handedInAt: Date | null;

  @Column({ type: DataType.INTEGER })
  declare marks: number | null;

  @Column({ type: DataType.JSONB })
  declare marked: MarkedByItem | null;

  @Column({ type: DataType.INTEGER })
  declare markerVersion: number | null;
}
