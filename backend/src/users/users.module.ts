import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { SessionsModule } from '../auth/sessions.module';
import { MailModule } from '../mail/mail.module';
import { InvitationAcceptance } from './invitation-acceptance';
import { InvitationDelivery } from './invitation-delivery';
import { Invitations } from './invitations';
import { InvitationsController } from './invitations.controller';
import { InvitationModel } from './models/invitation.model';
import { UserRoleModel } from './models/user-role.model';
import { UserModel } from './models/user.model';
import { UserAccounts } from './user-accounts';
import { UserChanges } from './user-changes';
import { UserQueries } from './user-queries';
import { UsersController } from './users.controller';

@Module({
  imports: [
    SessionsModule,
    MailModule,
    SequelizeModule.forFeature([UserModel, UserRoleModel, InvitationModel]),
  ],
  controllers: [UsersController, InvitationsController],
  providers: [UserAccounts, UserChanges, UserQueries, Invitations, InvitationAcceptance, InvitationDelivery],
  exports: [UserAccounts],
})
export class UsersModule {}
