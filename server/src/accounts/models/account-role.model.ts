import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { Role } from '../account.ts';

@Table({ tableName: 'account_roles' })
export class AccountRoleModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare accountId: string;

  @Column({ type: DataType.TEXT, primaryKey: true })
  declare role: Role;

  @Column({ type: DataType.UUID })
  declare grantedBy: string | null;

  @Column({ type: DataType.DATE })
  declare grantedAt: Date;
}
