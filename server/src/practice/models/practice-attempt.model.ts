import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { KeptDraw } from '../practice-attempt.ts';

@Table({ tableName: 'practice_attempts' })
export class PracticeAttemptModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare id: string;

  @Column({ type: DataType.UUID })
  declare accountId: string;

  @Column({ type: DataType.UUID })
  declare questionRevisionId: string;

  @Column({ type: DataType.JSONB })
  declare drawn: KeptDraw;

  @Column({ type: DataType.ARRAY(DataType.TEXT), defaultValue: [] })
  declare hints: string[];

  @Column({ type: DataType.INTEGER })
  declare stepsLeft: number | null;

  @Column({ type: DataType.DATE })
  declare startedAt: Date;

  @Column({ type: DataType.DATE })
  declare handedInAt: Date | null;

  @Column({ type: DataType.JSONB })
  declare answers: unknown;

  @Column({ type: DataType.JSONB })
  declare marked: unknown;
}
