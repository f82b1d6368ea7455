import { Module } from '@nestjs/common';
import { Housekeeping } from './housekeeping.service';

@Module({ providers: [Housekeeping] })
export class HousekeepingModule {}
