import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'sessions' })
export class SessionModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true, defaultValue: DataType.UUIDV4 })
  declare id: string;

  @Column({ type: DataType.UUID })
  declare accountId: string;

  @Column({ type: DataType.BLOB })
  declare tokenHash: Buffer;

  @Column({ type: DataType.DATE })
  declare startedAt: Date;

  @Column({ type: DataType.DATE })
  declare lastSeenAt: Date;

  @Column({ type: DataType.DATE })
  declare authenticatedAt: Date;

  @Column({ type: DataType.DATE })
  declare secondFactorAt: Date | null;

  @Column({ type: DataType.DATE })
  declare endsAt: Date;

  @Column({ type: DataType.DATE })
  declare endedAt: Date | null;

  @Column({ type: DataType.TEXT })
  declare device: string;

  @Column({ type: DataType.TEXT })
  declare address: string;
}
