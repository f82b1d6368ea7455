import { AutoIncrement, Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

@Table({ tableName: 'users' })
export class UserModel extends Model {
  @PrimaryKey
  @AutoIncrement
  @Column(DataType.INTEGER)
  declare id: number;

  /** Lower case, no blanks around */
  @Column(DataType.TEXT)
  declare email: string;

  @Column(DataType.TEXT)
  declare name: string;

  @Column(DataType.TEXT)
  declare passwordHash: string;

  @Column(DataType.TEXT)
  declare state: 'active' | 'deactivated';

  /** Grows with each change; an edit made on another version is stale. */
  @Column(DataType.INTEGER)
  declare version: number;

  @Column(DataType.TEXT)
  declare createdAt: string;

  @Column(DataType.TEXT)
  declare updatedAt: string;
}
