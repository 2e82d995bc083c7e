import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'certificates' })
export class CertificateModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true, defaultValue: DataType.UUIDV4 })
  declare id: string;

  @Column({ type: DataType.TEXT })
  declare number: string;

  @Column({ type: DataType.TEXT })
  declare linkCode: string;

  @Column({ type: DataType.UUID })
  declare accountId: string;

  @Column({ type: DataType.UUID })
  declare decisionId: string;

  @Column({ type: DataType.UUID })
  declare schemeId: string;

  @Column({ type: DataType.TEXT })
  declare holderName: string;

  @Column({ type: DataType.TEXT })
  declare familyFold: string;

  @Column({ type: DataType.TEXT })
  declare howSat: string;

  @Column({ type: DataType.DATE })
  declare issuedAt: Date;

  @Column({ type: DataType.DATEONLY })
  declare issuedOn: string;

  @Column({ type: DataType.DATEONLY })
  declare expiresOn: string;
}
