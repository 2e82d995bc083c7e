import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'certificate_events' })
export class CertificateEventModel extends Model {
  @Column({ type: DataType.BIGINT, primaryKey: true, autoIncrement: true })
  declare id: string;

  @Column({ type: DataType.UUID })
  declare certificateId: string;

  @Column({ type: DataType.TEXT })
  declare kind: 'issued' | 'withdrawn' | 'superseded';

  @Column({ type: DataType.TEXT })
  declare reason: string;

  @Column({ type: DataType.UUID })
  declare actorId: string | null;

  @Column({ type: DataType.UUID })
  declare replacedBy: string | null;

  @Column({ type: DataType.DATE })
  declare at: Date;
}
