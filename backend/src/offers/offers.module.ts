import { Module } from '@nestjs/common';
import { PartsModule } from '../parts/parts.module';
import { OfferChanges } from './offer-changes';
import { OfferReadingModule } from './offer-reading.module';
import { OfferRefusals } from './offer-refusals';
import { OffersController } from './offers.controller';

@Module({
  imports: [OfferReadingModule, PartsModule],
  controllers: [OffersController],
  providers: [OfferChanges, OfferRefusals],
})
export class OffersModule {}
