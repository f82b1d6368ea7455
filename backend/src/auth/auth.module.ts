import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { Secrets } from '../config/secrets';
import { AccessTokenStrategy } from './access-token.strategy';
import {
  ACCESS_TOKEN_SECONDS,
  AccessTokens,
  TOKEN_ALGORITHM,
  TOKEN_AUDIENCE,
  TOKEN_ISSUER,
} from './access-tokens';
import { AuthController } from './auth.controller';
import { AuthenticationGuard } from './authentication.guard';
import { People } from './people';
import { SessionsModule } from './sessions.module';
import { SignInService } from './sign-in.service';

@Module({
  imports: [
    SessionsModule,
    PassportModule,
    JwtModule.registerAsync({
      inject: [Secrets],
      useFactory: (secrets: Secrets) => ({
        secret: secrets.accessTokenKey,
        signOptions: {
          algorithm: TOKEN_ALGORITHM,
          expiresIn: ACCESS_TOKEN_SECONDS,
          issuer: TOKEN_ISSUER,
          audience: TOKEN_AUDIENCE,
        },
      }),
    }),
  ],
  controllers: [AuthController],
  providers: [
    AccessTokens,
    AccessTokenStrategy,
    People,
    SignInService,
    { provide: APP_GUARD, useClass: AuthenticationGuard },
  ],
})
export class AuthModule {}
