import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { HandedInHow, Rules } from '../sitting.ts';

@Table({ tableName: 'sittings' })
export class SittingModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare id: string;

  @Column({ type: DataType.UUID })
  declare accountId: string;

  @Column({ type: DataType.TEXT })
  declare paperSlug: string;

  @Column({ type: DataType.UUID })
  declare blueprintRevisionId: string;

  @Column({ type: DataType.UUID })
  declare schemeId: string;

  @Column({ type: DataType.JSONB })
  declare rules: Rules;

  @Column({ type: DataType.BLOB })
  declare agreementHash: Buffer;

  @Column({ type: DataType.TEXT })
  declare givenName: string;

  @Column({ type: DataType.TEXT })
  declare familyName: string;

  @Column({ type: DataType.UUID })
  declare writingSessionId: string | null;

  @Column({ type: DataType.DATE })
  declare startedAt: Date;

  @Column({ type: DataType.DATE })
  declare closesAt: Date;

  @Column({ type: DataType.DATE })
  declare handedInAt: Date | null;

  @Column({ type: DataType.TEXT })
  declare handedInHow: HandedInHow | null;
}
