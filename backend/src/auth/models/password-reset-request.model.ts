import { Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

/** Somebody asked for a reset; counted so that nobody's mail box is flooded. */
@Table({ tableName: 'password_reset_requests' })
export class PasswordResetRequestModel extends Model {
  @PrimaryKey
  @Column(DataType.TEXT)
  declare id: string;

  @Column(DataType.TEXT)
  declare email: string;

  @Column(DataType.TEXT)
  declare address: string;

  @Column(DataType.TEXT)
  declare requestedAt: string;
}
