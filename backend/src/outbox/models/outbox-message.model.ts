import { Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

@Table({ tableName: 'outbox_messages' })
export class OutboxMessageModel extends Model {
  @PrimaryKey
  @Column(DataType.TEXT)
  declare id: string;

  /** Order of writing */
  @Column(DataType.INTEGER)
  declare sequence: number;

  @Column(DataType.TEXT)
  declare kind: string;

  /** JSON text */
  @Column(DataType.TEXT)
  declare payload: string;

  @Column(DataType.TEXT)
  declare state: 'pending' | 'delivered' | 'dead';

  @Column(DataType.INTEGER)
  declare attempts: number;

  @Column(DataType.TEXT)
  declare createdAt: string;

  @Column(DataType.TEXT)
  declare nextAttemptAt: string;

  @Column(DataType.TEXT)
  declare deliveredAt: string | null;

  @Column(DataType.TEXT)
  declare lastError: string | null;
}
