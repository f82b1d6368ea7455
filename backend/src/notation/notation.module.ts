import { Module } from '@nestjs/common';
import { NotationController } from './notation.controller';

@Module({ controllers: [NotationController] })
export class NotationModule {}
