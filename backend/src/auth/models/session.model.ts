import { Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

export type SessionEnd =
  'signed-out' | 'signed-out-everywhere' | 'token-reused' | 'password-changed' | 'deactivated' | 'restored';

/** One sign-in on one device, until it is ended or runs out. */
@Table({ tableName: 'sessions' })
export class SessionModel extends Model {
  @PrimaryKey
  @Column(DataType.TEXT)
  declare id: string;

  @Column(DataType.INTEGER)
  declare userId: number;

  @Column(DataType.TEXT)
  declare userAgent: string;

  @Column(DataType.TEXT)
  declare address: string;

  @Column(DataType.TEXT)
  declare createdAt: string;

  @Column(DataType.TEXT)
  declare lastUsedAt: string;

  @Column(DataType.TEXT)
  declare expiresAt: string;

  @Column(DataType.TEXT)
  declare endedAt: string | null;

  @Column(DataType.TEXT)
  declare endedReason: SessionEnd | null;
}
