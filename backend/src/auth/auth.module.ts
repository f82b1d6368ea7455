import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { SequelizeModule } from '@nestjs/sequelize';
import { Secrets } from '../config/secrets';
import { MailModule } from '../mail/mail.module';
import { UsersModule } from '../users/users.module';
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
import { FirstAdministrator } from './first-administrator';
import { PasswordResetModel } from './models/password-reset.model';
import { PasswordResetRequestModel } from './models/password-reset-request.model';
import { PasswordResetDelivery } from './password-reset-delivery';
import { PasswordResets } from './password-resets';
import { PasswordResetsController } from './password-resets.controller';
import { People } from './people';
import { SessionsModule } from './sessions.module';
import { SignInService } from './sign-in.service';

@Module({
  imports: [
    SessionsModule,
    UsersModule,
    MailModule,
    PassportModule,
    SequelizeModule.forFeature([PasswordResetModel, PasswordResetRequestModel]),
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
  controllers: [AuthController, PasswordResetsController],
  providers: [
    AccessTokens,
    AccessTokenStrategy,
    People,
    SignInService,
    FirstAdministrator,
    PasswordResets,
    PasswordResetDelivery,
    { provide: APP_GUARD, useClass: AuthenticationGuard },
  ],
})
export class AuthModule {}
