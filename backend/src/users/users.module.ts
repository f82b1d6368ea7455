import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { SessionsModule } from '../auth/sessions.module';
import { UserRoleModel } from './models/user-role.model';
import { UserModel } from './models/user.model';
import { UserAccounts } from './user-accounts';

@Module({
  imports: [SessionsModule, SequelizeModule.forFeature([UserModel, UserRoleModel])],
  providers: [UserAccounts],
  exports: [UserAccounts],
})
export class UsersModule {}
