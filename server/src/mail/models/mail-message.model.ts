import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'mail_messages' })
export class MailMessageModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true, defaultValue: DataType.UUIDV4 })
  declare id: string;

  @Column({ type: DataType.TEXT })
  declare dedupeKey: string;

  @Column({ type: DataType.UUID })
  declare accountId: string | null;

  @Column({ type: DataType.TEXT })
  declare recipient: string;

  @Column({ type: DataType.TEXT })
  declare recipientName: string;

  @Column({ type: DataType.TEXT })
  declare template: string;

  @Column({ type: DataType.TEXT })
  declare subject: string;

  @Column({ type: DataType.TEXT })
  declare bodyText: string;

  @Column({ type: DataType.TEXT })
  declare bodyHtml: string;

  @Column({ type: DataType.UUID })
  declare attachmentCertificateId: string | null;

  @Column({ type: DataType.TEXT })
  declare state: 'queued' | 'sent' | 'failed';

  @Column({ type: DataType.INTEGER })
  declare tries: number;

  @Column({ type: DataType.TEXT })
  declare lastError: string | null;

  @Column({ type: DataType.DATE })
  declare createdAt: Date;

  @Column({ type: DataType.DATE })
  declare sentAt: Date | null;
}
