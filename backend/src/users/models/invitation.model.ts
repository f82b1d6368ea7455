import { Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

/** A way in that an administrator has sent to somebody by mail. */
@Table({ tableName: 'invitations' })
export class InvitationModel extends Model {
  @PrimaryKey
  @Column(DataType.TEXT)
  declare id: string;

  @Column(DataType.TEXT)
  declare email: string;

  /** JSON text: list of roles */
  @Column(DataType.TEXT)
  declare roles: string;

  @Column(DataType.TEXT)
  declare tokenHash: string;

  @Column(DataType.INTEGER)
  declare invitedBy: number;

  @Column(DataType.TEXT)
  declare createdAt: string;

  @Column(DataType.TEXT)
  declare expiresAt: string;

  @Column(DataType.TEXT)
  declare acceptedAt: string | null;

  @Column(DataType.TEXT)
  declare withdrawnAt: string | null;

  /** The account that came of it */
  @Column(DataType.INTEGER)
  declare userId: number | null;
}
