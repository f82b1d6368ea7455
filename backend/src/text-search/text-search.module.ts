import { Module } from '@nestjs/common';
import { PartReadingModule } from '../parts/summary/part-reading.module';
import { TextSearchController } from './text-search.controller';
import { TextSearchService } from './text-search.service';

@Module({
  imports: [PartReadingModule],
  controllers: [TextSearchController],
  providers: [TextSearchService],
})
export class TextSearchModule {}
