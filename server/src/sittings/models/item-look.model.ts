import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** One opening of a marked paper's items by a certification manager. */
@Table({ tableName: 'item_looks' })
export class ItemLookModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: string;

  @Column({ type: DataType.UUID })
  declare sittingId: string;

  @Column({ type: DataType.UUID })
  declare accountId: string;

  @Column({ type: DataType.TEXT })
  declare reason: string;

  @Column({ type: DataType.DATE })
  declare at: Date;
}
