import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'decisions' })
export class DecisionModel extends Model {
  @Column({ type: DataType.UUID, primaryKey: true, defaultValue: DataType.UUIDV4 })
  declare id: string;

  @Column({ type: DataType.UUID })
  declare accountId: string;

  @Column({ type: DataType.UUID })
  declare schemeId: string;

  @Column({ type: DataType.UUID })
  declare sittingId: string | null;

  @Column({ type: DataType.TEXT })
  declare outcome: 'certify' | 'correct-name';

  @Column({ type: DataType.TEXT })
  declare decidedBy: string;

  @Column({ type: DataType.UUID })
  declare deciderId: string | null;

  @Column({ type: DataType.JSONB })
  declare evidence: object;

  @Column({ type: DataType.JSONB })
  declare rules: object;

  @Column({ type: DataType.DATE })
  declare decidedAt: Date;
}
