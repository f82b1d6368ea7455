import { Module } from '@nestjs/common';
import { PartsModule } from '../parts/parts.module';
import { PartReadingModule } from '../parts/summary/part-reading.module';
import { PoliciesModule } from '../policies/policies.module';
import { PartAssessmentService } from './part-assessment.service';
import { SearchController } from './search.controller';
import { SearchIndex } from './search-index';
import { SearchService } from './search.service';

@Module({
  imports: [PartsModule, PartReadingModule, PoliciesModule],
  controllers: [SearchController],
  providers: [SearchIndex, SearchService, PartAssessmentService],
  exports: [SearchIndex],
})
export class SearchModule {}
