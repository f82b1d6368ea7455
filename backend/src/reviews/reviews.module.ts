import { Module } from '@nestjs/common';
import { PartReadingModule } from '../parts/summary/part-reading.module';
import { ReviewsController } from './reviews.controller';
import { ReviewsService } from './reviews.service';

@Module({ imports: [PartReadingModule], controllers: [ReviewsController], providers: [ReviewsService] })
export class ReviewsModule {}
