import { Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';
import type { Role } from '../../permissions/roles';

@Table({ tableName: 'user_roles' })
export class UserRoleModel extends Model {
  @PrimaryKey
  @Column(DataType.INTEGER)
  declare userId: number;

  @PrimaryKey
  @Column(DataType.TEXT)
  declare role: Role;
}
