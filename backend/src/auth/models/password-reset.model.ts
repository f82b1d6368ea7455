import { Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

/** A way to a new password that was sent by mail: good once, and not for long. */
@Table({ tableName: 'password_resets' })
export class PasswordResetModel extends Model {
  /** The id of the outbox message that sent it, so that sending twice makes one. */
  @PrimaryKey
  @Column(DataType.TEXT)
  declare id: string;

  @Column(DataType.INTEGER)
  declare userId: number;

  @Column(DataType.TEXT)
  declare tokenHash: string;

  @Column(DataType.TEXT)
  declare createdAt: string;

  @Column(DataType.TEXT)
  declare expiresAt: string;

  @Column(DataType.TEXT)
  declare usedAt: string | null;
}
