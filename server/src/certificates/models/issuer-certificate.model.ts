import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'issuer_certificates' })
export class IssuerCertificateModel extends Model {
  @Column({ type: DataType.TEXT, primaryKey: true })
  declare keyId: string;

  @Column({ type: DataType.TEXT })
  declare kind: 'root' | 'leaf';

  @Column({ type: DataType.TEXT })
  declare pem: string;

  @Column({ type: DataType.DATE })
  declare validFrom: Date;

  @Column({ type: DataType.DATE })
  declare validTo: Date;

  @Column({ type: DataType.DATE })
  declare retiredAt: Date | null;

  @Column({ type: DataType.DATE })
  declare compromisedAt: Date | null;
}
