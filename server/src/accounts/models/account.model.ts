import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'accounts' })
export class AccountModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true, defaultValue: DataType.UUIDV4 })
  declare id: string;

  @Column({ type: DataType.TEXT })
  declare email: string;

  @Column({ type: DataType.TEXT })
  declare givenName: string;

  @Column({ type: DataType.TEXT })
  declare familyName: string;

  @Column({ type: DataType.TEXT })
  declare passwordHash: string | null;

  @Column({ type: DataType.TEXT })
  declare language: string;

  @Column({ type: DataType.DATE })
  declare emailConfirmedAt: Date | null;

  @Column({ type: DataType.DATE })
  declare suspendedAt: Date | null;

  @Column({ type: DataType.TEXT })
  declare suspendedReason: string | null;

  @Column({ type: DataType.DATE })
  declare lastSeenAt: Date | null;

  @Column({ type: DataType.DATE })
  declare createdAt: Date;
}
