import { Module } from '@nestjs/common';
import { SizeRatingsReader } from '../ratings/size-ratings-reader';
import { PartSummaries } from './part-summaries';

/** What other features read of parts. */
@Module({ providers: [PartSummaries, SizeRatingsReader], exports: [PartSummaries, SizeRatingsReader] })
export class PartReadingModule {}
