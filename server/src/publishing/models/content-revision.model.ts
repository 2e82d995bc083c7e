import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { ContentKind } from '../content.ts';

@Table({ tableName: 'content_revisions' })
export class ContentRevisionModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare id: string;

  @Column({ type: DataType.TEXT })
  declare kind: ContentKind;

  @Column({ type: DataType.TEXT })
  declare slug: string;

  @Column({ type: DataType.TEXT })
  declare language: string;

  @Column({ type: DataType.TEXT })
  declare revision: string;

  @Column({ type: DataType.BLOB })
  declare hash: Buffer;

  @Column({ type: DataType.JSONB })
  declare compiled: unknown;

  @Column({ type: DataType.TEXT })
  declare pool: 'practice' | 'paper' | null;

  @Column({ type: DataType.TEXT })
  declare subject: string | null;

  @Column({ type: DataType.TEXT })
  declare lesson: string | null;

  @Column({ type: DataType.TEXT })
  declare state: 'current' | 'superseded';
}
