import { Module } from '@nestjs/common';
import { FamiliesModule } from '../families/families.module';
import { OfferReadingModule } from '../offers/offer-reading.module';
import { Alternates } from './alternates/alternates.service';
import { PartDetails } from './details/part-details';
import { PartPurchasingReading } from './details/part-purchasing-reading';
import { PartStandingReading } from './details/part-standing-reading';
import { PartText } from './part-text';
import { PartsController } from './parts.controller';
import { PriceRefresh } from './price-refresh';
import { StandingChanges } from './standing-changes';
import { ApprovalChanges } from './standing/approval-changes';
import { PartReviews } from './standing/part-reviews';
import { SecondSourceWatch } from './standing/second-source-watch';
import { StandingController } from './standing/standing.controller';
import { StandingDoor } from './standing/standing-door';
import { StandingLetters } from './standing/standing-letters';
import { StandingTransitions } from './standing/standing-transitions';
import { SupplyChanges } from './standing/supply-changes';
import { PartReadingModule } from './summary/part-reading.module';

@Module({
  imports: [FamiliesModule, OfferReadingModule, PartReadingModule],
  controllers: [PartsController, StandingController],
  providers: [
    Alternates,
    PartDetails,
    PartPurchasingReading,
    PartStandingReading,
    PartText,
    PriceRefresh,
    StandingChanges,
    ApprovalChanges,
    PartReviews,
    SecondSourceWatch,
    StandingDoor,
    StandingLetters,
    StandingTransitions,
    SupplyChanges,
  ],
  exports: [PartPurchasingReading, PartText, StandingChanges],
})
export class PartsModule {}
