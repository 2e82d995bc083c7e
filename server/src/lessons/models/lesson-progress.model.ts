import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'lesson_progress' })
export class LessonProgressModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare accountId: string;

  @Column({ type: DataType.TEXT, primaryKey: true })
  declare lesson: string;

  @Column({ type: DataType.INTEGER })
  declare paragraph: number;

  @Column({ type: DataType.DATE })
  declare begunAt: Date;

  @Column({ type: DataType.DATE })
  declare lastReadAt: Date;

  @Column({ type: DataType.DATE })
  declare doneAt: Date | null;

  @Column({ type: DataType.TEXT })
  declare doneRevision: string | null;
}
