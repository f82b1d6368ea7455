import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';

export const TOKEN_ISSUER = 'resistry';
export const TOKEN_AUDIENCE = 'resistry-api';
export const TOKEN_ALGORITHM = 'HS256';
export const ACCESS_TOKEN_SECONDS = 600;

/** What an access token says: whose session it belongs to. Everything else is looked up when it is used. */
export interface AccessTokenClaims {
  sub: string;
  sid: string;
}

/** Issues the short-lived tokens that requests carry. */
@Injectable()
export class AccessTokens {
  constructor(private readonly jwt: JwtService) {}

  async issue(session: { id: string; userId: number }): Promise<string> {
    const claims: AccessTokenClaims = { sub: String(session.userId), sid: session.id };
    return this.jwt.signAsync(claims);
  }
}
