import { Module } from '@nestjs/common';
import { MailBox } from './mail-box';
import { MailCatcher } from './mail-catcher';
import { MailController } from './mail.controller';
import { MailDelivery } from './mail-delivery';
import { Mailer } from './mailer';

@Module({
  controllers: [MailController],
  providers: [MailBox, MailCatcher, Mailer, MailDelivery],
  exports: [Mailer],
})
export class MailModule {}
