import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { OutboxMessageModel } from './models/outbox-message.model';
import { Outbox } from './outbox';
import { OutboxController } from './outbox.controller';
import { OutboxDispatcher } from './outbox-dispatcher';
import { OutboxHandlers } from './outbox-handlers';
import { Undelivered } from './undelivered';

@Global()
@Module({
  imports: [SequelizeModule.forFeature([OutboxMessageModel])],
  controllers: [OutboxController],
  providers: [Outbox, OutboxDispatcher, OutboxHandlers, Undelivered],
  exports: [Outbox, OutboxDispatcher, OutboxHandlers],
})
export class OutboxModule {}
