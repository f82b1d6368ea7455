import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { OutboxMessageModel } from './models/outbox-message.model';
import { Outbox } from './outbox';
import { OutboxDispatcher } from './outbox-dispatcher';
import { OutboxHandlers } from './outbox-handlers';

@Global()
@Module({
  imports: [SequelizeModule.forFeature([OutboxMessageModel])],
  providers: [Outbox, OutboxDispatcher, OutboxHandlers],
  exports: [Outbox, OutboxDispatcher, OutboxHandlers],
})
export class OutboxModule {}
