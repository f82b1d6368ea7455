import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { RefreshTokenModel } from './models/refresh-token.model';
import { SessionModel } from './models/session.model';
import { PasswordHasher } from './password-hasher';
import { Sessions } from './sessions';
import { SignInThrottle } from './sign-in-throttle';

/** What other features need of signing in: hashing passwords, ending sessions, forgiving failures. */
@Module({
  imports: [SequelizeModule.forFeature([SessionModel, RefreshTokenModel])],
  providers: [Sessions, PasswordHasher, SignInThrottle],
  exports: [Sessions, PasswordHasher, SignInThrottle],
})
export class SessionsModule {}
