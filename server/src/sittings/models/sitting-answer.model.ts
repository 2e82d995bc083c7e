import type { RawAnswer } from '@ferrule/assessments';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'sitting_answers' })
export class SittingAnswerModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: string;

  @Column({ type: DataType.UUID })
  declare sittingId: string;

  @Column({ type: DataType.TEXT })
  declare itemKey: string;

  @Column({ type: DataType.TEXT })
  declare part: string;

  @Column({ type: DataType.BIGINT })
  declare sequence: string;

  @Column({ type: DataType.UUID })
  declare idempotencyKey: string;

  @Column({ type: DataType.JSONB })
  declare answer: RawAnswer;

  @Column({ type: DataType.TEXT })
  declare receipt: string;

  @Column({ type: DataType.DATE })
  declare savedAt: Date;
}
