import { Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

/** One link of a session's chain of refresh tokens; the token itself is nowhere but in the browser's cookie. */
@Table({ tableName: 'refresh_tokens' })
export class RefreshTokenModel extends Model {
  /** SHA-256 of the token, hexadecimal */
  @PrimaryKey
  @Column(DataType.TEXT)
  declare tokenHash: string;

  @Column(DataType.TEXT)
  declare sessionId: string;

  @Column(DataType.TEXT)
  declare issuedAt: string;

  @Column(DataType.TEXT)
  declare expiresAt: string;

  /** When the next token of the chain took its place. */
  @Column(DataType.TEXT)
  declare replacedAt: string | null;
}
