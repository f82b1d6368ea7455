import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { ExtractJwt, Strategy } from 'passport-jwt';
import { Secrets } from '../config/secrets';
import type { Person } from '../permissions/person';
import { type AccessTokenClaims, TOKEN_ALGORITHM, TOKEN_AUDIENCE, TOKEN_ISSUER } from './access-tokens';
import { People } from './people';

/** Turns the bearer token of a request into the person. */
@Injectable()
export class AccessTokenStrategy extends PassportStrategy(Strategy, 'access-token') {
  constructor(
    secrets: Secrets,
    private readonly people: People,
  ) {
    super({
      jwtFromRequest: ExtractJwt.fromAuthHeaderAsBearerToken(),
      secretOrKey: secrets.accessTokenKey,
      algorithms: [TOKEN_ALGORITHM],
      issuer: TOKEN_ISSUER,
      audience: TOKEN_AUDIENCE,
      ignoreExpiration: false,
    });
  }

  async validate(claims: AccessTokenClaims): Promise<Person | false> {
    const person = typeof claims.sid === 'string' ? await this.people.ofSession(claims.sid) : undefined;
    return person && String(person.id) === claims.sub ? person : false;
  }
}
