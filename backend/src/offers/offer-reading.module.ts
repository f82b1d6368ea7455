import { Module } from '@nestjs/common';
import { OfferReading } from './offer-reading';

/** By itself, because the page of a part reads offers, and changes of offers need the parts. */
@Module({ providers: [OfferReading], exports: [OfferReading] })
export class OfferReadingModule {}
