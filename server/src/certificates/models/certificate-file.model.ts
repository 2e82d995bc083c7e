import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'certificate_files' })
export class CertificateFileModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true })
  declare certificateId: string;

  @Column({ type: DataType.TEXT })
  declare keyId: string;

  @Column({ type: DataType.BLOB })
  declare pdf: Buffer;

  @Column({ type: DataType.BLOB })
  declare sha256: Buffer;

  @Column({ type: DataType.DATE })
  declare signedAt: Date;
}
