import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A question the candidate means to come back to. */
@Table({ tableName: 'sitting_pennants' })
export class SittingPennantModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare sittingId: string;

  @Column({ type: DataType.TEXT, primaryKey: true })
  declare itemKey: string;
}
