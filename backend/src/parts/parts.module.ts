import { Module } from '@nestjs/common';
import { FamiliesModule } from '../families/families.module';
import { PartDetails } from './details/part-details';
import { PartPurchasingReading } from './details/part-purchasing-reading';
import { PartStandingReading } from './details/part-standing-reading';
import { PartText } from './part-text';
import { PartsController } from './parts.controller';
import { StandingChanges } from './standing-changes';
import { PartReadingModule } from './summary/part-reading.module';

@Module({
  imports: [FamiliesModule, PartReadingModule],
  controllers: [PartsController],
  providers: [PartDetails, PartPurchasingReading, PartStandingReading, PartText, StandingChanges],
  exports: [PartPurchasingReading, PartText, StandingChanges],
})
export class PartsModule {}
