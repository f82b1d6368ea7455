import { AutoIncrement, Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

@Table({ tableName: 'audit_entries' })
export class AuditEntryModel extends Model {
  @PrimaryKey
  @AutoIncrement
  @Column(DataType.INTEGER)
  declare id: number;

  @Column(DataType.TEXT)
  declare recordedAt: string;

  @Column(DataType.INTEGER)
  declare actorId: number | null;

  @Column(DataType.TEXT)
  declare actorName: string;

  @Column(DataType.TEXT)
  declare action: string;

  @Column(DataType.TEXT)
  declare subjectType: string;

  @Column(DataType.TEXT)
  declare subjectId: string;

  /** JSON text */
  @Column(DataType.TEXT)
  declare before: string | null;

  /** JSON text */
  @Column(DataType.TEXT)
  declare after: string | null;

  @Column(DataType.TEXT)
  declare reason: string | null;
}
