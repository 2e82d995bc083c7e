import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { MarkedItem, SubjectMarks } from '../result.ts';

@Table({ tableName: 'sitting_results' })
export class SittingResultModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare sittingId: string;

  @Column({ type: DataType.INTEGER })
  declare marks: number;

  @Column({ type: DataType.INTEGER })
  declare outOf: number;

  @Column({ type: DataType.BOOLEAN })
  declare passed: boolean;

  @Column({ type: DataType.JSONB })
  declare bySubject: SubjectMarks[];

  @Column({ type: DataType.JSONB })
  declare marked: MarkedItem[];

  @Column({ type: DataType.INTEGER })
  declare markerVersion: number;

  @Column({ type: DataType.DATE })
  declare markedAt: Date;

  @Column({ type: DataType.DATE })
  declare maySitAgainAt: Date | null;
}
